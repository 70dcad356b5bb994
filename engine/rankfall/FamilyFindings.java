package rankfall;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import rankfall.Analysis.Component;
import rankfall.Analysis.Covering;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Origin;
import rankfall.Analysis.Relation;
import rankfall.Analysis.Status;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;
import rankfall.exact.RealZeros;
import rankfall.lie.Family;
import rankfall.lie.FamilyRelation;
import rankfall.locus.Decomposition;
import rankfall.locus.Leaf;
import rankfall.locus.Meter;
import rankfall.locus.Partition;
import rankfall.locus.Piece;
import rankfall.locus.RealPoints;
import rankfall.locus.Strata;
import rankfall.spec.Spec;

/** Gathers what the rooms found of one family. */
record FamilyFindings(Spec spec, Family family, Partition partition, Meter meter) {

  /**
   * Analyses a family step by step.
   *
   * @param published takes what is known after a step, for the case that the next one does not end
   */
  static Analysis of(Spec spec, Family family, Meter meter, Consumer<Analysis> published) {
    Optional<String> contradiction = contradiction(spec, family);
    if (contradiction.isPresent()) {
      return new FamilyFindings(spec, family, Partition.unknown(family), meter)
          .failed(contradiction.get());
    }
    FamilyFindings start = new FamilyFindings(spec, family, Partition.start(family, meter), meter);
    try {
      return start.completed(published);
    } catch (TorusFindings.Fault e) {
      return start.failed(e.getMessage());
    }
  }

  private Analysis completed(Consumer<Analysis> published) {
    List<Component> general = components(List.of());
    published.accept(analysis(general));
    FamilyFindings done =
        new FamilyFindings(spec, family, partition.completed(family, meter), meter);
    if (done.partition.strata().isEmpty()) {
      return done.analysis(general);
    }
    if (done.partition.strata().get().strata().isEmpty()) {
      return done.failed(done.nothingLeft());
    }
    return done.withRegions(done.components(general), done.strata(), published);
  }

  private Analysis withRegions(
      List<Component> components, List<Analysis.Stratum> strata, Consumer<Analysis> published) {
    List<Analysis.Contraction> contractions = contractions(components, strata);
    Analysis without = analysis(components, strata, contractions, Optional.empty());
    if (strata.isEmpty() || family.ring().complex()) {
      return without;
    }
    published.accept(without);
    try {
      Strata.Result cut = partition.strata().orElseThrow();
      RegionFindings.Result regions = new RegionFindings(family, cut, meter).all();
      List<Component> signed =
          components.isEmpty() ? components : regions.withSignatures(components, cut);
      return analysis(signed, regions.withTypes(strata), contractions, Optional.of(regions));
    } catch (Meter.Exhausted e) {
      return analysis(components, strata, contractions, Optional.empty());
    }
  }

  /** Says where, if the conditions of a spec leave no real point. */
  private static Optional<String> contradiction(Spec spec, Family family) {
    if (spec.where().isEmpty() || spec.ground() == Spec.Ground.COMPLEX) {
      return Optional.empty();
    }
    List<Polynomial> relations =
        family.relations().stream().map(FamilyRelation::polynomial).toList();
    if (new RealPoints(family).onZeros(relations).verdict() != RealZeros.Verdict.NO) {
      return Optional.empty();
    }
    return Optional.of(
        spec.source()
            .fault(
                spec.where().get(0).place(),
                "the conditions contradict each other: no parameter point is left",
                Optional.of("drop or mend one of them"))
            .headline());
  }

  /** What is known before anything was computed. */
  static Analysis nothingYet(Spec spec, Family family) {
    Partition partition = Partition.unknown(family);
    return new FamilyFindings(spec, family, partition, new Meter(Duration.ZERO, 1))
        .analysis(List.of());
  }

  private List<Component> components(List<Component> known) {
    try {
      return new ComponentFindings(spec, family, partition, known, meter).all();
    } catch (Meter.Exhausted e) {
      return List.of();
    }
  }

  private List<Analysis.Stratum> strata() {
    try {
      return new StratumFindings(family, partition.strata().orElseThrow(), meter).all();
    } catch (Meter.Exhausted e) {
      return List.of();
    }
  }

