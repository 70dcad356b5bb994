package rankfall.exact;

import java.util.List;

/**
 * A line cut by closed sets.
 *
 * @param points of the sets that are not the whole line, ascending
 * @param gaps rational points below, between and above them; one more than points
 */
public record LineCells(List<PlanePoint> points, List<PlanePoint> gaps) {
  /** Copies the lists. */
  public LineCells {
    points = List.copyOf(points);
    gaps = List.copyOf(gaps);
  }

  /**
   * Cuts a line.
   *
   * @param constants values of the algebraic numbers of the ring
   * @param x position of the coordinate in the ring
   * @param sets closed sets, each by equations in the coordinate and the constants
   */
  public static LineCells of(TowerPoint constants, int x, List<List<Polynomial>> sets) {
    PlanePoint base = PlanePoint.of(constants);
    List<List<Polynomial>> cutting =
        sets.stream().filter(s -> !s.stream().allMatch(constants.chain()::vanishes)).toList();
    List<PlanePoint> points =
        PlaneFibre.nodes(base, x, List.of(), cutting).stream().map(PlaneFibre.Node::at).toList();
    return new LineCells(
        points, PlaneFibre.between(x, points).stream().map(g -> base.with(x, g)).toList());
  }
}
