package rankfall;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Findings;
import rankfall.locus.Meter;
import rankfall.scan.Axis;
import rankfall.scan.Finding;
import rankfall.scan.Grid;
import rankfall.scan.ScanPlan;
import rankfall.scan.ScanRun;
import rankfall.spec.SpecException;

/**
 * Counts the default grid of a family.
 *
 * @param family to be scanned
 * @param analysis of it
 * @param meter ends the count when the budget is used up
 */
record ScanFindings(ScanFamily family, Analysis analysis, Meter meter) {
  private static final int MOST_LISTED = 20_000;
  private static final int MOST_COUNTED = 1_000_000;

  /** An analysis with the counts of the default grid, or with the reason why there are none. */
  static Analysis added(Analysis analysis, Meter meter) {
    if (analysis.spec().scan().isEmpty() || analysis.findings().isEmpty()) {
      return analysis;
    }
    try {
      return new ScanFindings(ScanFamily.of(analysis.spec()), analysis, meter).counted();
    } catch (SpecException e) {
      throw new IllegalStateException("a family that was analysed", e);
    } catch (Meter.Exhausted e) {
      return remarked(analysis, e.getMessage());
    }
  }

  private static Analysis remarked(Analysis a, String why) {
    List<String> remarks = new ArrayList<>(a.remarks());
    remarks.add("The default grid was not counted: " + why + ".");
    return new Analysis(
        a.spec(), a.version(), a.status(), a.message(), remarks, a.undecided(), a.findings());
  }

  private Analysis counted() {
    Map<String, List<BigFraction>> values = analysis.spec().scan();
    Map<String, Axis> axes = new TreeMap<>();
    values.forEach((name, v) -> axes.put(name, Axis.values(name, v)));
    Optional<String> misfit =
        family
            .misfit(values.keySet())
            .or(() -> axes.values().stream().flatMap(a -> family.misfit(a).stream()).findFirst());
    if (misfit.isPresent()) {
      return remarked(analysis, misfit.get());
    }
    List<String> names = family.names().stream().filter(values::containsKey).toList();
    Grid grid = new Grid(names.stream().map(axes::get).toList());
    if (grid.size() > MOST_COUNTED) {
      return remarked(
          analysis, "it has " + grid.size() + " points, and is left to the verb 'scan'");
    }
    ScanPlan plan =
        new ScanPlan(
            family.atlas(names, analysis),
            point -> {
              meter.check();
              return family.at(names, point);
            },
            grid,
            Optional.empty());
    List<ScanAxis> told = names.stream().map(n -> new ScanAxis(n, values.get(n))).toList();
    Findings found = analysis.findings().orElseThrow();
    return new Analysis(
        analysis.spec(),
        analysis.version(),
        analysis.status(),
        analysis.message(),
        analysis.remarks(),
        analysis.undecided(),
        Optional.of(found.with(counts(told, plan))));
  }

  private ScanCounts counts(List<ScanAxis> axes, ScanPlan plan) {
    boolean listed = plan.points().size() <= MOST_LISTED;
    List<Finding> each = listed ? ScanRun.each(plan) : List.of();
    Map<Finding, Long> points = new LinkedHashMap<>();
    each.forEach(f -> points.merge(plain(f), 1L, Long::sum));
    if (!listed) {
      ScanRun.tally(plan).points().forEach((f, n) -> points.merge(plain(f), n, Long::sum));
    }
    List<Finding> order = points.keySet().stream().sorted(order()).toList();
    return new ScanCounts(
        axes,
        order.stream().map(f -> count(f, points.get(f))).toList(),
        each.stream().map(f -> order.indexOf(plain(f))).toList());
  }

  /** Without how it was found. */
  private static Finding plain(Finding f) {
    return new Finding(
        f.status(),
        f.dimension(),
        f.rank(),
        f.signature(),
        f.stratum(),
        f.region(),
        f.type(),
        false);
  }

  private static ScanCount count(Finding f, long points) {
    return new ScanCount(
        f.status().word(),
        f.stratum(),
        f.region(),
        f.dimension(),
        f.rank(),
        f.signature(),
        f.type(),
        points);
  }

  /** By stratum and region in the order of the analysis. */
  private Comparator<Finding> order() {
    List<String> regions = new ArrayList<>();
    for (Analysis.Stratum s : analysis.findings().orElseThrow().strata()) {
      analysis.findings().orElseThrow().regions().stream()
          .filter(r -> r.stratum().equals(s.name()))
          .forEach(r -> regions.add(s.name() + " " + r.name()));
      regions.add(s.name() + " ");
    }
    return Comparator.comparing(Finding::status)
        .thenComparing(f -> regions.indexOf(f.stratum() + " " + f.region()))
        .thenComparing(f -> f.dimension().orElse(-1), Comparator.reverseOrder())
        .thenComparing(f -> f.rank().orElse(-1), Comparator.reverseOrder())
        .thenComparing(f -> f.signature().map(Analysis.Signature::plus).orElse(-1))
        .thenComparing(Finding::type);
  }
}
