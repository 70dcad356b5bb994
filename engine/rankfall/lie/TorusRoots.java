package rankfall.lie;

import java.util.List;
import rankfall.exact.RationalFunction;

/**
 * The roots of an algebra with respect to commuting elements t_k: the linear forms of y whose
 * values are the eigenvalues of ad(sum y_k t_k).
 *
 * <p>The matrices of ad t_k fall into common blocks; the characteristic polynomial of a block of
 * the sum, with the y as variables, is factored over the field of the set.
 */
public sealed interface TorusRoots {

  /**
   * All eigenvalues are known.
   *
   * @param imaginary whether they are i times the values of the roots
   * @param roots the different ones without 0, by their values on the elements
   */
  record Found(boolean imaginary, List<List<RationalFunction>> roots) implements TorusRoots {
    /** Copies the lists. */
    public Found {
      roots = roots.stream().map(List::copyOf).toList();
    }
  }

  /**
   * They are not told.
   *
   * @param reason a clause
   */
  record NotTold(String reason) implements TorusRoots {}

  /**
   * The roots.
   *
   * @param elements independent and commuting
   */
  static TorusRoots of(CommutingElements elements) {
    return new RootSearch(elements).run();
  }
}
