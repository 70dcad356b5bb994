package rankfall.locus;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;

/**
 * The irreducible factors of polynomials, remembered: the same few come back at every cut.
 *
 * <p>One object serves one computation on one thread.
 */
final class Factors {
  private final Chain constants;
  private final Map<Polynomial, List<Polynomial>> known = new HashMap<>();

  /** Factors over the algebraic numbers of a ring. */
  Factors(Chain constants) {
    this.constants = constants;
  }

  /**
   * The different irreducible factors.
   *
   * @param p not 0 over the algebraic numbers
   * @return those that hold another variable
   */
  List<Polynomial> of(Polynomial p) {
    return known.computeIfAbsent(
        p.primitive(), q -> List.copyOf(ChainFactoring.irreducible(constants, q)));
  }
}