  private Analysis analysis(List<Component> components) {
    return analysis(components, List.of(), List.of(), Optional.empty());
  }

  private Analysis analysis(
      List<Component> components,
      List<Analysis.Stratum> strata,
      List<Analysis.Contraction> contractions,
      Optional<RegionFindings.Result> regions) {
    List<String> undecided = new ArrayList<>(openPieces());
    if (partition.strata().isPresent()) {
      undecided.addAll(undecided(components, strata, regions));
    }
    List<Analysis.Region> found = regions.map(RegionFindings.Result::regions).orElse(List.of());
    Findings findings =
        new Findings(
            family.names(),
            family.ring().variables().names(),
            relations(),
            family.poles(),
            components,
            strata,
            strata.isEmpty()
                ? List.of()
                : partition.strata().map(FamilyFindings::coverings).orElse(List.of()),
            found,
            contractions,
            maps(components, strata, found, undecided));
    return new Analysis(
        spec,
        Version.text(),
        undecided.isEmpty() ? Status.COMPLETE : Status.INCOMPLETE,
        undecided.isEmpty() ? "" : undecided.get(0),
        remarks(),
        undecided,
        Optional.of(findings));
  }

  private List<String> undecided(
      List<Component> components,
      List<Analysis.Stratum> strata,
      Optional<RegionFindings.Result> regions) {
    String why = "not decided (" + meter.spent().orElse("out of budget") + "): ";
    List<String> out = new ArrayList<>();
    if (components.isEmpty()) {
      out.add(why + "the components and their conditions");
    }
    if (strata.isEmpty()) {
      out.add(why + "the strata");
    } else if (regions.isEmpty() && !family.ring().complex()) {
      out.add(why + "the real regions");
    }
    withoutForms(strata).ifPresent(out::add);
    regions.ifPresent(r -> out.addAll(r.undecided()));
    return out;
  }

  private Optional<String> withoutForms(List<Analysis.Stratum> strata) {
    String names =
        strata.stream()
            .filter(s -> s.invariantForms().isEmpty())
            .map(Analysis.Stratum::name)
            .collect(Collectors.joining(", "));
    return names.isEmpty()
        ? Optional.empty()
        : Optional.of(
            "not decided ("
                + meter.spent().orElse("out of budget")
                + "): the invariant forms of "
                + names);
  }

  private List<RegionMap> maps(
      List<Component> components,
      List<Analysis.Stratum> strata,
      List<Analysis.Region> regions,
      List<String> undecided) {
    if (regions.isEmpty() && !family.ring().complex()) {
      return List.of();
    }
    try {
      return new MapFindings(family, components, strata, regions, meter).all();
    } catch (Meter.Exhausted e) {
      undecided.add("not decided (" + e.getMessage() + "): the map of regions");
      return List.of();
    }
  }

  private List<Analysis.Contraction> contractions(
      List<Component> components, List<Analysis.Stratum> strata) {
    return spec.presentation() instanceof Spec.Matrices && !strata.isEmpty()
        ? new ContractionFindings(family, partition.strata().orElseThrow(), strata, components)
            .all()
        : List.of();
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
            : "the span is closed under the bracket at no point of the parameters" + missing());
  }

  private String missing() {
    return ClosureGaps.of(family).map(g -> "; " + g).orElse("");
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
      Origin origin = r.reason() == FamilyRelation.Reason.SPEC ? Origin.SPEC : Origin.FUNCTION;
      out.add(new Relation(r.polynomial(), r.factors(), origin));
    }
    Origin origin = spec.presentation() instanceof Spec.Brackets ? Origin.JACOBI : Origin.CLOSURE;
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
    partition
        .variety()
        .map(Decomposition::certificate)
        .filter(c -> c instanceof Decomposition.NotCertified)
        .map(c -> ((Decomposition.NotCertified) c).reason())
        .ifPresent(
            reason ->
                out.add(
                    "That the components cover all zeros of the relations was not checked a second"
                        + " time: "
                        + reason
                        + "."));
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
