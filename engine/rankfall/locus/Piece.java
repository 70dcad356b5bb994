package rankfall.locus;

import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;

/**
 * An irreducible locally closed set: the points that satisfy the rules of a chain, at which no
 * initial and none of some polynomials vanishes.
 *
 * @param chain irreducible
 * @param nonZero primitive irreducible polynomials, none of which vanishes on the chain; the
 *     irreducible factors of the initials are among them
 */
public record Piece(Chain chain, List<Polynomial> nonZero) {
  /** Drops repetitions. */
  public Piece {
    SortedMap<String, Polynomial> byText = new TreeMap<>();
    nonZero.forEach(p -> byText.put(p.toString(), p));
    nonZero = List.copyOf(byText.values());
  }

  /** The same set without the zeros of further polynomials. */
  public Piece without(List<Polynomial> polynomials) {
    List<Polynomial> all = new java.util.ArrayList<>(nonZero);
    all.addAll(polynomials);
    return new Piece(chain, all);
  }
}
