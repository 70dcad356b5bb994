package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import rankfall.exact.Chain;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;

/**
 * Inclusions between the closures of chains, and their prime ideals.
 *
 * <p>Most inclusions are told at the general point: if the rules of Z vanish at that of W and no
 * initial of Z does, W lies in the closure of Z. Only where an initial vanishes the ideal of Z is
 * needed. Ideals are remembered; one object serves one family on one thread.
 */
public final class Closures {
  private final GroebnerBasis bases;
  private final Map<Chain, List<Polynomial>> ideals = new HashMap<>();

  /**
   * For the chains of one ring.
   *
   * @param constants the chain of the algebraic numbers
   */
  public Closures(Chain constants) {
    this.bases = new GroebnerBasis(constants);
  }

  /** The reduced basis of the prime ideal of the closure. */
  public List<Polynomial> ideal(Chain chain) {
    return ideals.computeIfAbsent(chain, bases::of);
  }

  /** Whether the closure of w lies in the closure of z. */
  public boolean isInside(Chain w, Chain z) {
    if (w.dimension() > z.dimension()) {
      return false;
    }
    if (!z.rules().stream().allMatch(r -> w.vanishes(r.equation()))) {
      return false;
    }
    return z.initials().stream().noneMatch(w::vanishes) || ideal(z).stream().allMatch(w::vanishes);
  }

  /**
   * Those sets that lie in no other one, each once.
   *
   * @param chains any
   * @return in no particular order
   */
  public List<Chain> maximal(List<Chain> chains) {
    List<Chain> byDimension = new ArrayList<>(chains);
    byDimension.sort(
        Comparator.comparingInt((Chain c) -> -c.dimension())
            .thenComparingInt(c -> c.initials().size()));
    List<Chain> out = new ArrayList<>();
    for (Chain c : byDimension) {
      if (out.stream().noneMatch(z -> isInside(c, z))) {
        out.add(c);
      }
    }
    return out;
  }

  /**
   * Whether what two closures share visibly lies in a third: each of its equations is one of
   * theirs.
   *
   * @param third a closure
   * @param a a closure
   * @param b a closure
   * @return true only if it does; false tells nothing
   */
  public boolean hold(Chain third, Chain a, Chain b) {
    List<Polynomial> first = ideal(a);
    List<Polynomial> second = ideal(b);
    return ideal(third).stream().allMatch(p -> first.contains(p) || second.contains(p));
  }

  /** The components of what two closures share. */
  public List<Chain> intersection(Splitter splitter, Chain a, Chain b) {
    List<Polynomial> equations = new ArrayList<>(ideal(a));
    equations.addAll(ideal(b));
    return maximal(splitter.zeros(equations, List.of()).stream().map(Piece::chain).toList());
  }
}
