package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Rationals;

/**
 * A line or a plane of parameters inside a component: some coordinates are held at the values of a
 * point, others follow from the free ones through the equations of the component.
 *
 * @param free positions of the free coordinates
 * @param held values by position
 * @param solved what the others are, by position, in the free coordinates; the denominator is a
 *     positive integer
 */
record MapSlice(
    List<Integer> free, Map<Integer, BigFraction> held, Map<Integer, RationalFunction> solved) {
  private static final int MOST_TRIES = 200;

  /**
   * A slice on which all equations hold.
   *
   * @param constants the equations of the algebraic numbers
   * @param equations of the component
   * @param point a point of it: values of the first coordinates of the ring, in their order
   * @param free positions of the free coordinates
   * @param dependent how many others follow from them
   * @return empty where no choice of these makes the equations linear
   */
  static Optional<MapSlice> of(
      Chain constants,
      List<Polynomial> equations,
      List<BigFraction> point,
      List<Integer> free,
      int dependent) {
    List<Integer> rest = new ArrayList<>();
    for (int v = 0; v < point.size(); v++) {
      if (!free.contains(v)) {
        rest.add(v);
      }
    }
    List<List<Integer>> choices = new ArrayList<>();
    choose(rest, dependent, 0, List.of(), choices);
    for (List<Integer> choice : choices) {
      Map<Integer, BigFraction> held = new TreeMap<>();
      rest.stream().filter(v -> !choice.contains(v)).forEach(v -> held.put(v, point.get(v)));
      Optional<MapSlice> slice = solved(constants, equations, free, held, choice);
      if (slice.isPresent()) {
        return slice;
      }
    }
    return Optional.empty();
  }

  private static void choose(
      List<Integer> from, int count, int start, List<Integer> taken, List<List<Integer>> out) {
    if (taken.size() == count) {
      out.add(taken);
      return;
    }
    for (int k = start; k < from.size() && out.size() < MOST_TRIES; k++) {
      List<Integer> more = new ArrayList<>(taken);
      more.add(from.get(k));
      choose(from, count, k + 1, more, out);
    }
  }

  private static Optional<MapSlice> solved(
      Chain constants,
      List<Polynomial> equations,
      List<Integer> free,
      Map<Integer, BigFraction> held,
      List<Integer> dependent) {
    MapSlice slice = new MapSlice(free, held, Map.of());
    boolean found = true;
    while (found) {
      found = false;
      for (Polynomial e : equations) {
        Polynomial p = constants.reduced(slice.on(e));
        for (int v : dependent) {
          if (!found && !slice.solved.containsKey(v) && isSolvable(p, v)) {
            slice = slice.with(v, p);
            found = true;
          }
        }
      }
    }
    boolean holds = true;
    for (Polynomial e : equations) {
      holds &= constants.vanishes(slice.on(e));
    }
    return holds && slice.solved.size() == dependent.size() ? Optional.of(slice) : Optional.empty();
  }

  private static boolean isSolvable(Polynomial p, int v) {
    return p.degree(v) == 1 && p.coefficient(v, 1).isConstant();
  }

  /** With one more coordinate given by an equation, and put into those found before. */
  private MapSlice with(int v, Polynomial p) {
    RationalFunction value = RationalFunction.of(p.coefficient(v, 0).negate(), p.coefficient(v, 1));
    Map<Integer, RationalFunction> more = new TreeMap<>();
    solved.forEach((w, f) -> more.put(w, put(f, v, value)));
    more.put(v, value);
    return new MapSlice(free, held, more);
  }

  private static RationalFunction put(RationalFunction f, int v, RationalFunction value) {
    int degree = f.numerator().degree(v);
    return RationalFunction.of(
        put(f.numerator(), v, value), f.denominator().times(value.denominator().pow(degree)));
  }

  /** A polynomial with a quotient put in place of a variable, times a power of the denominator. */
  private static Polynomial put(Polynomial p, int v, RationalFunction value) {
    int degree = p.degree(v);
    Polynomial sum = Polynomial.zero(p.variables());
    for (int k = 0; k <= degree; k++) {
      sum =
          sum.plus(
              p.coefficient(v, k)
                  .times(value.numerator().pow(k))
                  .times(value.denominator().pow(degree - k)));
    }
    return sum;
  }

  /** A positive multiple of a polynomial, as it is on the slice. */
  Polynomial on(Polynomial p) {
    Polynomial q = p;
    for (Map.Entry<Integer, BigFraction> h : held.entrySet()) {
      q = put(q, h.getKey(), number(p, h.getValue()));
    }
    for (Map.Entry<Integer, RationalFunction> s : solved.entrySet()) {
      q = put(q, s.getKey(), s.getValue());
    }
    return q.isZero() ? q : q.over(Polynomial.constant(q.variables(), q.content()));
  }

  private static RationalFunction number(Polynomial like, BigFraction value) {
    return RationalFunction.of(
        Polynomial.constant(like.variables(), Rationals.numerator(value)),
        Polynomial.constant(like.variables(), Rationals.denominator(value)));
  }
}
