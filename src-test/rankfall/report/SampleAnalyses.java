package rankfall.report;

import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.AlgebraType;
import rankfall.Analysis;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Contracted;
import rankfall.Analysis.Contraction;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Covering;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Killing;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Origin;
import rankfall.Analysis.Quotient;
import rankfall.Analysis.RealPoints;
import rankfall.Analysis.Region;
import rankfall.Analysis.Relation;
import rankfall.Analysis.Signature;
import rankfall.Analysis.Status;
import rankfall.Analysis.Stratum;
import rankfall.Analysis.StructureEntry;
import rankfall.Analysis.Unfollowed;
import rankfall.Analysis.WithoutLimit;
import rankfall.Comparison;
import rankfall.SignCondition;
import rankfall.exact.Factorization;
import rankfall.exact.Factorization.Factor;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;
import rankfall.spec.Place;
import rankfall.spec.Spec;

/** Analyses written by hand, as the writers get them. */
final class SampleAnalyses {
  private SampleAnalyses() {}

  static final String SHA = "0123456789abcdef".repeat(4);

  static Spec spec(
      String family, String title, String notes, List<String> parameters, List<String> generators) {
    Place place = new Place("sample.yaml", 1, 9, family.length());
    return new Spec(
        family,
        title.isEmpty() ? Optional.empty() : Optional.of(title),
        notes.isEmpty() ? Optional.empty() : Optional.of(notes),
        Spec.Ground.REAL,
        Spec.Convention.DIRECT,
        parameters,
        List.of(),
        List.of(),
        List.of(),
        new Spec.Brackets(generators, List.of()),
        List.of(),
        Map.of(),
        Map.of(),
        new Spec.Source("sample.yaml", List.of("family: " + family), SHA, place, List.of()));
  }

  static RationalFunction whole(Polynomial p) {
    return RationalFunction.of(p);
  }

  static Factorization factored(long unit, Factor... factors) {
    return new Factorization(BigFraction.of(unit), List.of(factors));
  }

  static Combination unit(Variables v, int n, int k) {
    return new Combination(
        IntStream.range(0, n)
            .mapToObj(j -> j == k ? Polynomial.one(v) : Polynomial.zero(v))
            .toList());
  }

  /**
   * sl(2) with [H,X] = 2 X, [H,Y] = -2 Y, [X,Y] = alpha/b_1 H: by hand K(H,H) = 8, K(X,Y) = 4
   * alpha/b_1, determinant -128 alpha^2/b_1^2; at alpha = 0 the kernel is spanned by X and Y.
   */
  static Analysis scaled(Status status, String title, String notes) {
    Variables v = new Variables(List.of("alpha", "b_1"));
    Polynomial a = Polynomial.variable(v, "alpha");
    Polynomial b = Polynomial.variable(v, "b_1");
    Polynomial one = Polynomial.one(v);
    RationalFunction two = whole(Polynomial.constant(v, 2));
    RationalFunction four = whole(Polynomial.constant(v, 4));
    RationalFunction q = RationalFunction.of(a, b);
    List<String> basis = List.of("H", "X", "Y");
    Killing killing =
        new Killing(
            List.of(
                new MatrixEntry(0, 0, whole(Polynomial.constant(v, 8))),
                new MatrixEntry(1, 2, four.times(q))),
            3,
            List.of(),
            List.of(List.of(0), List.of(1, 2)),
            Optional.of(
                new Quotient(factored(-128, new Factor(a, 2)), factored(1, new Factor(b, 2)))),
            Optional.of(new Signature(2, 1, 0)));
    Component c =
        new Component(
            1,
            List.of(),
            2,
            basis,
            List.of(
                new StructureEntry(0, 1, 1, two),
                new StructureEntry(0, 2, 2, two.negate()),
                new StructureEntry(1, 2, 0, q)),
            killing,
            Optional.of(
                List.of(
                    new MatrixEntry(0, 0, RationalFunction.of(one, Polynomial.constant(v, 8))),
                    new MatrixEntry(1, 2, RationalFunction.of(b, a.times(BigInteger.valueOf(4)))))),
            List.of(
                new Condition(
                    List.of(a),
                    Optional.of(2),
                    Optional.of(1),
                    Optional.of(2),
                    basis,
                    List.of(unit(v, 3, 1), unit(v, 3, 2)),
                    RealPoints.YES)),
            Optional.empty(),
            Optional.empty());
    return new Analysis(
        spec("scaled-sl2", title, notes, List.of("alpha", "b_1"), basis),
        "0.1.0",
        status,
        status == Status.COMPLETE ? "" : "the time ran out",
        List.of(),
        status == Status.COMPLETE
            ? List.of()
            : List.of("Factors of the determinant: time ran out."),
        Optional.of(
            new Findings(
                basis,
                v.names(),
                List.of(),
                List.of(b),
                List.of(c),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of())));
  }

