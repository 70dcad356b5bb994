package rankfall.bench;

import java.time.Duration;
import java.util.List;
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
import rankfall.exact.Chain;
import rankfall.lie.Family;
import rankfall.lie.KillingForm;
import rankfall.locus.ComponentForm;
import rankfall.locus.FamilyAlgebras;
import rankfall.locus.Loci;
import rankfall.locus.Meter;
import rankfall.locus.Piece;
import rankfall.locus.Profile;
import rankfall.spec.SpecException;

/**
 * From the generators to the checked form at the general point, its factored determinant, and rank
 * and kernel on each factor.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 8)
@Measurement(iterations = 8)
public class DegeneracyBench {
  /** Semisimple at the general point; without relations. */
  @Param({"mixed-five", "metric-rotations-4"})
  public String name;

  private Family family;

  /**
   * Reads the family.
   *
   * @throws SpecException never for the specs named here
   */
  @Setup
  public void read() throws SpecException {
    family = Family.of(BenchSpecs.named(name));
  }

  /** The loci with their ranks and kernels. */
  @Benchmark
  public List<Loci.Locus> loci() {
    Chain general = family.ring().constants();
    ComponentForm form = ComponentForm.of(family, new Piece(general, List.of()), List.of(), 1);
    int n = form.basis().size();
    Meter meter = new Meter(Duration.ofMinutes(5), 20_000);
    return new Loci(general, new FamilyAlgebras(family), meter)
        .in(
            general,
            new Profile(n, n, n, 0),
            List.of(),
            KillingForm.zeros(form.form().determinant().orElseThrow()),
            List.of());
  }
}
