package rankfall.bench;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/** Whole analyses of families that ship, strata included. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3)
@Measurement(iterations = 5)
public class StrataBench {
  /** Three to six generators first, then larger ones. */
  @Param({
    "scaled-ladder",
    "metric-rotations-3",
    "doublet-couplings",
    "oscillator-two-frequencies",
    "flux-six",
    "bianchi-types",
    "kinematics-ten",
    "metric-rotations-4"
  })
  public String name;

  private Spec spec;

  /** Reads the spec. */
  @Setup
  public void read() {
    spec = BenchSpecs.named(name);
  }

  /**
   * One analysis.
   *
   * @return complete
   * @throws SpecException never for the specs named here
   */
  @Benchmark
  public Analysis analyse() throws SpecException {
    return Engine.analyse(spec, Budget.DEFAULT);
  }
}
