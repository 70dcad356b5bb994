package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import rankfall.Analysis.Component;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Killing;
import rankfall.Analysis.Region;
import rankfall.Analysis.Stratum;
import rankfall.exact.AlgebraicNumber;
import rankfall.lie.Family;
import rankfall.lie.Signature;
import rankfall.locus.Cell;
import rankfall.locus.Meter;
import rankfall.locus.Regions;
import rankfall.locus.Strata;

/**
 * The real regions of the strata of a family over a real ground, with the names of the algebras.
 *
 * @param strata of the family
 * @param meter ends the work early
 */
record RegionFindings(Family family, Strata.Result strata, Meter meter) {

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

    /** The strata with the names of their algebras, those of the regions side by side. */
    List<Stratum> withTypes(List<Stratum> strata) {
      List<Stratum> out = new ArrayList<>();
      for (int k = 0; k < strata.size(); k++) {
        String types =
            perStratum.get(k).stream()
                .flatMap(r -> r.type().stream())
                .map(AlgebraType::text)
                .distinct()
                .collect(Collectors.joining(" | "));
        out.add(types.isEmpty() ? strata.get(k) : strata.get(k).withType(types));
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
      NamedParts parts = NamedParts.of(family, s, meter);
      List<Region> own = new ArrayList<>();
      for (NamedPart part : parts.parts()) {
        Regions r = part.regions();
        for (Regions.Row row : r.rows()) {
          own.add(region(name, "R" + (own.size() + 1), parts.conditions(part, row), part, row, r));
        }
        if (!r.complete()) {
          undecided.add("not decided: by which signs some real regions of " + name + " differ");
        }
      }
      perStratum.add(own);
    }
    List<Region> all = perStratum.stream().flatMap(List::stream).toList();
    return new Result(all, perStratum, undecided);
  }

  private Region region(
      String stratum,
      String name,
      List<SignCondition> conditions,
      NamedPart part,
      Regions.Row row,
      Regions regions) {
    Signature g = row.signature();
    return new Region(
        stratum,
        name,
        conditions,
        new Analysis.Signature(g.plus(), g.minus(), g.zero()),
        part.type(row),
        regions.exact(),
        coordinates(row.witness()));
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
