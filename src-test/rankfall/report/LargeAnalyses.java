package rankfall.report;

import static rankfall.report.SampleAnalyses.factored;
import static rankfall.report.SampleAnalyses.spec;
import static rankfall.report.SampleAnalyses.unit;
import static rankfall.report.SampleAnalyses.whole;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import rankfall.Analysis;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Covering;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Killing;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.Analysis.RealPoints;
import rankfall.Analysis.Status;
import rankfall.Analysis.Stratum;
import rankfall.Analysis.StructureEntry;
import rankfall.exact.Factorization.Factor;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;

/** Analyses that are large: a dense form of high order, and many strata. */
final class LargeAnalyses {
  private LargeAnalyses() {}

  /** A form of order n with dense entries of many terms; not the form of an algebra. */
  static Analysis large(int n) {
    Variables v = new Variables(List.of("a", "beta", "g12", "x_ab", "cos(t)", "sqrt(2)"));
    Polynomial sum = Polynomial.constant(v, 1);
    for (int k = 0; k < v.count(); k++) {
      sum =
          sum.plus(
              Polynomial.variable(v, k).times(BigInteger.valueOf(k % 2 == 0 ? k + 1 : -k - 3)));
    }
    Polynomial longOne = sum.pow(3).minus(sum.pow(2));
    List<String> basis =
        IntStream.range(0, n)
            .mapToObj(k -> k % 3 == 0 ? "L" + k : k % 3 == 1 ? "J_" + k : "Lambda" + k)
            .toList();
    List<MatrixEntry> entries = new ArrayList<>();
    List<StructureEntry> structure = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        Polynomial x = Polynomial.variable(v, (i + j) % 6);
        if ((i * j) % 3 != 1) {
          entries.add(
              new MatrixEntry(
                  i,
                  j,
                  j == i + 1
                      ? RationalFunction.of(sum, x)
                      : whole(
                          x.pow(2)
                              .times(BigInteger.valueOf(i - 7L))
                              .minus(Polynomial.variable(v, 0)))));
        }
        if (i < j && j < i + 3) {
          structure.add(new StructureEntry(i, j, (i + j) % n, RationalFunction.of(x, sum)));
          structure.add(new StructureEntry(i, j, (i + j + 1) % n, whole(i == 2 ? longOne : sum)));
        }
      }
    }
    Component c =
        new Component(
            1,
            List.of(),
            4,
            basis,
            structure,
            new Killing(
                entries,
                n,
                List.of(),
                List.of(),
                Optional.of(
                    new Quotient(
                        factored(-12345, new Factor(sum, 3), new Factor(longOne, 2)),
                        factored(7, new Factor(Polynomial.variable(v, 1), 4)))),
                Optional.empty()),
            Optional.of(entries),
            List.of(
                new Condition(
                    List.of(longOne),
                    Optional.of(2),
                    Optional.of(n - 1),
                    Optional.of(1),
                    basis,
                    List.of(
                        new Combination(
                            IntStream.range(0, n)
                                .mapToObj(
                                    k ->
                                        k % 4 == 0
                                            ? Polynomial.variable(v, k % 6).minus(Polynomial.one(v))
                                            : Polynomial.variable(v, k % 6))
                                .toList())),
                    RealPoints.UNKNOWN),
                new Condition(
                    List.of(sum, Polynomial.variable(v, 4).pow(2).minus(Polynomial.one(v))),
                    Optional.of(3),
                    Optional.of(n - 3),
                    Optional.of(3),
                    basis,
                    List.of(unit(v, n, 0), unit(v, n, 4), unit(v, n, 5)),
                    RealPoints.NO)),
            Optional.empty(),
            Optional.empty());
    return new Analysis(
        spec(
            "large",
            "A dense form of order " + n + " in \u03b1 and \u03b2",
            "",
            List.of("a", "beta", "g12", "x_ab"),
            basis),
        "0.1.0",
        Status.INCOMPLETE,
        "the time of 5 minutes ran out while factors were sought",
        List.of(),
        List.of("Whether condition 1 has real points: the budget of 5 minutes ran out."),
        Optional.of(
            new Findings(
                basis,
                v.names(),
                List.of(),
                List.of(),
                List.of(c),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of())));
  }

  /** As many strata as wanted in a lattice of coverings, for the diagram. */
  static Analysis manyStrata(int count) {
    Analysis a = SampleAnalyses.stratified();
    Findings f = a.findings().orElseThrow();
    List<Stratum> strata = new ArrayList<>();
    List<Covering> coverings = new ArrayList<>();
    int perLayer = 6;
    for (int k = 0; k < count; k++) {
      Stratum s = f.strata().get(k % 4);
      int layer = k == 0 ? 0 : 1 + (k - 1) / perLayer;
      strata.add(
          new Stratum(
              "S" + (k + 1),
              s.equations(),
              s.exclusions(),
              layer,
              3,
              s.rank(),
              s.derived(),
              s.centre(),
              s.radical(),
              s.nilradical(),
              s.kind(),
              s.type(),
              s.realPoints(),
              s.witness(),
              s.basis(),
              s.kernel(),
              List.of(),
              Optional.empty()));
      if (k > 0) {
        int up = layer == 1 ? 0 : k - perLayer;
        coverings.add(new Covering("S" + (k + 1), "S" + (up + 1)));
        if (layer > 1 && k % 2 == 0 && (up % perLayer) != 0) {
          coverings.add(new Covering("S" + (k + 1), "S" + (up + 2)));
        }
        if (layer == 3 && k % 5 == 0) {
          coverings.add(new Covering("S" + (k + 1), "S1"));
        }
      }
    }
    return new Analysis(
        a.spec(),
        a.version(),
        a.status(),
        a.message(),
        a.remarks(),
        a.undecided(),
        Optional.of(
            new Findings(
                f.listed(),
                f.variables(),
                f.relations(),
                f.poles(),
                f.components(),
                strata,
                coverings,
                f.regions(),
                f.contractions(),
                f.maps())));
  }
}
