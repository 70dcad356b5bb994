package rankfall.locus;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.Ideals;
import rankfall.lie.LieBracket;
import rankfall.lie.Nilradical;
import rankfall.lie.StructureConstants;
import rankfall.lie.Subspace;

/**
 * The dimensions of radical and nilradical all over a stratum: at its general point, and where
 * inside it they differ.
 *
 * @param general at the general point
 * @param deviations where inside the stratum they differ
 */
public record IdealDimensions(Dimensions general, List<Deviation> deviations) {

  /**
   * Two dimensions.
   *
   * @param radical of the largest solvable ideal
   * @param nilradical of the largest nilpotent ideal
   */
  public record Dimensions(int radical, int nilradical) {}

  /**
   * Points of the stratum with other dimensions.
   *
   * @param dimensions what they are there
   * @param equations what these points satisfy beyond the equations of the stratum
   */
  public record Deviation(Dimensions dimensions, List<Polynomial> equations) {}

  /**
   * The dimensions on a stratum.
   *
   * @param stratum with the leaves inside it
   * @param constants the chain of the algebraic numbers
   * @param meter ends the work early
   */
  public static IdealDimensions of(Strata.Stratum stratum, Chain constants, Meter meter) {
    Profile p = stratum.profile();
    if (p.rank() == p.dimension() || p.derived() == 0) {
      int d = p.derived() == 0 ? p.dimension() : 0;
      return new IdealDimensions(new Dimensions(d, d), List.of());
    }
    Cutter cutter = new Cutter(constants, meter);
    SortedMap<String, List<Chain>> found = new TreeMap<>();
    SortedMap<String, Dimensions> values = new TreeMap<>();
    Dimensions general = null;
    Deque<Task> open = new ArrayDeque<>();
    stratum.leaves().forEach(l -> open.add(new Task(l.piece(), l.algebra())));
    while (!open.isEmpty()) {
      meter.branch();
      Task task = open.poll();
      BranchAlgebra algebra = task.algebra().on(task.piece().chain());
      List<Polynomial> watched = new ArrayList<>();
      Dimensions d = dimensions(task.piece(), algebra, watched);
      general = general == null ? d : general;
      if (!d.equals(general)) {
        found.computeIfAbsent(d.toString(), k -> new ArrayList<>()).add(task.piece().chain());
        values.put(d.toString(), d);
      }
      cutter.cut(task.piece(), watched).cut().forEach(q -> open.add(new Task(q, algebra)));
    }
    return new IdealDimensions(general, deviations(stratum, found, values, constants));
  }

  private record Task(Piece piece, BranchAlgebra algebra) {}

  private static Dimensions dimensions(
      Piece piece, BranchAlgebra algebra, List<Polynomial> watched) {
    StructureConstants<Polynomial> c = algebra.constants();
    KnownNonZero domain = KnownNonZero.on(piece);
    LieBracket<Polynomial> bracket =
        LieBracket.of(
            new StructureConstants<>(
                domain, c.dimension(), c.brackets(), c.denominator(), c.scale()));
    Subspace<Polynomial> radical =
        Ideals.radical(bracket, algebra.killing(), Ideals.derived(bracket));
    Subspace<Polynomial> nilradical = Nilradical.of(bracket, radical);
    watched.addAll(radical.nonVanishing());
    watched.addAll(nilradical.nonVanishing());
    return new Dimensions(radical.dimension(), nilradical.dimension());
  }

  private static List<Deviation> deviations(
      Strata.Stratum stratum,
      SortedMap<String, List<Chain>> found,
      SortedMap<String, Dimensions> values,
      Chain constants) {
    Closures closures = new Closures(constants);
    List<Deviation> out = new ArrayList<>();
    found.forEach(
        (key, chains) -> {
          for (Chain c : closures.maximal(chains)) {
            out.add(
                new Deviation(
                    values.get(key),
                    closures.ideal(c).stream()
                        .filter(q -> !stratum.closure().vanishes(q))
                        .toList()));
          }
        });
    out.sort(
        Comparator.comparing(
            e -> e.equations().stream().map(Polynomial::toString).collect(Collectors.joining())));
    return out;
  }
}
