package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.ChainFractions;
import rankfall.exact.Elimination;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * Rational functions on an irreducible set, followed into an irreducible set inside it.
 *
 * <p>A function has a value at the general point of the inner set if it is a quotient whose
 * denominator does not vanish there. Such a denominator is looked for among all that the function
 * has: they form the ideal quotient of the denominator, with the equations of the set, by the
 * numerator. Where there is none and the set is smooth, the function has no limit, because the
 * local ring at a smooth point is factorial (Auslander and Buchsbaum 1959, "Unique factorization in
 * regular local rings").
 *
 * @param bases for the ring
 * @param general the set
 * @param equations a basis of its prime ideal
 * @param special the inner set
 */
record Approach(GroebnerBasis bases, Chain general, List<Polynomial> equations, Chain special) {

  /** What a function does. */
  sealed interface Answer permits Value, Without, Unknown {}

  /** It has a limit, given at the general point of the inner set. */
  record Value(RationalFunction function) implements Answer {}

  /** It has no limit. */
  record Without() implements Answer {}

  /** It was not decided, a clause says why. */
  record Unknown(String reason) implements Answer {}

  /** Follows one function. */
  Answer of(RationalFunction f) {
    RationalFunction c = ChainFractions.canonical(general, f);
    if (!special.vanishes(c.denominator())) {
      return value(c.numerator(), c.denominator());
    }
    if (isRationalSpace()) {
      return new Without();
    }
    List<Polynomial> denominators = denominators(c.numerator(), c.denominator());
    if (!denominators.isEmpty()) {
      return denominators.stream()
          .flatMap(h -> otherQuotient(c, h).stream())
          .findFirst()
          .orElse(new Unknown("it has a limit whose value was not found"));
    }
    if (isSmooth() || !denominators(c.denominator(), c.numerator()).isEmpty()) {
      return new Without();
    }
    return new Unknown("the component is not smooth there");
  }

  /** The quotient as it stands, or in its canonical form on the inner set if that is not longer. */
  private Answer value(Polynomial numerator, Polynomial denominator) {
    RationalFunction canonical = ChainFractions.canonical(special, numerator, denominator);
    RationalFunction given = RationalFunction.of(numerator, denominator);
    return new Value(length(canonical) <= length(given) ? canonical : given);
  }

  private static int length(RationalFunction f) {
    int below = f.denominator().isConstant() ? 0 : f.denominator().termCount();
    return f.numerator().termCount() + below;
  }

  /** Whether the set is a linear space over its free variables, where lowest terms are unique. */
  private boolean isRationalSpace() {
    return general.rules().stream().allMatch(r -> r.isLinear() && r.initial().isConstant());
  }

  /** Denominators of a quotient that do not vanish on the inner set; those suffice of a basis. */
  private List<Polynomial> denominators(Polynomial numerator, Polynomial denominator) {
    if (general.vanishes(numerator)) {
      return List.of(general.one());
    }
    return bases.quotient(with(denominator), numerator).stream()
        .filter(h -> !special.vanishes(h))
        .toList();
  }

  private List<Polynomial> with(Polynomial p) {
    List<Polynomial> out = new ArrayList<>(equations);
    out.add(p);
    return out;
  }

  /** The value, the function being a polynomial over h: the polynomial or a multiple is found. */
  private Optional<Answer> otherQuotient(RationalFunction c, Polynomial h) {
    Polynomial above = h.times(c.numerator());
    RationalFunction direct = ChainFractions.canonical(general, above, c.denominator());
    if (!special.vanishes(direct.denominator())) {
      return Optional.of(value(direct.numerator(), direct.denominator().times(h)));
    }
    for (Polynomial e : bases.quotient(with(above), c.denominator())) {
      RationalFunction unit = ChainFractions.canonical(general, e.times(c.denominator()), above);
      if (!special.vanishes(unit.numerator()) && !special.vanishes(unit.denominator())) {
        return Optional.of(value(e.times(unit.denominator()), h.times(unit.numerator())));
      }
    }
    return Optional.empty();
  }

  /** The Jacobian criterion at the general point of the inner set. */
  private boolean isSmooth() {
    List<Integer> numbers =
        ChainFactoring.numbers(general).stream().map(Chain.Rule::variable).toList();
    List<SortedMap<Integer, Polynomial>> rows = new ArrayList<>();
    int count = general.variables().count();
    for (Polynomial p : equations) {
      List<Polynomial> gradient = new ArrayList<>();
      for (int v = 0; v < count; v++) {
        gradient.add(numbers.contains(v) ? general.zero() : p.derivative(v));
      }
      List<Polynomial> reduced = special.reduced(gradient);
      SortedMap<Integer, Polynomial> row = new TreeMap<>();
      for (int v = 0; v < count; v++) {
        if (!reduced.get(v).isZero()) {
          row.put(v, reduced.get(v));
        }
      }
      rows.add(row);
    }
    int rank = Elimination.of(special, rows, count).rank();
    return rank == count - numbers.size() - general.dimension();
  }
}
