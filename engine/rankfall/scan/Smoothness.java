package rankfall.scan;

import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Polynomial;

/**
 * Where the real zeros of the equations of an irreducible set are a manifold of its full dimension:
 * where a minor of the matrix of derivatives, as large as the codimension, is not 0 (the Jacobian
 * criterion; Bochnak, Coste, Roy, Real Algebraic Geometry 1998, prop. 3.3.10, place from memory).
 * This is enough and not needed: at other points nothing is claimed.
 *
 * @param everywhere whether it is so at all points
 * @param minors some of those minors; the set is such a manifold where one is not 0
 */
record Smoothness(boolean everywhere, List<Polynomial> minors) {
  private static final int MOST_ROWS = 3;
  private static final int MOST_MINORS = 24;
  private static final int MOST_LOOKED_AT = 2000;

  /** Copies the list. */
  Smoothness {
    minors = List.copyOf(minors);
  }

  /**
   * Looks at the equations of a closure.
   *
   * @param equations that generate its ideal
   * @param codimension of the set
   */
  static Smoothness of(List<Polynomial> equations, int codimension) {
    if (equations.size() == codimension && isGraph(equations)) {
      return new Smoothness(true, List.of());
    }
    if (codimension > MOST_ROWS) {
      return new Smoothness(false, List.of());
    }
    List<Polynomial> out = new ArrayList<>();
    int variables = equations.get(0).variables().indeterminates();
    List<List<Integer>> columnChoices = choices(variables, codimension);
    int looked = 0;
    for (List<Integer> rows : choices(equations.size(), codimension)) {
      for (List<Integer> columns : columnChoices) {
        if (looked++ > MOST_LOOKED_AT || out.size() >= MOST_MINORS) {
          return new Smoothness(false, out);
        }
        Polynomial minor = minor(equations, rows, columns);
        if (minor.isConstant() && !minor.isZero()) {
          return new Smoothness(true, List.of());
        }
        if (!minor.isZero()) {
          out.add(minor);
        }
      }
    }
    return new Smoothness(false, out);
  }

  /** Whether each equation is solved for a variable that no other one holds. */
  private static boolean isGraph(List<Polynomial> equations) {
    return equations.stream()
        .allMatch(
            p ->
                p.support().stream()
                    .filter(v -> v < p.variables().indeterminates())
                    .filter(v -> p.degree(v) == 1 && p.coefficient(v, 1).isConstant())
                    .anyMatch(v -> equations.stream().noneMatch(q -> q != p && q.contains(v))));
  }

  private static Polynomial minor(
      List<Polynomial> equations, List<Integer> rows, List<Integer> columns) {
    if (rows.isEmpty()) {
      return Polynomial.one(equations.get(0).variables());
    }
    Polynomial first = equations.get(rows.get(0));
    Polynomial sum = Polynomial.zero(first.variables());
    for (int k = 0; k < columns.size(); k++) {
      Polynomial d = first.derivative(columns.get(k));
      if (!d.isZero()) {
        List<Integer> rest = new ArrayList<>(columns);
        rest.remove(k);
        Polynomial term = d.times(minor(equations, rows.subList(1, rows.size()), rest));
        sum = k % 2 == 0 ? sum.plus(term) : sum.minus(term);
      }
    }
    return sum;
  }

  /** All choices of some of the numbers below n, ascending. */
  private static List<List<Integer>> choices(int n, int some) {
    List<List<Integer>> out = new ArrayList<>();
    extend(n, some, List.of(), out);
    return out;
  }

  private static void extend(int n, int some, List<Integer> chosen, List<List<Integer>> out) {
    if (chosen.size() == some) {
      out.add(chosen);
      return;
    }
    int from = chosen.isEmpty() ? 0 : chosen.get(chosen.size() - 1) + 1;
    for (int v = from; v < n; v++) {
      List<Integer> longer = new ArrayList<>(chosen);
      longer.add(v);
      extend(n, some, List.copyOf(longer), out);
    }
  }
}
