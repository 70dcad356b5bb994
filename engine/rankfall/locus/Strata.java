package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;

/**
 * The strata, canonical: the irreducible components of the closures of the level sets of the
 * profile.
 *
 * <p>Which leaves a computation happened to find does not matter: the closures of the leaves of one
 * profile have the same maximal members, whatever the leaves.
 */
public final class Strata {
  private final Splitter splitter;
  private final Closures closures;
  private final List<Polynomial> poles;
  private final SortedMap<Profile, List<Chain>> levels = new TreeMap<>();
  private final SortedMap<Integer, List<Chain>> open = new TreeMap<>();

  private Strata(Chain constants, List<Polynomial> poles, Meter meter) {
    this.splitter = new Splitter(constants, meter);
    this.closures = new Closures(constants);
    this.poles = poles;
  }

  /**
   * A stratum.
   *
   * @param closure its closure at the general point
   * @param equations the reduced basis of the closure's prime ideal; empty for the whole space
   * @param exclusions sets that do not belong to it: the equations that each adds to those of the
   *     closure
   * @param profile the same at all its points
   * @param leaves the leaves inside it, that of the general point first
   */
  public record Stratum(
      Chain closure,
      List<Polynomial> equations,
      List<List<Polynomial>> exclusions,
      Profile profile,
      List<Leaf.Defined> leaves) {}

  /**
   * The strata and how they lie.
   *
   * @param strata by descending profile, then by text of the equations
   * @param components the positions of those strata whose closures are the irreducible components
   *     of the parameter variety
   * @param coverings pairs (lower, upper) of positions: lower lies in the closure of upper, and no
   *     stratum's closure between
   */
  public record Result(
      List<Stratum> strata, List<Integer> components, List<List<Integer>> coverings) {}

  /**
   * Assembles the strata.
   *
   * @param constants the chain of the algebraic numbers
   * @param leaves a complete exploration
   * @param poles irreducible polynomials at whose zeros the family is not defined
   * @param meter ends the work early
   */
  public static Result of(Chain constants, List<Leaf> leaves, List<Polynomial> poles, Meter meter) {
    return new Strata(constants, poles, meter).assemble(leaves);
  }

  private Result assemble(List<Leaf> leaves) {
    List<Leaf.Defined> defined = new ArrayList<>();
    SortedMap<Profile, List<Chain>> byProfile = new TreeMap<>();
    for (Leaf leaf : leaves) {
      Chain chain = leaf.piece().chain();
      if (leaf instanceof Leaf.Defined d) {
        defined.add(d);
        byProfile.computeIfAbsent(d.profile(), p -> new ArrayList<>()).add(chain);
      } else if (leaf instanceof Leaf.Open o) {
        open.computeIfAbsent(o.dimension(), n -> new ArrayList<>()).add(chain);
      }
    }
    byProfile.forEach((p, chains) -> levels.put(p, sorted(closures.maximal(chains))));
    open.replaceAll((n, chains) -> closures.maximal(chains));
    List<Stratum> strata = new ArrayList<>();
    levels.forEach(
        (p, chains) -> {
          for (int k = 0; k < chains.size(); k++) {
            strata.add(stratum(p, chains.get(k), chains.subList(0, k), defined));
          }
        });
    return new Result(strata, components(strata), coverings(strata));
  }

  private List<Chain> sorted(List<Chain> chains) {
    List<Chain> out = new ArrayList<>(chains);
    out.sort(Comparator.comparing((Chain c) -> text(closures.ideal(c))));
    return out;
  }

  private static String text(List<Polynomial> equations) {
    return equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
  }

  private Stratum stratum(
      Profile profile, Chain z, List<Chain> earlier, List<Leaf.Defined> defined) {
    List<Chain> excluded = new ArrayList<>();
    List<Chain> across = new ArrayList<>(earlier);
    levels.forEach(
        (p, chains) -> {
          if (!p.equals(profile) && p.mayBeLimitOf(profile)) {
            across.addAll(chains);
          }
        });
    open.headMap(profile.dimension()).values().forEach(across::addAll);
    for (Chain w : across) {
      if (closures.isInside(w, z)) {
        excluded.add(w);
      }
    }
    for (Polynomial p : poles) {
      excluded.addAll(zerosInside(z, p));
    }
    List<Chain> inside = closures.maximal(excluded);
    for (Chain w : across) {
      if (!closures.isInside(w, z) && inside.stream().noneMatch(e -> closures.hold(e, w, z))) {
        excluded.addAll(closures.intersection(splitter, w, z));
      }
    }
    List<List<Polynomial>> exclusions =
        sorted(closures.maximal(excluded)).stream().map(w -> added(w, z)).toList();
    return new Stratum(z, closures.ideal(z), exclusions, profile, inside(z, profile, defined));
  }

  private List<Chain> zerosInside(Chain z, Polynomial p) {
    List<Polynomial> equations = new ArrayList<>(closures.ideal(z));
    equations.add(p);
    return splitter.zeros(equations, List.of()).stream().map(Piece::chain).toList();
  }

  /** The equations of w that do not hold on all of z. */
  private List<Polynomial> added(Chain w, Chain z) {
    return closures.ideal(w).stream().filter(p -> !z.vanishes(p)).toList();
  }

  private List<Leaf.Defined> inside(Chain z, Profile profile, List<Leaf.Defined> defined) {
    return closures.leavesInside(
        splitter, z, defined.stream().filter(l -> l.profile().equals(profile)).toList());
  }

  private List<Integer> components(List<Stratum> strata) {
    List<Chain> maximal = closures.maximal(strata.stream().map(Stratum::closure).toList());
    List<Integer> out = new ArrayList<>();
    for (int k = 0; k < strata.size(); k++) {
      if (maximal.contains(strata.get(k).closure())) {
        out.add(k);
      }
    }
    return out;
  }

  private List<List<Integer>> coverings(List<Stratum> strata) {
    int n = strata.size();
    boolean[][] below = new boolean[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        below[i][j] = i != j && closures.isInside(strata.get(i).closure(), strata.get(j).closure());
      }
    }
    List<List<Integer>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        boolean direct = below[i][j] && !below[j][i];
        for (int k = 0; k < n && direct; k++) {
          direct = !(below[i][k] && below[k][j] && !below[k][i] && !below[j][k]);
        }
        if (direct) {
          out.add(List.of(i, j));
        }
      }
    }
    return out;
  }
}
