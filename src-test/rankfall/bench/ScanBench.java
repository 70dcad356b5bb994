package rankfall.bench;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.ScanFamily;
import rankfall.report.ScanTables;
import rankfall.scan.Columns;
import rankfall.scan.Grid;
import rankfall.scan.GridText;
import rankfall.scan.ScanPlan;
import rankfall.scan.ScanRun;
import rankfall.spec.SpecException;

/**
 * Points a second over a million points of ten kinematical generators, counted, and written as rows
 * that go nowhere; {@code scan-ratio.sh} beside this compares with NumPy.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
public class ScanBench {
  private static final int POINTS = 1_000_000;

  /** A grid that longs hold, and one with steps of 1e-12 for which doubles are used. */
  @Param({
    "a=-2:2:100,b=-2:2:100,m=-2:2:100",
    "a=1:1.000000000099:100,b=1:1.000000000099:100,m=1:1.000000000099:100"
  })
  public String grid;

  private ScanPlan counted;
  private ScanPlan written;

  /**
   * Analyses the family.
   *
   * @throws SpecException never for the spec named here
   */
  @Setup
  public void prepare() throws SpecException {
    Analysis analysis = Engine.withoutGrid(BenchSpecs.named("kinematics-ten"), Budget.DEFAULT);
    ScanFamily family = ScanFamily.of(analysis.spec());
    List<String> names = List.of("a", "b", "m");
    Grid points = new Grid(List.copyOf(GridText.grid(grid).values()));
    counted =
        new ScanPlan(
            family.atlas(names, analysis), p -> family.at(names, p), points, Optional.empty());
    written =
        new ScanPlan(
            counted.atlas(),
            counted.direct(),
            points,
            Optional.of(new ScanPlan.Table(Columns.all(names), ScanTables::cells, false)));
  }

  /**
   * Points counted.
   *
   * @return the sum of all counts
   */
  @Benchmark
  @OperationsPerInvocation(POINTS)
  public long count() throws IOException, InterruptedException {
    return run(counted);
  }

  /**
   * Rows written.
   *
   * @return the sum of all counts
   */
  @Benchmark
  @OperationsPerInvocation(POINTS)
  public long rows() throws IOException, InterruptedException {
    return run(written);
  }

  private static long run(ScanPlan plan) throws IOException, InterruptedException {
    long[] sum = {0};
    new ScanRun(plan, 0, POINTS, 2).run(0, part -> sum[0] += part.tally().total());
    return sum[0];
  }
}
