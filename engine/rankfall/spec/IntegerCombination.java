package rankfall.spec;

import java.math.BigInteger;
import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;

/** The argument of a function: an integer combination of parameters, not 0. */
final class IntegerCombination implements Expression.Cases<SortedMap<String, BigFraction>> {
  /** The key of the constant term. */
  private static final String CONSTANT = "";

  private final Scope scope;

  private IntegerCombination(Scope scope) {
    this.scope = scope;
  }

  /** The coefficients by parameter; none is 0. */
  static SortedMap<String, BigInteger> of(
      Expression argument, Place place, String function, Scope scope) {
    SortedMap<String, BigFraction> linear;
    try {
      linear = argument.fold(new IntegerCombination(scope));
    } catch (NotLinear e) {
      throw fault(place, function);
    }
    SortedMap<String, BigInteger> result = new TreeMap<>();
    linear.forEach(
        (name, factor) -> {
          if (name.isEmpty() || factor.getDenominator().bitLength() != 1) {
            throw fault(place, function);
          }
          result.put(name, factor.getNumerator());
        });
    if (result.isEmpty()) {
      throw SpecFault.of(place, "the argument of " + function + " is 0", "write the value itself");
    }
    return Collections.unmodifiableSortedMap(result);
  }

  private static SpecFault fault(Place place, String function) {
    return SpecFault.of(
        place,
        function + " takes an integer combination of parameters",
        "introduce what stands here as a parameter of its own, or as a multiple of one");
  }

  /** The argument is no linear form in parameters. */
  private static final class NotLinear extends RuntimeException {
    private static final long serialVersionUID = 1L;

    NotLinear() {
      super(null, null, false, false);
    }
  }

  private static SortedMap<String, BigFraction> sum(
      SortedMap<String, BigFraction> a, SortedMap<String, BigFraction> b, BigFraction factor) {
    SortedMap<String, BigFraction> result = new TreeMap<>(a);
    b.forEach((name, c) -> result.merge(name, c.multiply(factor), BigFraction::add));
    result.values().removeIf(c -> c.signum() == 0);
    return result;
  }

  @Override
  public SortedMap<String, BigFraction> number(Expression.Number e) {
    return sum(new TreeMap<>(), new TreeMap<>(Map.of(CONSTANT, e.value())), BigFraction.ONE);
  }

  @Override
  public SortedMap<String, BigFraction> name(Expression.Name e) {
    if (!scope.isParameter(e.name()) && !(scope.open() && !scope.known().containsKey(e.name()))) {
      throw new NotLinear();
    }
    return new TreeMap<>(Map.of(e.name(), BigFraction.ONE));
  }

  @Override
  public SortedMap<String, BigFraction> root(Expression.Root e) {
    throw new NotLinear();
  }

  @Override
  public SortedMap<String, BigFraction> function(Expression.Function e) {
    throw new NotLinear();
  }

  @Override
  public SortedMap<String, BigFraction> unit(Expression.MatrixUnit e) {
    throw new NotLinear();
  }

  @Override
  public SortedMap<String, BigFraction> binary(Expression.Binary e) {
    SortedMap<String, BigFraction> none = new TreeMap<>();
    return switch (e.operator()) {
      case PLUS -> sum(e.left().fold(this), e.right().fold(this), BigFraction.ONE);
      case MINUS -> sum(e.left().fold(this), e.right().fold(this), BigFraction.ONE.negate());
      case TIMES -> {
        Optional<BigFraction> left = RationalValue.of(e.left());
        yield left.isPresent()
            ? sum(none, e.right().fold(this), left.get())
            : sum(none, e.left().fold(this), number(e.right()));
      }
      case OVER -> sum(none, e.left().fold(this), number(e.right()).reciprocal());
    };
  }

  private static BigFraction number(Expression e) {
    return RationalValue.of(e).orElseThrow(NotLinear::new);
  }

  @Override
  public SortedMap<String, BigFraction> negation(Expression.Negation e) {
    return sum(new TreeMap<>(), e.operand().fold(this), BigFraction.ONE.negate());
  }

  @Override
  public SortedMap<String, BigFraction> power(Expression.Power e) {
    if (e.exponent() == 1) {
      return e.base().fold(this);
    }
    return number(new Expression.Number(number(e), e.place()));
  }
}