  static Analysis scaled() {
    return scaled(Status.COMPLETE, "Scaled generators", "Demo family.\nTwo lines.");
  }

  /** A family of which nothing is known. */
  static Analysis failed() {
    return new Analysis(
        spec("broken", "", "", List.of("a"), List.of("X", "Y")),
        "0.1.0",
        Status.FAILED,
        "the closure needs [X, Y], which is not in the span; <none> & \"quoted\"",
        List.of(),
        List.of(),
        Optional.empty());
  }

  /**
   * Rotations with [X,Y] = c Z, [Y,Z] = a X, [Z,X] = b Y: the Killing form is diagonal, -2bc, -2ac,
   * -2ab, so the rank is 3 where abc != 0, 1 where one of the three vanishes, else 0.
   */
  static Analysis stratified() {
    Variables v = new Variables(List.of("a", "b", "c"));
    Polynomial a = Polynomial.variable(v, "a");
    Polynomial b = Polynomial.variable(v, "b");
    Polynomial c = Polynomial.variable(v, "c");
    List<String> basis = List.of("X", "Y", "Z");
    BigInteger m2 = BigInteger.valueOf(-2);
    List<Combination> all = List.of(unit(v, 3, 0), unit(v, 3, 1), unit(v, 3, 2));
    Killing killing =
        new Killing(
            List.of(
                new MatrixEntry(0, 0, whole(b.times(c).times(m2))),
                new MatrixEntry(1, 1, whole(a.times(c).times(m2))),
                new MatrixEntry(2, 2, whole(a.times(b).times(m2)))),
            3,
            List.of(),
            List.of(List.of(0), List.of(1), List.of(2)),
            Optional.of(
                new Quotient(
                    factored(-8, new Factor(a, 2), new Factor(b, 2), new Factor(c, 2)),
                    factored(1))),
            Optional.empty());
    Component component =
        new Component(
            1,
            List.of(),
            3,
            basis,
            List.of(
                new StructureEntry(0, 1, 2, whole(c)),
                new StructureEntry(0, 2, 1, whole(b.negate())),
                new StructureEntry(1, 2, 0, whole(a))),
            killing,
            Optional.empty(),
            List.of(
                new Condition(
                    List.of(a),
                    Optional.of(2),
                    Optional.of(1),
                    Optional.of(2),
                    basis,
                    List.of(unit(v, 3, 1), unit(v, 3, 2)),
                    RealPoints.YES),
                new Condition(
                    List.of(b),
                    Optional.of(2),
                    Optional.of(1),
                    Optional.of(2),
                    basis,
                    List.of(unit(v, 3, 0), unit(v, 3, 2)),
                    RealPoints.YES),
                new Condition(
                    List.of(c),
                    Optional.of(2),
                    Optional.of(1),
                    Optional.of(2),
                    basis,
                    List.of(unit(v, 3, 0), unit(v, 3, 1)),
                    RealPoints.UNKNOWN)),
            Optional.empty(),
            Optional.empty());
    List<Coordinate> origin = point("0", "0", "0");
    List<Stratum> strata =
        List.of(
            stratum(
                "S1",
                List.of(),
                List.of(List.of(a), List.of(b), List.of(c)),
                0,
                3,
                3,
                "simple",
                Optional.of("sl(2,C)"),
                point("1", "1", "1"),
                List.of()),
            stratum(
                "S2",
                List.of(a),
                List.of(List.of(b), List.of(c)),
                1,
                1,
                2,
                "solvable",
                Optional.empty(),
                point("0", "1", "-3/2"),
                all.subList(1, 3)),
            stratum(
                "S3",
                List.of(a, b),
                List.of(List.of(c)),
                2,
                0,
                1,
                "nilpotent",
                Optional.of("Heisenberg"),
                point("0", "0", "1"),
                all),
            stratum(
                "S4",
                List.of(a, b, c),
                List.of(),
                3,
                0,
                0,
                "abelian",
                Optional.of("R^3"),
                origin,
                all));
    List<Region> regions =
        List.of(
            new Region(
                "S1",
                "R1",
                List.of(
                    new SignCondition(a, Comparison.GREATER),
                    new SignCondition(
                        b.times(c).plus(a.times(a).times(m2)).negate(), Comparison.GREATER)),
                new Signature(2, 1, 0),
                Optional.of(new AlgebraType("sl(2,R)", List.of("so(2,1)"), true)),
                true,
                point("1", "1", "root(x^2 - 2, 1.41421356)")),
            new Region(
                "S4", "R1", List.of(), new Signature(0, 0, 3), Optional.empty(), false, origin));
    return new Analysis(
        spec("stretched-rotor", "Rotations, stretched", "", List.of("a", "b", "c"), basis),
        "0.1.0",
        Status.COMPLETE,
        "",
        List.of("The span has dimension 3 everywhere."),
        List.of(),
        Optional.of(
            new Findings(
                basis,
                v.names(),
                List.of(
                    new Relation(a.times(b).minus(c), List.of(a.times(b).minus(c)), Origin.JACOBI)),
                List.of(),
                List.of(component),
                strata,
                List.of(
                    new Covering("S2", "S1"), new Covering("S3", "S2"), new Covering("S4", "S3")),
                regions,
                contractions(a, v, basis),
                List.of())));
  }

