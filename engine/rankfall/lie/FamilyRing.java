package rankfall.lie;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.NumberFieldTower;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;
import rankfall.spec.Diagnostic;
import rankfall.spec.Expression.FunctionKind;
import rankfall.spec.Spec;

/**
 * The one ring of a family: parameters, then coordinates of functions, then algebraic numbers, the
 * imaginary unit of a complex ground last.
 *
 * @param variables their names, functions as {@code cos(t)}, roots as {@code sqrt(2)}
 * @param complex whether the ground is complex, so that {@code i} is a variable
 * @param parameters all parameters of the spec, in order
 * @param arguments parameters that are arguments of functions, with the kind of their coordinates
 * @param values the algebraic numbers, by name
 * @param constants the equations of the algebraic numbers that are variables
 * @param identities the same, with the equations between functions of one parameter
 * @param tower the real ones of the algebraic numbers
 */
public record FamilyRing(
    Variables variables,
    boolean complex,
    List<String> parameters,
    SortedMap<String, List<FamilyRing.Coordinates>> arguments,
    SortedMap<String, RationalFunction> values,
    Chain constants,
    Chain identities,
    NumberFieldTower tower) {

  /** Which functions of a parameter are coordinates. */
  public enum Coordinates {
    /** cos and sin. */
    CIRCULAR,
    /** exp. */
    EXPONENTIAL,
    /** cosh and sinh, where exp is not a coordinate. */
    HYPERBOLIC
  }

  /** The ring of a spec; faults of its constants are added to the list. */
  static FamilyRing of(Spec spec, FamilyScan scan, List<Diagnostic> faults) {
    SortedMap<String, RationalFunction> numbers = new TreeMap<>();
    NumberFieldTower tower = NumberFieldTower.rational();
    for (BigInteger p : scan.primes()) {
      tower =
          extended(
              tower,
              "sqrt(" + p + ")",
              List.of(BigFraction.of(p.negate()), BigFraction.ZERO, BigFraction.ONE),
              BigFraction.of(p),
              numbers);
    }
    for (Spec.Constant c : spec.constants()) {
      try {
        NumberFieldTower next = extended(tower, c.name(), c.coefficients(), c.near(), numbers);
        tower = scan.names().contains(c.name()) ? next : tower;
      } catch (ArithmeticException e) {
        faults.add(
            new FamilyFault(
                    c.place(),
                    "the constant '" + c.name() + "' is not determined: " + e.getMessage(),
                    "give a polynomial with a real root and a decimal close to that root")
                .in(spec));
      }
    }
    return of(spec, scan, numbers, tower);
  }

  private static NumberFieldTower extended(
      NumberFieldTower tower,
      String name,
      List<BigFraction> coefficients,
      BigFraction near,
      SortedMap<String, RationalFunction> numbers) {
    NumberFieldTower.Extension e = tower.with(name, coefficients, near);
    numbers.put(name, e.value());
    return e.tower();
  }

  private static FamilyRing of(
      Spec spec,
      FamilyScan scan,
      SortedMap<String, RationalFunction> numbers,
      NumberFieldTower tower) {
    SortedMap<String, List<Coordinates>> arguments = arguments(spec, scan);
    List<String> names = new ArrayList<>();
    for (String p : spec.parameters()) {
      if (scan.names().contains(p) || !scan.inFunction(p)) {
        names.add(p);
      }
    }
    for (String p : spec.parameters()) {
      for (Coordinates c : arguments.getOrDefault(p, List.of())) {
        names.addAll(coordinates(c, p));
      }
    }
    names.addAll(tower.chain().variables().names());
    boolean complex = spec.ground() == Spec.Ground.COMPLEX;
    boolean unit =
        complex && (scan.names().contains("i") || spec.convention() == Spec.Convention.HERMITIAN);
    if (unit) {
      names.add("i");
    }
    int algebraic = tower.chain().variables().count() + (unit ? 1 : 0);
    Variables ring = new Variables(names, algebraic);
    List<Chain.Rule> rules = new ArrayList<>();
    for (Chain.Rule r : tower.chain().rules()) {
      String name = tower.chain().variables().names().get(r.variable());
      rules.add(new Chain.Rule(ring.index(name), NumberFieldTower.inRing(r.equation(), ring)));
    }
    if (unit) {
      int i = ring.index("i");
      rules.add(new Chain.Rule(i, Polynomial.variable(ring, i).pow(2).plus(Polynomial.one(ring))));
    }
    List<Chain.Rule> identities = functionRules(ring, arguments);
    identities.addAll(rules);
    SortedMap<String, RationalFunction> values = new TreeMap<>();
    numbers.forEach(
        (name, v) -> {
          if (scan.names().contains(name) || name.startsWith("sqrt(")) {
            values.put(
                name,
                RationalFunction.of(
                    NumberFieldTower.inRing(v.numerator(), ring),
                    NumberFieldTower.inRing(v.denominator(), ring)));
          }
        });
    return new FamilyRing(
        ring,
        complex,
        List.copyOf(spec.parameters()),
        arguments,
        values,
        new Chain(ring, rules),
        new Chain(ring, identities),
        tower);
  }

  private static SortedMap<String, List<Coordinates>> arguments(Spec spec, FamilyScan scan) {
    SortedMap<String, List<Coordinates>> out = new TreeMap<>();
    for (String p : spec.parameters()) {
      List<Coordinates> kinds = new ArrayList<>();
      if (scan.circular().contains(p)) {
        kinds.add(Coordinates.CIRCULAR);
      }
      if (scan.exponential().contains(p)) {
        kinds.add(Coordinates.EXPONENTIAL);
      } else if (scan.hyperbolic().contains(p)) {
        kinds.add(Coordinates.HYPERBOLIC);
      }
      if (!kinds.isEmpty()) {
        out.put(p, List.copyOf(kinds));
      }
    }
    return out;
  }

  /** The names of the coordinates of one parameter. */
  static List<String> coordinates(Coordinates kind, String parameter) {
    return switch (kind) {
      case CIRCULAR -> List.of("cos(" + parameter + ")", "sin(" + parameter + ")");
      case EXPONENTIAL -> List.of("exp(" + parameter + ")");
      case HYPERBOLIC -> List.of("cosh(" + parameter + ")", "sinh(" + parameter + ")");
    };
  }

  private static List<Chain.Rule> functionRules(
      Variables ring, SortedMap<String, List<Coordinates>> arguments) {
    List<Chain.Rule> out = new ArrayList<>();
    arguments.forEach(
        (p, kinds) -> {
          for (Coordinates kind : kinds) {
            if (kind != Coordinates.EXPONENTIAL) {
              List<String> names = coordinates(kind, p);
              Polynomial c = Polynomial.variable(ring, names.get(0)).pow(2);
              Polynomial s = Polynomial.variable(ring, names.get(1)).pow(2);
              Polynomial one = Polynomial.one(ring);
              out.add(
                  new Chain.Rule(
                      ring.index(names.get(1)),
                      kind == Coordinates.CIRCULAR ? s.plus(c).minus(one) : s.minus(c).plus(one)));
            }
          }
        });
    return out;
  }

  /** The equations between the functions of a parameter, primitive. */
  List<Polynomial> functionRelations() {
    return identities.rules().stream()
        .filter(r -> !constants.rules().contains(r))
        .map(r -> r.equation().primitive())
        .toList();
  }

  /** A variable as a quotient. */
  RationalFunction variable(String name) {
    return RationalFunction.of(Polynomial.variable(variables, name));
  }

  /** A rational number as a quotient. */
  RationalFunction number(BigFraction value) {
    return RationalFunction.of(variables, value);
  }

  /** Reduced by the equations that hold at all points. */
  RationalFunction normal(RationalFunction f) {
    if (identities.rules().isEmpty() || f.isConstant()) {
      return f;
    }
    List<Polynomial> q = identities.reduced(List.of(f.numerator(), f.denominator()));
    return !q.get(1).isConstant() && isNumber(q.get(1))
        ? ChainFractions.canonical(constants, q.get(0), q.get(1))
        : RationalFunction.of(q.get(0), q.get(1));
  }

  /** Reduced by the equations that hold at all points. */
  Gaussian normal(Gaussian g) {
    return new Gaussian(normal(g.re()), normal(g.im()));
  }

  /** Whether a polynomial holds algebraic numbers at most. */
  boolean isNumber(Polynomial p) {
    List<Integer> known = constants.rules().stream().map(Chain.Rule::variable).toList();
    return known.containsAll(p.support());
  }

  /** The imaginary unit. */
  Gaussian unit() {
    return complex ? Gaussian.real(variable("i")) : Gaussian.unit(variables);
  }

  /** Cosine and sine, or their hyperbolic twins, of a combination of parameters. */
  RationalFunction function(FunctionKind kind, Map<String, Integer> argument) {
    return switch (kind) {
      case EXP -> exponential(argument);
      case COS -> pair(argument, true).even;
      case SIN -> pair(argument, true).odd;
      case TAN -> pair(argument, true).odd.over(pair(argument, true).even);
      case COSH -> pair(argument, false).even;
      case SINH -> pair(argument, false).odd;
      case TANH -> pair(argument, false).odd.over(pair(argument, false).even);
    };
  }

  private RationalFunction exponential(Map<String, Integer> argument) {
    RationalFunction out = number(BigFraction.ONE);
    for (Map.Entry<String, Integer> a : argument.entrySet()) {
      out = out.times(variable("exp(" + a.getKey() + ")").pow(a.getValue()));
    }
    return out;
  }

  /** The even and the odd function of an argument: cos and sin, or cosh and sinh. */
  private record Pair(RationalFunction even, RationalFunction odd) {}

  /** By the addition theorems. */
  private Pair pair(Map<String, Integer> argument, boolean circular) {
    Pair out = new Pair(number(BigFraction.ONE), number(BigFraction.ZERO));
    for (Map.Entry<String, Integer> a : argument.entrySet()) {
      Pair base = base(a.getKey(), circular);
      Pair step = a.getValue() < 0 ? new Pair(base.even, base.odd.negate()) : base;
      for (int k = 0; k < Math.abs(a.getValue()); k++) {
        RationalFunction odds = out.odd.times(step.odd);
        RationalFunction evens = out.even.times(step.even);
        out =
            new Pair(
                normal(circular ? evens.minus(odds) : evens.plus(odds)),
                normal(out.odd.times(step.even).plus(out.even.times(step.odd))));
      }
    }
    return out;
  }

  private Pair base(String p, boolean circular) {
    if (circular) {
      return new Pair(variable("cos(" + p + ")"), variable("sin(" + p + ")"));
    }
    if (arguments.get(p).contains(Coordinates.EXPONENTIAL)) {
      RationalFunction e = variable("exp(" + p + ")");
      RationalFunction half = number(BigFraction.of(1, 2));
      return new Pair(e.plus(e.pow(-1)).times(half), e.minus(e.pow(-1)).times(half));
    }
    return new Pair(variable("cosh(" + p + ")"), variable("sinh(" + p + ")"));
  }
}
