package rankfall.exact;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.PlaneCells.Column;
import rankfall.exact.PlaneCells.Plane;

/**
 * Rational approximations of the curves of a plane, for pictures: every value lies within a given
 * distance of the true one.
 */
public final class PlaneGraphs {
  private final Plane plane;
  private final List<Polynomial> curves;
  private final BigFraction width;

  /**
   * The curves of a plane that was cut.
   *
   * @param cells the cells
   * @param width how far a value may be from the true one; positive
   */
  public PlaneGraphs(PlaneCells cells, BigFraction width) {
    this.plane = cells.plane();
    this.curves = cells.curves();
    this.width = width;
  }

  /**
   * {@return the heights of the graphs of a column, in their order}
   *
   * @param column one of the columns
   * @param x strictly between its walls
   */
  public List<BigFraction> heights(Column column, BigFraction x) {
    List<List<BigFraction>> byCurve = new ArrayList<>();
    for (int k = 0; k < curves.size(); k++) {
      byCurve.add(curves.get(k).contains(plane.y()) ? roots(k, x) : List.of());
    }
    return column.branches().stream().map(b -> byCurve.get(b.curve()).get(b.rank())).toList();
  }

  private List<BigFraction> roots(int curve, BigFraction x) {
    PlanePoint base = PlanePoint.of(plane.constants()).with(plane.x(), x);
    return roots(base, base.placed(curves.get(curve)), plane.y());
  }

  /**
   * {@return where curves cross a horizontal line, in no order}
   *
   * @param height of the line
   */
  public List<BigFraction> crossings(BigFraction height) {
    PlanePoint base = PlanePoint.of(plane.constants()).with(plane.y(), height);
    List<BigFraction> out = new ArrayList<>();
    for (Polynomial f : curves) {
      Polynomial p = base.placed(f);
      if (f.contains(plane.y()) && p.contains(plane.x())) {
        out.addAll(roots(base, p, plane.x()));
      }
    }
    return out;
  }

  /** Ascending. */
  private List<BigFraction> roots(PlanePoint base, Polynomial p, int variable) {
    if (p.support().size() == 1) {
      if (p.degree(variable) == 1) {
        return List.of(
            BigFraction.of(
                p.coefficient(variable, 0).constantValue().negate(),
                p.coefficient(variable, 1).constantValue()));
      }
      RealRoots r = RealRoots.of(p);
      List<BigFraction> out = new ArrayList<>();
      for (int k = 0; k < r.count(); k++) {
        out.add(r.refined(k, width).middle());
      }
      return out;
    }
    return PlaneFibre.nodes(base, variable, List.of(p), List.of()).stream()
        .map(n -> n.at().within(variable, width).middle())
        .toList();
  }
}