  /** One of each outcome. */
  private static List<Contraction> contractions(Polynomial a, Variables v, List<String> basis) {
    RationalFunction inverse = RationalFunction.of(Polynomial.one(v), a);
    return List.of(
        new Contraction(
            "S2",
            1,
            basis,
            new Contracted(
                List.of(new StructureEntry(0, 1, 2, RationalFunction.of(a))),
                0,
                1,
                1,
                Optional.of(new AlgebraType("h3", List.of("Bianchi II"), true)))),
        new Contraction(
            "S3", 1, basis, new WithoutLimit(List.of(new StructureEntry(0, 1, 2, inverse)))),
        new Contraction(
            "S4",
            1,
            basis,
            new Unfollowed(
                List.of(new StructureEntry(1, 2, 0, inverse)),
                "the component is not smooth there")));
  }

  /** A family that closes on a locus only, which was not decomposed. */
  static Analysis undecomposed() {
    Analysis a = stratified();
    Findings f = a.findings().orElseThrow();
    Polynomial p = f.components().get(0).conditions().get(0).equations().get(0);
    Polynomial q = f.components().get(0).conditions().get(1).equations().get(0);
    return new Analysis(
        a.spec(),
        a.version(),
        Status.INCOMPLETE,
        "the parameter variety was not decomposed",
        List.of(),
        List.of("The components of the parameter variety."),
        Optional.of(
            new Findings(
                f.listed(),
                f.variables(),
                List.of(new Relation(p.times(p.minus(q)), List.of(p, p.minus(q)), Origin.CLOSURE)),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of())));
  }

  static List<Coordinate> point(String a, String b, String c) {
    return List.of(new Coordinate("a", a), new Coordinate("b", b), new Coordinate("c", c));
  }

  static Stratum stratum(
      String name,
      List<Polynomial> equations,
      List<List<Polynomial>> exclusions,
      int codimension,
      int rank,
      int derived,
      String kind,
      Optional<String> type,
      List<Coordinate> witness,
      List<Combination> kernel) {
    return new Stratum(
        name,
        equations,
        exclusions,
        codimension,
        3,
        rank,
        derived,
        3 - derived,
        3 - rank,
        3 - rank,
        kind,
        type,
        RealPoints.YES,
        witness,
        List.of("X", "Y", "Z"),
        kernel,
        List.of(),
        Optional.empty());
  }
}
