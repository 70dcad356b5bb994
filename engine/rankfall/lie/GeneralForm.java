package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import rankfall.exact.ExtendedChain;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * The general member sum c_k B_k of a space of symmetric matrices, the c_k being variables.
 *
 * @param ring the set over which the B_k are given, with the c_k
 * @param coefficients names of the c_k
 * @param matrix the sum
 */
public record GeneralForm(
    ExtendedChain ring, List<String> coefficients, List<List<RationalFunction>> matrix) {
  /** Most monomials in the c_k that the determinant of a block may have. */
  private static final long MOST_TERMS = 400;

  /** Largest block of which a determinant is taken. */
  private static final int LARGEST_BLOCK = 10;

  /** Copies the lists. */
  public GeneralForm {
    coefficients = List.copyOf(coefficients);
    matrix = matrix.stream().map(List::copyOf).toList();
  }

  /**
   * The general member.
   *
   * @param ring a chain with the c_k
   * @param coefficients names of the c_k, as many as matrices
   * @param n the number of rows
   * @param basis symmetric matrices of n sparse rows
   */
  public static GeneralForm of(
      ExtendedChain ring,
      List<String> coefficients,
      int n,
      List<List<SortedMap<Integer, Polynomial>>> basis) {
    List<List<RationalFunction>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      List<RationalFunction> row = new ArrayList<>();
      for (int j = 0; j < n; j++) {
        Polynomial sum = ring.chain().zero();
        for (int k = 0; k < basis.size(); k++) {
          Polynomial entry = basis.get(k).get(i).get(j);
          if (entry != null) {
            sum = sum.plus(ring.up(entry).times(ring.variable(coefficients.get(k))));
          }
        }
        row.add(RationalFunction.of(sum));
      }
      out.add(row);
    }
    return new GeneralForm(ring, coefficients, out);
  }

  /** Whether the determinant is short enough to be written out. */
  public boolean isShort() {
    for (List<Integer> block :
        ZeroPattern.blocks(matrix.size(), (i, j) -> !matrix.get(i).get(j).isZero())) {
      long terms = 1;
      for (int k = 1; k < coefficients.size() && terms <= MOST_TERMS; k++) {
        terms = terms * (block.size() + k) / k;
      }
      if (terms > MOST_TERMS || block.size() > LARGEST_BLOCK) {
        return false;
      }
    }
    return true;
  }

  /**
   * The determinant, factored over the rational numbers and those of the spec.
   *
   * @return empty if it vanishes all over the set for all c
   */
  public Optional<KillingForm.FactoredQuotient> determinant() {
    return KillingForm.determinant(ring.chain(), matrix);
  }

  /**
   * The inverse matrix.
   *
   * @return empty if there is none
   */
  public Optional<DualForm> inverse() {
    return DualForm.of(ring.chain(), matrix);
  }
}
