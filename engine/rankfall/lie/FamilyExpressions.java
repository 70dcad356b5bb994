package rankfall.lie;

import java.math.BigInteger;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.Map;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.spec.Expression;
import rankfall.spec.Place;

/**
 * Evaluates expressions to quotients over the ring of a family.
 *
 * @param ring of the family
 * @param abbreviations values by name
 * @param vectors generators, or earlier matrices, by name
 * @param order of the matrices; 0 where matrix units have no meaning
 */
record FamilyExpressions(
    FamilyRing ring,
    Map<String, FamilyValue> abbreviations,
    Map<String, SortedMap<Integer, Gaussian>> vectors,
    int order)
    implements Expression.Cases<FamilyValue> {
  private static final int GREATEST_MULTIPLE = 64;

  /** The value of a number. */
  FamilyValue number(Expression e) {
    FamilyValue v = e.fold(this);
    if (!v.isNumber()) {
      throw new FamilyFault(
          e.place(), "a combination of generators or matrices where a number is expected");
    }
    return v;
  }

  /** The value of a combination; the number 0 is the empty one. */
  FamilyValue combination(Expression e, String of) {
    FamilyValue v = e.fold(this);
    if (!v.number().isZero()) {
      throw new FamilyFault(e.place(), "a number where a combination of " + of + " is expected");
    }
    return v;
  }

  @Override
  public FamilyValue number(Expression.Number e) {
    return FamilyValue.of(Gaussian.real(ring.number(e.value())));
  }

  @Override
  public FamilyValue name(Expression.Name e) {
    if (abbreviations.containsKey(e.name())) {
      return abbreviations.get(e.name());
    }
    if (vectors.containsKey(e.name())) {
      return new FamilyValue(zero(), vectors.get(e.name()), Set.of());
    }
    if (ring.values().containsKey(e.name())) {
      return FamilyValue.of(Gaussian.real(ring.values().get(e.name())));
    }
    if (ring.parameters().contains(e.name())) {
      return FamilyValue.of(Gaussian.real(ring.variable(e.name())));
    }
    if (e.name().equals("i")) {
      return FamilyValue.of(ring.unit());
    }
    throw new FamilyFault(e.place(), "the name '" + e.name() + "' has no value here");
  }

  private Gaussian zero() {
    return Gaussian.real(RationalFunction.of(Polynomial.zero(ring.variables())));
  }

  @Override
  public FamilyValue root(Expression.Root e) {
    FamilyRoot r = FamilyRoot.of(e);
    RationalFunction out = ring.number(r.factor());
    for (BigInteger p : r.primes()) {
      out = out.times(ring.values().get("sqrt(" + p + ")"));
    }
    return FamilyValue.of(Gaussian.real(out));
  }

  @Override
  public FamilyValue function(Expression.Function e) {
    SortedMap<String, Integer> argument = new TreeMap<>();
    e.argument()
        .forEach(
            (p, k) -> {
              if (k.abs().compareTo(BigInteger.valueOf(GREATEST_MULTIPLE)) > 0) {
                throw new FamilyFault(
                    e.place(),
                    "a multiple of '" + p + "' that is too large in a function",
                    "multiples go up to " + GREATEST_MULTIPLE);
              }
              argument.put(p, k.intValueExact());
            });
    RationalFunction value = ring.normal(ring.function(e.kind(), argument));
    return new FamilyValue(
        Gaussian.real(value), Collections.emptySortedMap(), Set.of(value.denominator()));
  }

  @Override
  public FamilyValue unit(Expression.MatrixUnit e) {
    if (e.row() < 1 || e.row() > order || e.column() < 1 || e.column() > order) {
      throw new FamilyFault(
          e.place(), "no matrix unit of order " + order, "rows and columns go from 1 to " + order);
    }
    SortedMap<Integer, Gaussian> one = new TreeMap<>();
    one.put(
        (e.row() - 1) * order + e.column() - 1,
        Gaussian.real(RationalFunction.of(Polynomial.one(ring.variables()))));
    return new FamilyValue(zero(), one, Set.of());
  }

  @Override
  public FamilyValue binary(Expression.Binary e) {
    FamilyValue a = e.left().fold(this);
    FamilyValue b = e.right().fold(this);
    return switch (e.operator()) {
      case PLUS -> sum(a, b, e.place());
      case MINUS -> sum(a, negated(b), e.place());
      case TIMES -> product(a, b, e.place());
      case OVER -> product(a, inverse(b, e.right().place()), e.place());
    };
  }

  private FamilyValue sum(FamilyValue a, FamilyValue b, Place place) {
    boolean mixed =
        (!a.isNumber() && !b.number().isZero()) || (!b.isNumber() && !a.number().isZero());
    if (mixed) {
      throw new FamilyFault(place, "a number is added to a generator or matrix");
    }
    SortedMap<Integer, Gaussian> vector = new TreeMap<>(a.vector());
    b.vector().forEach((k, v) -> vector.merge(k, v, Gaussian::plus));
    return value(a.number().plus(b.number()), vector, a.divisorsWith(b));
  }

  private FamilyValue value(
      Gaussian number, SortedMap<Integer, Gaussian> vector, Set<Polynomial> divisors) {
    SortedMap<Integer, Gaussian> out = new TreeMap<>();
    vector.forEach(
        (k, v) -> {
          Gaussian n = ring.normal(v);
          if (!n.isZero()) {
            out.put(k, n);
          }
        });
    return new FamilyValue(ring.normal(number), out, divisors);
  }

  private static FamilyValue negated(FamilyValue v) {
    SortedMap<Integer, Gaussian> vector = new TreeMap<>(v.vector());
    vector.replaceAll((k, g) -> g.negate());
    return new FamilyValue(v.number().negate(), vector, v.divisors());
  }

  private FamilyValue product(FamilyValue a, FamilyValue b, Place place) {
    if (!a.isNumber() && !b.isNumber()) {
      throw new FamilyFault(
          place,
          "a product of two generators or matrices",
          "combinations have numbers as coefficients");
    }
    FamilyValue scalar = a.isNumber() ? a : b;
    SortedMap<Integer, Gaussian> vector = new TreeMap<>((a.isNumber() ? b : a).vector());
    vector.replaceAll((k, v) -> v.times(scalar.number()));
    return value(a.number().times(b.number()), vector, a.divisorsWith(b));
  }

  private FamilyValue inverse(FamilyValue v, Place place) {
    if (!v.isNumber()) {
      throw new FamilyFault(place, "division by a generator or matrix");
    }
    RationalFunction norm = ring.normal(v.number().norm());
    if (norm.isZero()) {
      throw new FamilyFault(
          place,
          "division by an expression that is 0 for all parameter values",
          "a denominator must not vanish identically");
    }
    Set<Polynomial> divisors = new LinkedHashSet<>(v.divisors());
    divisors.add(norm.numerator());
    Gaussian one = Gaussian.real(RationalFunction.of(Polynomial.one(ring.variables())));
    return new FamilyValue(
        ring.normal(one.over(v.number())), Collections.emptySortedMap(), divisors);
  }

  @Override
  public FamilyValue negation(Expression.Negation e) {
    return negated(e.operand().fold(this));
  }

  @Override
  public FamilyValue power(Expression.Power e) {
    FamilyValue base = e.base().fold(this);
    if (!base.isNumber()) {
      throw new FamilyFault(e.place(), "a power of a generator or matrix");
    }
    FamilyValue factor = e.exponent() < 0 ? inverse(base, e.base().place()) : base;
    Gaussian out = Gaussian.real(RationalFunction.of(Polynomial.one(ring.variables())));
    for (int k = 0; k < Math.abs(e.exponent()); k++) {
      out = ring.normal(out.times(factor.number()));
    }
    return new FamilyValue(out, Collections.emptySortedMap(), factor.divisors());
  }
}
