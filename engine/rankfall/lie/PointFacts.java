package rankfall.lie;

import java.util.List;
import java.util.Optional;

/**
 * All that is said about the algebra at one exact point.
 *
 * @param generators the number of listed generators
 * @param dimension the dimension of the algebra
 * @param killing the Killing form in the given basis
 * @param derivedSeries dimensions, each once
 * @param lowerCentralSeries dimensions, each once
 * @param centre dimension
 * @param radical dimension
 * @param nilradical dimension
 * @param unimodular whether tr ad x = 0 for all x
 * @param invariantForms the invariant symmetric forms
 * @param abelian whether all brackets are 0
 * @param nilpotent whether the lower central series ends in 0
 * @param solvable whether the derived series ends in 0
 * @param semisimple whether n is positive and the Killing form non-degenerate
 * @param reductive whether the radical is the centre
 * @param compact whether the algebra is real, n positive and the Killing form negative definite
 */
public record PointFacts(
    int generators,
    int dimension,
    Killing killing,
    List<Integer> derivedSeries,
    List<Integer> lowerCentralSeries,
    int centre,
    int radical,
    int nilradical,
    boolean unimodular,
    Forms invariantForms,
    boolean abelian,
    boolean nilpotent,
    boolean solvable,
    boolean semisimple,
    boolean reductive,
    boolean compact) {
  /** Copies the lists. */
  public PointFacts {
    derivedSeries = List.copyOf(derivedSeries);
    lowerCentralSeries = List.copyOf(lowerCentralSeries);
  }

  /**
   * The Killing form.
   *
   * @param rank the rank
   * @param signature empty over complex ground
   * @param determinant exact text; {@code 1} in dimension 0
   * @param matrix n rows of n exact texts
   */
  public record Killing(
      int rank, Optional<Signature> signature, String determinant, List<List<String>> matrix) {
    /** Copies the matrix. */
    public Killing {
      matrix = matrix.stream().map(List::copyOf).toList();
    }
  }

  /**
   * The invariant symmetric forms.
   *
   * @param dimension the number of independent ones
   * @param maximalRank the greatest rank that one has
   */
  public record Forms(int dimension, MaximalRank maximalRank) {}
}
