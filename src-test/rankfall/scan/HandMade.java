package rankfall.scan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import rankfall.Analysis.RealPoints;
import rankfall.Analysis.Region;
import rankfall.Analysis.Signature;
import rankfall.Analysis.Stratum;
import rankfall.Comparison;
import rankfall.SignCondition;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;

/**
 * The algebra [X, Y] = a*Z, [Y, Z] = X, [Z, X] = Y with its strata and regions by hand: its Killing
 * form is diag(-2 a, -2 a, -2), so that it is so(3) for a > 0, sl(2,R) for a < 0 and the algebra of
 * the Euclidean plane for a = 0 (Milnor, Curvatures of left invariant metrics on Lie groups, Adv.
 * Math. 21 (1976) 293). A second parameter b takes no part.
 */
final class HandMade {
  static final Variables RING = new Variables(List.of("a", "b"));
  static final Polynomial A = Polynomial.variable(RING, 0);

  /** Numbers of a family without algebraic numbers: never asked. */
  static final NumberSigns RATIONAL =
      new NumberSigns() {
        @Override
        public int sign(Polynomial number) {
          throw new IllegalStateException("asked for the sign of " + number);
        }

        @Override
        public OptionalDouble near(Polynomial number) {
          throw new IllegalStateException("asked for " + number);
        }
      };

  private HandMade() {}

  /** The atlas over a and b. */
  static Atlas atlas() {
    Frame frame = new Frame(List.of("a", "b"), Set.of(), Set.of(), RATIONAL);
    return new Atlas(
        frame,
        List.of(),
        List.of(),
        List.of(),
        false,
        List.of(stratum("S1", List.of(), List.of(List.of(A)), 3), euclidean()),
        List.of(
            region("S1", "R1", List.of(new SignCondition(A, Comparison.LESS)), 2, 1),
            region("S1", "R2", List.of(new SignCondition(A, Comparison.GREATER)), 0, 3),
            region("S2", "R1", List.of(), 0, 1)));
  }

  private static Stratum euclidean() {
    return stratum("S2", List.of(A), List.of(), 1);
  }

  /** A stratum of algebras of dimension 3. */
  static Stratum stratum(
      String name, List<Polynomial> equations, List<List<Polynomial>> exclusions, int rank) {
    return new Stratum(
        name,
        equations,
        exclusions,
        equations.size(),
        3,
        rank,
        rank == 3 ? 3 : 2,
        0,
        0,
        0,
        "",
        Optional.empty(),
        RealPoints.YES,
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        Optional.empty());
  }

  /** A region of algebras of dimension 3. */
  static Region region(
      String stratum, String name, List<SignCondition> conditions, int plus, int minus) {
    return new Region(
        stratum,
        name,
        conditions,
        new Signature(plus, minus, 3 - plus - minus),
        Optional.empty(),
        true,
        List.of());
  }

  /** What is said of a point of an algebra of dimension 3. */
  static Finding finding(int plus, int minus) {
    return new Finding(
        Finding.Status.OK,
        OptionalInt.of(3),
        OptionalInt.of(plus + minus),
        Optional.of(new Signature(plus, minus, 3 - plus - minus)),
        "",
        "",
        "",
        false);
  }

  /** Nothing is asked of single points. */
  static DirectPoints never() {
    return p -> {
      throw new IllegalStateException("asked at " + p);
    };
  }

  /** A plan that writes all columns. */
  static ScanPlan plan(PointSet points, boolean zipped) {
    return new ScanPlan(
        atlas(),
        never(),
        points,
        Optional.of(
            new ScanPlan.Table(
                Columns.all(points.names()), cells -> String.join(",", cells), zipped)));
  }
}
