package rankfall;

import java.util.ArrayList;
import java.util.List;
import rankfall.Analysis.Component;
import rankfall.Analysis.ContractionOutcome;
import rankfall.Analysis.Stratum;
import rankfall.Analysis.StructureEntry;
import rankfall.exact.GroebnerBasis;
import rankfall.lie.Family;
import rankfall.locus.Contraction;
import rankfall.locus.Contraction.Entry;
import rankfall.locus.Profile;
import rankfall.locus.Strata;

/**
 * What the brackets of each component become where the generators lose their independence.
 *
 * @param strata as cut
 * @param known what is known of them, in the same order
 */
record ContractionFindings(
    Family family, Strata.Result strata, List<Stratum> known, List<Component> components) {

  List<Analysis.Contraction> all() {
    GroebnerBasis bases = new GroebnerBasis(family.ring().constants());
    List<Analysis.Contraction> out = new ArrayList<>();
    for (int k = 0; k < strata.strata().size(); k++) {
      Strata.Stratum lower = strata.strata().get(k);
      for (int c = 0; c < components.size(); c++) {
        Strata.Stratum upper = strata.strata().get(strata.components().get(c));
        if (isDrop(lower, upper)) {
          Component component = components.get(c);
          out.add(
              new Analysis.Contraction(
                  FamilyFindings.name(k),
                  component.number(),
                  component.basis(),
                  outcome(bases, component, upper, lower, known.get(k))));
        }
      }
    }
    return out;
  }

  private static boolean isDrop(Strata.Stratum lower, Strata.Stratum upper) {
    return lower.profile().dimension() < upper.profile().dimension()
        && upper.equations().stream().allMatch(lower.closure()::vanishes);
  }

  private ContractionOutcome outcome(
      GroebnerBasis bases,
      Component component,
      Strata.Stratum upper,
      Strata.Stratum lower,
      Stratum lowerKnown) {
    List<Entry> brackets =
        component.structure().stream()
            .map(s -> new Entry(s.left(), s.right(), s.target(), s.coefficient()))
            .toList();
    Contraction.Outcome o =
        Contraction.of(
            bases,
            upper.leaves().get(0).piece().chain(),
            upper.equations(),
            component.basis().size(),
            brackets,
            lower.closure());
    if (o instanceof Contraction.Limit limit) {
      Profile p = limit.profile();
      return new Analysis.Contracted(
          entries(limit.brackets()),
          p.rank(),
          p.derived(),
          p.centre(),
          new ContractedName(family.ring().complex(), component.basis().size(), limit.brackets())
              .at(lowerKnown));
    }
    if (o instanceof Contraction.NoLimit none) {
      return new Analysis.WithoutLimit(entries(none.poles()));
    }
    if (o instanceof Contraction.Undecided open) {
      return new Analysis.Unfollowed(entries(open.open()), open.reason());
    }
    throw new IllegalStateException("another outcome: " + o);
  }

  private static List<StructureEntry> entries(List<Entry> list) {
    return list.stream()
        .map(e -> new StructureEntry(e.left(), e.right(), e.target(), e.value()))
        .toList();
  }
}
