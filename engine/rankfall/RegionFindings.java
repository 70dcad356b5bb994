package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import rankfall.Analysis.AlgebraType;
import rankfall.Analysis.Comparison;
import rankfall.Analysis.Component;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Killing;
import rankfall.Analysis.Region;
import rankfall.Analysis.SignCondition;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.Signature;
import rankfall.locus.Cell;
import rankfall.locus.Cells;
import rankfall.locus.Meter;
import rankfall.locus.Regions;
import rankfall.locus.Strata;

/** The real regions of the strata of a family over a real ground. */
record RegionFindings(Family family, Strata.Result strata, Names names, Meter meter) {

  /** What names the algebras of the cells. */
  interface Names {
    /** Where names may change inside a stratum; its other points keep them on connected pieces. */
    List<Polynomial> walls(Strata.Stratum stratum);

    /** What tells the algebra of a cell; cells of one label may share a row. */
    Function<Cell, String> labels(Strata.Stratum stratum);

    /** The name of the algebra of a row, whose cells have one label. */
    Optional<AlgebraType> type(Strata.Stratum stratum, Regions.Row row);
  }

  /** Without names. */
  static final Names NONE =
      new Names() {
        @Override
        public List<Polynomial> walls(Strata.Stratum stratum) {
          return List.of();
        }

        @Override
        public Function<Cell, String> labels(Strata.Stratum stratum) {
          return c -> "";
        }

        @Override
        public Optional<AlgebraType> type(Strata.Stratum stratum, Regions.Row row) {
          return Optional.empty();
        }
      };

  /**
   * The regions of all strata.
   *
   * @param regions of all strata, in their order
   * @param perStratum the same, a list a stratum
   * @param undecided what was left open, a sentence each
   */
  record Result(List<Region> regions, List<List<Region>> perStratum, List<String> undecided) {

    /** The signature at all general real points of a component, where it is one. */
    List<Component> withSignatures(List<Component> components, Strata.Result strata) {
      List<Component> out = new ArrayList<>();
      for (int k = 0; k < components.size(); k++) {
        out.add(with(components.get(k), perStratum.get(strata.components().get(k))));
      }
      return out;
    }

    private static Component with(Component c, List<Region> regions) {
      List<Analysis.Signature> all = regions.stream().map(Region::signature).distinct().toList();
      boolean one = all.size() == 1 && regions.stream().allMatch(Region::exact);
      Killing k = c.killing();
      Killing killing =
          new Killing(
              k.entries(),
              k.rank(),
              k.kernel(),
              k.blocks(),
              k.determinant(),
              one ? Optional.of(all.get(0)) : Optional.empty());
      return new Component(
          c.number(),
          c.equations(),
          c.parameterDimension(),
          c.basis(),
          c.structure(),
          killing,
          c.dual(),
          c.conditions(),
          c.torus(),
          c.casimir());
    }
  }

  /**
   * All regions.
   *
   * @throws Meter.Exhausted if the budget is used up
   */
  Result all() {
    List<List<Region>> perStratum = new ArrayList<>();
    List<String> undecided = new ArrayList<>();
    for (Strata.Stratum s : strata.strata()) {
      String name = FamilyFindings.name(perStratum.size());
      Cells cells = Cells.of(family, s, names.walls(s), meter);
      Regions r = Regions.of(family, s, cells, names.labels(s), meter);
      List<Region> own = new ArrayList<>();
      for (Regions.Row row : r.rows()) {
        own.add(region(name, "R" + (own.size() + 1), s, row, r.exact()));
      }
      if (!r.complete()) {
        undecided.add("not decided: by which signs some real regions of " + name + " differ");
      }
      perStratum.add(own);
    }
    List<Region> all = perStratum.stream().flatMap(List::stream).toList();
    return new Result(all, perStratum, undecided);
  }

  private Region region(
      String stratum, String name, Strata.Stratum s, Regions.Row row, boolean exact) {
    Signature g = row.signature();
    return new Region(
        stratum,
        name,
        row.conditions().stream().map(RegionFindings::condition).toList(),
        new Analysis.Signature(g.plus(), g.minus(), g.zero()),
        names.type(s, row),
        exact,
        coordinates(row.witness()));
  }

  private static SignCondition condition(Regions.Condition c) {
    return new SignCondition(c.polynomial(), c.sign() > 0 ? Comparison.GREATER : Comparison.LESS);
  }

  private List<Coordinate> coordinates(Cell cell) {
    List<Coordinate> out = new ArrayList<>();
    List<AlgebraicNumber> point = cell.point().coordinates();
    for (int v = 0; v < family.ring().variables().indeterminates(); v++) {
      out.add(new Coordinate(family.ring().variables().names().get(v), point.get(v).toString()));
    }
    return out;
  }
}
