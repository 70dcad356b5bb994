package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Origin;
import rankfall.Analysis.Relation;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilyRelation;
import rankfall.locus.Meter;
import rankfall.locus.Partition;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/**
 * The front door of the library: a spec in, an analysis out.
 *
 * <p>One call uses one thread; calls may run side by side.
 */
public final class Engine {
  private Engine() {}

  /**
   * Analyses a family.
   *
   * @param spec as read
   * @param budget what it may cost
   * @return complete, or incomplete with what was left undecided, or failed with the reason
   * @throws SpecException if the spec describes no family: what is wrong, with places
   */
  public static Analysis analyse(Spec spec, Budget budget) throws SpecException {
    Family family = Family.of(spec);
    Meter meter = new Meter(budget.time(), budget.branches());
    Partition partition = Partition.of(family, meter);
    return new FamilyFindings(spec, family, partition, meter).analysis();
  }
}
