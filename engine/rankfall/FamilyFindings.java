package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import rankfall.Analysis.Component;
import rankfall.Analysis.Covering;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Origin;
import rankfall.Analysis.Relation;
import rankfall.Analysis.Status;
import rankfall.Analysis.Stratum;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilyRelation;
import rankfall.locus.Leaf;
import rankfall.locus.Meter;
import rankfall.locus.Partition;
import rankfall.locus.Piece;
import rankfall.locus.Strata;
import rankfall.spec.Spec;

/** Gathers what the rooms found of one family. */
record FamilyFindings(Spec spec, Family family, Partition partition, Meter meter) {

  Analysis analysis() {
    if (partition.strata().map(s -> s.strata().isEmpty()).orElse(false)) {
      return failed(nothingLeft());
    }
    List<String> undecided = new ArrayList<>(openPieces());
    Optional<Strata.Result> strata = partition.strata();
    List<Component> components =
        inBudget(
            "the components and their conditions",
            () -> new ComponentFindings(spec, family, partition, meter).all(),
            undecided);
    List<Stratum> described =
        inBudget(
            "the strata",
            () -> strata.map(s -> new StratumFindings(family, s, meter).all()).orElse(List.of()),
            undecided);
    Findings findings =
        new Findings(
            family.names(),
            family.ring().variables().names(),
            relations(),
            family.poles(),
            components,
            described,
            described.isEmpty()
                ? List.of()
                : strata.map(FamilyFindings::coverings).orElse(List.of()),
            List.of());
    return new Analysis(
        spec,
        Version.text(),
        undecided.isEmpty() ? Status.COMPLETE : Status.INCOMPLETE,
        undecided.isEmpty() ? "" : undecided.get(0),
        remarks(),
        undecided,
        Optional.of(findings));
  }

  /** A list, or nothing and a word about it if the budget ends before. */
  private static <T> List<T> inBudget(
      String what, Supplier<List<T>> step, List<String> undecided) {
    try {
      return step.get();
    } catch (Meter.Exhausted e) {
      undecided.add("not decided (" + e.getMessage() + "): " + what);
      return List.of();
    }
  }

  private Analysis failed(String message) {
    return new Analysis(
        spec, Version.text(), Status.FAILED, message, List.of(), List.of(), Optional.empty());
  }

  private String nothingLeft() {
    boolean table = spec.presentation() instanceof Spec.Brackets;
    String where =
        spec.source().file()
            + ":"
            + spec.source().familyPlace().line()
            + ":"
            + spec.source().familyPlace().column()
            + ": ";
    return where
        + (table
            ? "Jacobi's identity holds at no point of the parameters"
            : "the span is closed under the bracket at no point of the parameters"
                + missing());
  }

  private String missing() {
    return ClosureGaps.of(family)
        .map(g -> "; " + g)
        .orElse("");
  }

  private List<String> openPieces() {
    List<String> out = new ArrayList<>();
    for (Piece p : partition.undecided()) {
      String equations =
          p.chain().rules().stream()
              .map(r -> r.equation().toString())
              .collect(Collectors.joining("; "));
      out.add(
          "not decided ("
              + partition.reason()
              + "): the points with "
              + (equations.isEmpty() ? "any parameters" : equations + " = 0"));
    }
    return out;
  }

  private List<Relation> relations() {
    List<Relation> out = new ArrayList<>();
    for (FamilyRelation r : family.relations()) {
      Origin origin =
          r.reason() == FamilyRelation.Reason.SPEC ? Origin.SPEC : Origin.FUNCTION;
      out.add(new Relation(r.polynomial(), r.factors(), origin));
    }
    Origin origin =
        spec.presentation() instanceof Spec.Brackets ? Origin.JACOBI : Origin.CLOSURE;
    for (Polynomial p : partition.conditions()) {
      List<Polynomial> factors = ChainFactoring.irreducible(family.ring().constants(), p);
      Polynomial squareFree =
          factors.stream().reduce(Polynomial.one(p.variables()), Polynomial::times);
      Relation r = new Relation(squareFree.primitive(), factors, origin);
      if (!factors.isEmpty() && !out.contains(r)) {
        out.add(r);
      }
    }
    return out;
  }

  private static List<Covering> coverings(Strata.Result strata) {
    return strata.coverings().stream()
        .map(c -> new Covering(name(c.get(0)), name(c.get(1))))
        .toList();
  }

  static String name(int stratum) {
    return "S" + (stratum + 1);
  }

  private List<String> remarks() {
    List<String> out = new ArrayList<>();
    boolean open = partition.leaves().stream().anyMatch(l -> l instanceof Leaf.Open);
    if (open && !partition.conditions().isEmpty()) {
      out.add(
          "The span is not closed at the general point of the parameters; the family is analysed over"
              + " the points at which it is.");
    } else if (open) {
      out.add("There are points at which the span is not closed; they belong to no stratum.");
    }
    List<String> names =
        partition.leaves().stream()
            .filter(l -> l instanceof Leaf.Defined)
            .map(l -> ((Leaf.Defined) l).algebra().basis())
            .filter(b -> b.size() < family.names().size())
            .map(b -> String.join(", ", b))
            .distinct()
            .toList();
    boolean always =
        partition.leaves().stream()
            .filter(l -> l instanceof Leaf.Defined)
            .allMatch(l -> ((Leaf.Defined) l).profile().dimension() < family.names().size());
    if (always && !names.isEmpty()) {
      out.add("The listed generators are dependent at all points.");
    } else if (!names.isEmpty()) {
      out.add(
          "There are points at which the listed generators are dependent; there the algebra is their"
              + " span.");
    }
    return out;
  }
}
