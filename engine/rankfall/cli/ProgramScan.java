package rankfall.cli;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Supplier;
import rankfall.Analysis;
import rankfall.ScanFamily;
import rankfall.Version;
import rankfall.report.PointFile;
import rankfall.report.ScanTables;
import rankfall.scan.Axis;
import rankfall.scan.Checkpoint;
import rankfall.scan.Columns;
import rankfall.scan.Grid;
import rankfall.scan.GridText;
import rankfall.scan.PointSet;
import rankfall.scan.Sample;
import rankfall.scan.ScanFile;
import rankfall.scan.ScanPlan;
import rankfall.scan.ScanRun;
import rankfall.scan.Tally;
import rankfall.spec.Spec;

/**
 * A scan of the program itself.
 *
 * @param family that is scanned
 * @param order what the call asks for
 * @param progress hears of points
 * @param analysis of the family; asked for once the points are known to fit
 */
record ProgramScan(
    ScanFamily family, ScanOrder order, ScanProgress progress, Supplier<Analysis> analysis) {

  /**
   * Runs the scan.
   *
   * @return what is said of it
   * @throws IllegalArgumentException if the points do not fit the family; the message is for the
   *     user
   * @throws IOException if a file cannot be read or written; the rows so far are whole
   */
  FrontDoors.Scanned run() throws IOException, InterruptedException {
    if (order.points() instanceof ScanOrder.Listed listed) {
      PointFile file = PointFile.of(listed.file());
      List<String> names = fitting(file.header());
      try (Reader table = Files.newBufferedReader(listed.file())) {
        return run(file.points(table, names));
      }
    }
    return run(lattice());
  }

  private PointSet lattice() {
    if (order.points() instanceof ScanOrder.Axes axes) {
      return new Grid(axes(GridText.grid(axes.text())));
    }
    if (order.points() instanceof ScanOrder.Drawn drawn) {
      return new Sample(axes(GridText.ranges(drawn.ranges())), drawn.size(), drawn.seed());
    }
    return new Grid(axes(defaultGrid()));
  }

  private Map<String, Axis> defaultGrid() {
    Spec spec = family.spec();
    if (spec.scan().isEmpty()) {
      throw new IllegalArgumentException(
          "the spec has no 'scan'; give the points with --grid, --sample or --from");
    }
    Map<String, Axis> out = new TreeMap<>();
    spec.scan().forEach((name, values) -> out.put(name, Axis.values(name, values)));
    return out;
  }

  /** The axes in the order of the family. */
  private List<Axis> axes(Map<String, Axis> byName) {
    List<Axis> out = new ArrayList<>();
    for (String name : fitting(byName.keySet())) {
      Axis axis = byName.get(name);
      Optional<String> misfit = family.misfit(axis);
      if (misfit.isPresent()) {
        throw new IllegalArgumentException(misfit.get());
      }
      out.add(axis);
    }
    return out;
  }

  private List<String> fitting(Collection<String> given) {
    Optional<String> misfit = family.misfit(given);
    if (misfit.isPresent()) {
      throw new IllegalArgumentException(misfit.get());
    }
    return family.names().stream().filter(given::contains).toList();
  }

  private FrontDoors.Scanned run(PointSet points) throws IOException, InterruptedException {
    Columns columns =
        order.columns().isPresent()
            ? Columns.of(points.names(), order.columns().get())
            : Columns.all(points.names());
    boolean zipped = order.out().map(p -> p.toString().endsWith(".gz")).orElse(false);
    Analysis known = analysis.get();
    if (known.status() == Analysis.Status.FAILED) {
      return new FrontDoors.Scanned("", "no point was scanned", false);
    }
    ScanPlan plan =
        new ScanPlan(
            family.atlas(points.names(), known),
            at -> family.at(points.names(), at),
            points,
            order.out().map(p -> new ScanPlan.Table(columns, ScanTables::cells, zipped)));
    ScanRun run =
        new ScanRun(
            plan,
            order.shard().from(points.size()),
            order.shard().to(points.size()),
            order.threads());
    return order.out().isPresent() ? written(run, claim(points, columns)) : counted(run, known);
  }

  private FrontDoors.Scanned counted(ScanRun run, Analysis known)
      throws IOException, InterruptedException {
    progress.begin(run.to() - run.from());
    Tally[] sum = {Tally.NONE};
    run.run(
        0,
        part -> {
          sum[0] = sum[0].plus(part.tally());
          progress.add(part.tally().total());
        });
    return new FrontDoors.Scanned(
        ScanTables.counts(known, sum[0]), said(sum[0]), sum[0].unreadable() == 0);
  }

  private FrontDoors.Scanned written(ScanRun run, Checkpoint.Claim claim)
      throws IOException, InterruptedException {
    Tally[] sum = {Tally.NONE};
    try (ScanFile file = ScanFile.open(order.out().orElseThrow(), claim, order.resume())) {
      if (file.complete()) {
        return new FrontDoors.Scanned("", "all points are there already", true);
      }
      long done = Math.min(run.to() - run.from(), file.blocks() * ScanRun.BLOCK);
      progress.begin(run.to() - run.from() - done);
      run.run(
          file.blocks(),
          part -> {
            file.append(part.rows());
            sum[0] = sum[0].plus(part.tally());
            progress.add(part.tally().total());
          });
      file.finish();
    }
    return new FrontDoors.Scanned("", said(sum[0]), sum[0].unreadable() == 0);
  }

  private static String said(Tally tally) {
    return Messages.count(tally.total(), "point", "points")
        + ", "
        + tally.direct()
        + " of them computed directly"
        + (tally.unreadable() == 0 ? "" : ", " + tally.unreadable() + " unreadable");
  }

  private Checkpoint.Claim claim(PointSet points, Columns columns) {
    Spec spec = family.spec();
    return new Checkpoint.Claim(
        List.of(
            "program " + Version.text(),
            "family " + spec.family(),
            "spec " + spec.source().sha256(),
            "points " + points.text(),
            "columns " + ScanTables.cells(columns.header()),
            "part " + order.shard(),
            "block " + ScanRun.BLOCK));
  }
}
