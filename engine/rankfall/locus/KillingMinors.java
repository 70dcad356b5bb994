package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import rankfall.exact.Chain;
import rankfall.exact.Determinant;
import rankfall.exact.Factoring;
import rankfall.exact.Polynomial;

/**
 * Polynomials whose signs tell the signature of the Killing form where none of them vanishes: the
 * factors of a chain of principal minors, of which no two neighbours vanish (Jacobi's rule,
 * Gantmacher 1959, The Theory of Matrices, vol. 1, ch. X, par. 3, place from memory).
 */
final class KillingMinors {
  private KillingMinors() {}

  /** Irreducible factors, in the free variables and the tower of the leaf's chain. */
  static List<Polynomial> of(Leaf.Defined leaf) {
    Chain chain = leaf.piece().chain();
    List<List<Polynomial>> kappa = leaf.algebra().killing();
    Set<Polynomial> out = new TreeSet<>(Chart.BY_SIZE);
    List<Integer> kept = new ArrayList<>();
    List<Integer> open = new ArrayList<>();
    for (int i = 0; i < kappa.size(); i++) {
      open.add(i);
    }
    while (grown(chain, kappa, kept, open, out)) {
      continue;
    }
    return List.copyOf(out);
  }

  /** Adds one index, or two, such that the minor does not vanish; false if there are none. */
  private static boolean grown(
      Chain chain,
      List<List<Polynomial>> kappa,
      List<Integer> kept,
      List<Integer> open,
      Set<Polynomial> out) {
    for (int i : open) {
      if (taken(chain, kappa, kept, List.of(i), out)) {
        open.removeAll(kept);
        return true;
      }
    }
    for (int i : open) {
      for (int j : open) {
        if (i < j && taken(chain, kappa, kept, List.of(i, j), out)) {
          open.removeAll(kept);
          return true;
        }
      }
    }
    return false;
  }

  private static boolean taken(
      Chain chain,
      List<List<Polynomial>> kappa,
      List<Integer> kept,
      List<Integer> more,
      Set<Polynomial> out) {
    List<Integer> all = new ArrayList<>(kept);
    all.addAll(more);
    List<List<Polynomial>> part =
        all.stream().map(i -> all.stream().map(j -> kappa.get(i).get(j)).toList()).toList();
    Polynomial minor = chain.reduced(Determinant.of(chain.variables(), part));
    if (minor.isZero()) {
      return false;
    }
    out.addAll(Factoring.irreducible(minor));
    kept.addAll(more);
    return true;
  }
}
