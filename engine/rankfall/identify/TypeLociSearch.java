package rankfall.identify;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import rankfall.exact.Chain;
import rankfall.exact.Factoring;
import rankfall.exact.Factorization;
import rankfall.exact.Polynomial;
import rankfall.lie.LieBracket;
import rankfall.lie.StructureConstants;
import rankfall.locus.BranchAlgebra;
import rankfall.locus.Closures;
import rankfall.locus.Cutter;
import rankfall.locus.KnownNonZero;
import rankfall.locus.Leaf;
import rankfall.locus.Meter;
import rankfall.locus.Piece;
import rankfall.locus.Splitter;
import rankfall.locus.Strata;

/** The work of {@link TypeLoci} on one stratum. */
final class TypeLociSearch {
  private final Strata.Stratum stratum;
  private final Chain constants;
  private final Meter meter;
  private final Closures closures;
  private final Splitter splitter;

  /** Closures of pieces with the same facts, by the text of these. */
  private final Map<String, List<Chain>> levels = new LinkedHashMap<>();

  private final Map<String, List<Leaf.Defined>> leaves = new LinkedHashMap<>();
  private final Map<Chain, Found> found = new LinkedHashMap<>();

  TypeLociSearch(Strata.Stratum stratum, Chain constants, Meter meter) {
    this.stratum = stratum;
    this.constants = constants;
    this.meter = meter;
    this.closures = new Closures(constants);
    this.splitter = new Splitter(constants, meter);
  }

  /**
   * What is so all over a piece, where none of some polynomials vanishes.
   *
   * @param text the facts that are constant
   * @param walls numbers whose sign decides
   */
  private record Found(
      String text,
      TypeLoci.Argument argument,
      List<Polynomial> walls,
      SortedMap<String, String> parameters,
      List<Polynomial> assumed) {}

  private record Task(Piece piece, BranchAlgebra algebra) {}

  TypeLoci loci() {
    explore();
    List<TypeLoci.Locus> out = new ArrayList<>();
    levels.replaceAll((text, chains) -> closures.maximal(chains));
    levels.forEach((text, chains) -> chains.forEach(c -> out.add(locus(text, c))));
    TypeLoci.Locus general = out.get(0);
    List<TypeLoci.Locus> others = new ArrayList<>(out.subList(1, out.size()));
    others.sort(Comparator.comparing(l -> text(l.equations())));
    others.add(0, general);
    return new TypeLoci(others);
  }

  private void explore() {
    Cutter cutter = new Cutter(constants, meter);
    Deque<Task> open = new ArrayDeque<>();
    stratum.leaves().forEach(l -> open.add(new Task(l.piece(), l.algebra())));
    while (!open.isEmpty()) {
      meter.branch();
      Task task = open.poll();
      Chain chain = task.piece().chain();
      BranchAlgebra algebra = task.algebra().on(chain);
      Found f = facts(task.piece(), algebra);
      levels.computeIfAbsent(f.text(), t -> new ArrayList<>()).add(chain);
      leaves
          .computeIfAbsent(f.text(), t -> new ArrayList<>())
          .add(new Leaf.Defined(task.piece(), stratum.profile(), algebra));
      found.putIfAbsent(chain, f);
      cutter.cut(task.piece(), f.assumed()).cut().forEach(q -> open.add(new Task(q, algebra)));
    }
  }

  private Found facts(Piece piece, BranchAlgebra algebra) {
    StructureConstants<Polynomial> c = algebra.constants();
    LieBracket<Polynomial> bracket =
        LieBracket.of(
            new StructureConstants<>(
                KnownNonZero.on(piece), c.dimension(), c.brackets(), c.denominator(), c.scale()));
    if (bracket.dimension() < 5) {
      SmallAlgebra<Polynomial> small = SmallAlgebra.of(bracket);
      return new Found(
          small.shape().toString(),
          TypeLoci.Argument.CLASSIFICATION,
          small.walls(new Arithmetic<>(bracket.domain())),
          new ParameterTexts(piece.chain(), constants).of(small),
          small.assumed());
    }
    LargeFacts<Polynomial> large = LargeFacts.of(bracket);
    return new Found(
        large.text(), large.argument(), large.walls(), new TreeMap<>(), large.assumed());
  }

  private TypeLoci.Locus locus(String level, Chain z) {
    List<Chain> excluded = new ArrayList<>();
    List<Chain> across = new ArrayList<>();
    levels.forEach(
        (text, chains) -> {
          if (!text.equals(level)) {
            for (Chain w : chains) {
              if (closures.isInside(w, z)) {
                excluded.add(w);
              } else if (!closures.isInside(z, w)) {
                across.add(w);
              }
            }
          }
        });
    List<Chain> inside = closures.maximal(excluded);
    for (Chain w : across) {
      meter.check();
      if (inside.stream().noneMatch(e -> closures.hold(e, w, z))) {
        excluded.addAll(closures.intersection(splitter, w, z));
      }
    }
    Found f = found.get(z);
    return new TypeLoci.Locus(
        z,
        closures.ideal(z),
        closures.leavesInside(splitter, z, leaves.get(level)),
        added(z, stratum.closure()),
        closures.maximal(excluded).stream()
            .map(w -> added(w, z))
            .sorted(Comparator.comparing(TypeLociSearch::text))
            .toList(),
        walls(z, f.walls()),
        f.argument(),
        f.parameters());
  }

  /** The equations of w that do not hold on all of z. */
  private List<Polynomial> added(Chain w, Chain z) {
    return closures.ideal(w).stream().filter(p -> !z.vanishes(p)).toList();
  }

  private static String text(List<Polynomial> equations) {
    return equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
  }

  /** The factors at which the sign of one of the polynomials may change. */
  private List<Polynomial> walls(Chain z, List<Polynomial> deciding) {
    SortedMap<String, Polynomial> out = new TreeMap<>();
    for (Polynomial p : deciding) {
      Polynomial r = z.reduced(p);
      if (!r.isZero()) {
        for (Factorization.Factor f : Factoring.overRationals(r).factors()) {
          if (f.multiplicity() % 2 == 1 && !isNumber(f.base())) {
            out.put(f.base().toString(), f.base());
          }
        }
      }
    }
    return List.copyOf(out.values());
  }

  private boolean isNumber(Polynomial p) {
    return constants.rules().stream().map(Chain.Rule::variable).toList().containsAll(p.support());
  }
}
