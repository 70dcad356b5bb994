package rankfall.lie;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * The form on the dual space of a space with a non-degenerate symmetric form: the inverse matrix,
 * computed block by block and checked by multiplication.
 *
 * @param matrix n rows of n quotients
 */
public record DualForm(List<List<RationalFunction>> matrix) {
  /** Copies the matrix. */
  public DualForm {
    matrix = matrix.stream().map(List::copyOf).toList();
  }

  /**
   * The dual of a form.
   *
   * @param chain the set of points on which the form is given; everything holds at its general
   *     point
   * @param form a symmetric matrix, its denominators not 0 on the chain
   * @return empty if the form is degenerate on the whole chain
   * @throws IllegalStateException if the product of form and result is not 1
   */
  public static Optional<DualForm> of(Chain chain, List<List<RationalFunction>> form) {
    int n = form.size();
    RationalFunction zero = RationalFunction.of(chain.zero());
    List<List<RationalFunction>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      out.add(new ArrayList<>(Collections.nCopies(n, zero)));
    }
    for (List<Integer> block :
        ZeroPattern.blocks(n, (i, j) -> !chain.vanishes(form.get(i).get(j).numerator()))) {
      List<List<RationalFunction>> part = ZeroPattern.part(form, block);
      Optional<List<List<RationalFunction>>> inverse = inverse(chain, part);
      if (inverse.isEmpty()) {
        return Optional.empty();
      }
      requireInverse(chain, part, inverse.get());
      for (int a = 0; a < block.size(); a++) {
        for (int b = 0; b < block.size(); b++) {
          out.get(block.get(a)).set(block.get(b), inverse.get().get(a).get(b));
        }
      }
    }
    return Optional.of(new DualForm(out));
  }

  /** Row reduction of (L*form | L), L the diagonal matrix of the rows' common denominators. */
  private static Optional<List<List<RationalFunction>>> inverse(
      Chain chain, List<List<RationalFunction>> part) {
    int n = part.size();
    List<SortedMap<Integer, Polynomial>> rows = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      Polynomial denominator = chain.one();
      for (RationalFunction f : part.get(i)) {
        denominator = denominator.times(f.denominator().over(denominator.gcd(f.denominator())));
      }
      SortedMap<Integer, Polynomial> row = new TreeMap<>();
      for (int j = 0; j < n; j++) {
        RationalFunction f = part.get(i).get(j);
        if (!f.isZero()) {
          row.put(j, f.numerator().times(denominator.over(f.denominator())));
        }
      }
      row.put(n + i, denominator);
      rows.add(row);
    }
    Echelon<Polynomial> echelon = Elimination.of(chain, rows, 2 * n, n, false);
    if (echelon.rank() < n) {
      return Optional.empty();
    }
    List<List<RationalFunction>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      SortedMap<Integer, Polynomial> row = echelon.rows().get(i);
      List<RationalFunction> entries = new ArrayList<>();
      for (int j = 0; j < n; j++) {
        Polynomial above = row.getOrDefault(n + j, chain.zero());
        entries.add(RationalFunction.of(above, row.get(i)));
      }
      out.add(entries);
    }
    return Optional.of(out);
  }

  /** Fails unless the product of the two matrices is 1 on the chain. */
  static void requireInverse(
      Chain chain, List<List<RationalFunction>> a, List<List<RationalFunction>> b) {
    RationalFunction one = RationalFunction.of(chain.one());
    for (int i = 0; i < a.size(); i++) {
      for (int j = 0; j < a.size(); j++) {
        RationalFunction sum = RationalFunction.of(chain.zero());
        for (int k = 0; k < a.size(); k++) {
          sum = sum.plus(a.get(i).get(k).times(b.get(k).get(j)));
        }
        RationalFunction rest = i == j ? sum.minus(one) : sum;
        if (!chain.vanishes(rest.numerator())) {
          throw new IllegalStateException(
              "form times dual form is not 1 in row " + (i + 1) + ", column " + (j + 1));
        }
      }
    }
  }
}
