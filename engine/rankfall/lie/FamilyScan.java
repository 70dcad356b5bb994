package rankfall.lie;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import rankfall.spec.Expression;
import rankfall.spec.Spec;

/**
 * What occurs in the expressions of a spec.
 *
 * @param names every name that occurs by itself
 * @param primes whose square roots occur
 * @param circular parameters in cos, sin, tan
 * @param exponential parameters in exp
 * @param hyperbolic parameters in cosh, sinh, tanh
 */
record FamilyScan(
    SortedSet<String> names,
    SortedSet<BigInteger> primes,
    SortedSet<String> circular,
    SortedSet<String> exponential,
    SortedSet<String> hyperbolic) {

  static FamilyScan of(Spec spec) {
    FamilyScan out =
        new FamilyScan(
            new TreeSet<>(), new TreeSet<>(), new TreeSet<>(), new TreeSet<>(), new TreeSet<>());
    Visitor visitor = new Visitor(out);
    expressions(spec).forEach(e -> e.fold(visitor));
    return out;
  }

  /** Whether a parameter is an argument of a function. */
  boolean inFunction(String parameter) {
    return circular.contains(parameter)
        || exponential.contains(parameter)
        || hyperbolic.contains(parameter);
  }

  private static List<Expression> expressions(Spec spec) {
    List<Expression> out = new ArrayList<>();
    spec.where().forEach(c -> out.addAll(List.of(c.left(), c.right())));
    spec.abbreviations().forEach(a -> out.add(a.value()));
    spec.covectors().values().forEach(c -> out.addAll(c.values()));
    if (spec.presentation() instanceof Spec.Brackets b) {
      b.equations().forEach(e -> out.add(e.value()));
    } else if (spec.presentation() instanceof Spec.Matrices m) {
      for (Spec.NamedMatrix x : m.matrices()) {
        if (x.body() instanceof Spec.Rows r) {
          r.entries().forEach(out::addAll);
        } else if (x.body() instanceof Spec.Combination c) {
          out.add(c.value());
        }
      }
    }
    return out;
  }

  /** Notes what it meets; an own object for one scan. */
  private record Visitor(FamilyScan to) implements Expression.Cases<Boolean> {
    @Override
    public Boolean number(Expression.Number e) {
      return true;
    }

    @Override
    public Boolean name(Expression.Name e) {
      return to.names.add(e.name());
    }

    @Override
    public Boolean root(Expression.Root e) {
      return to.primes.addAll(FamilyRoot.of(e).primes());
    }

    @Override
    public Boolean function(Expression.Function e) {
      Set<String> kind =
          switch (e.kind()) {
            case COS, SIN, TAN -> to.circular;
            case EXP -> to.exponential;
            case COSH, SINH, TANH -> to.hyperbolic;
          };
      return kind.addAll(e.argument().keySet());
    }

    @Override
    public Boolean unit(Expression.MatrixUnit e) {
      return true;
    }

    @Override
    public Boolean binary(Expression.Binary e) {
      boolean left = e.left().fold(this);
      boolean right = e.right().fold(this);
      return left || right;
    }

    @Override
    public Boolean negation(Expression.Negation e) {
      return e.operand().fold(this);
    }

    @Override
    public Boolean power(Expression.Power e) {
      return e.base().fold(this);
    }
  }
}
