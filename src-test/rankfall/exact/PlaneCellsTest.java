package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import rankfall.exact.PlaneCells.Branch;
import rankfall.exact.PlaneCells.Column;
import rankfall.exact.PlaneCells.Plane;
import rankfall.exact.PlaneCells.Wall;

/** Curves whose pictures stand in every textbook; the shapes are checked by their equations. */
class PlaneCellsTest {
  private static final Variables XY = new Variables(List.of("x", "y"));
  private static final TowerPoint NONE = TowerPoint.of(Chain.free(XY), Map.of());

  private static PlaneCells cells(String... sets) {
    List<List<Polynomial>> closed =
        Stream.of(sets)
            .map(s -> Stream.of(s.split(";")).map(t -> Read.polynomial(XY, t)).toList())
            .toList();
    return PlaneCells.of(new Plane(NONE, 0, 1), closed, () -> {}).orElseThrow();
  }

  private static List<Integer> graphs(PlaneCells c) {
    return c.columns().stream().map(x -> x.branches().size()).toList();
  }

  private static List<String> walls(PlaneCells c) {
    return c.walls().stream()
        .map(w -> w.at().within(0, BigFraction.of(1, 1000)).middle().doubleValue())
        .map(d -> Long.toString(Math.round(d * 100)))
        .toList();
  }

  private static List<Integer> right(Column c) {
    return c.branches().stream().map(Branch::right).toList();
  }

  private static List<Integer> left(Column c) {
    return c.branches().stream().map(Branch::left).toList();
  }

  /** x^2 = 4y, the discriminant of t^2 + x t + y: a graph over the whole axis. */
  @Test
  void parabolaIsOneGraph() {
    PlaneCells c = cells("x^2 - 4*y");
    assertEquals(List.of(1), graphs(c));
    PlaneCells tangent = cells("x^2 - 4*y", "y");
    assertEquals(List.of(2, 2), graphs(tangent));
    assertFalse(tangent.walls().get(0).plain());
    assertEquals(Set.of(0, 1), tangent.walls().get(0).nodes().get(0).curves());
  }

  /** 4x^3 + 27y^2 = 0: no point with x > 0, two half branches that end together at the cusp. */
  @Test
  void cuspEndsBothBranchesAtTheOrigin() {
    PlaneCells c = cells("4*x^3 + 27*y^2");
    assertEquals(List.of(2, 0), graphs(c));
    assertEquals(List.of(0, 0), right(c.columns().get(0)));
    Wall w = c.walls().get(0);
    assertEquals(1, w.nodes().size());
    assertEquals(0, w.nodes().get(0).at().sign(Polynomial.variable(XY, 0)));
    assertEquals(0, w.nodes().get(0).at().sign(Polynomial.variable(XY, 1)));
    assertFalse(w.plain());
  }

  @Test
  void circleHasTwoGraphsBetweenItsEnds() {
    PlaneCells c = cells("x^2 + y^2 - 1");
    assertEquals(List.of(0, 2, 0), graphs(c));
    assertEquals(List.of("-100", "100"), walls(c));
    assertEquals(List.of(0, 0), left(c.columns().get(1)));
    assertEquals(List.of(0, 0), right(c.columns().get(1)));
    Polynomial f = c.curves().get(0);
    assertEquals(
        List.of(1, -1, 1), c.columns().get(1).cells().stream().map(p -> p.sign(f)).toList());
  }

  @Test
  void sumOfSquaresIsAnIsolatedPoint() {
    PlaneCells c = cells("x^2 + y^2");
    assertEquals(List.of(0, 0), graphs(c));
    Wall w = c.walls().get(0);
    assertEquals(1, w.nodes().size());
    assertEquals(Set.of(0), w.nodes().get(0).curves());
    assertEquals(2, w.gaps().size());
    assertFalse(w.plain());
  }

  /** x y = 1: down the wall x = 0 on the left, up on the right. */
  @Test
  void hyperbolaLeavesAllBoundsAtItsAsymptote() {
    PlaneCells c = cells("x*y - 1");
    assertEquals(List.of(1, 1), graphs(c));
    assertTrue(c.walls().get(0).nodes().isEmpty());
    assertEquals(List.of(-1), right(c.columns().get(0)));
    assertEquals(List.of(0), left(c.columns().get(1)));
    assertFalse(c.walls().get(0).plain());
  }

  /** Bernoulli's lemniscate (x^2 + y^2)^2 = x^2 - y^2: two loops that cross at the origin. */
  @Test
  void lemniscateCrossesItselfOnce() {
    PlaneCells c = cells("(x^2 + y^2)^2 - x^2 + y^2");
    assertEquals(List.of(0, 2, 2, 0), graphs(c));
    assertEquals(List.of("-100", "0", "100"), walls(c));
    assertEquals(List.of(0, 0), right(c.columns().get(1)));
    assertEquals(List.of(0, 0), left(c.columns().get(2)));
  }

  /** A vertical line is no graph, and meets the diagonal in one node. */
  @Test
  void verticalLineIsAWallOfItsOwn() {
    PlaneCells c = cells("x - 2", "x - y");
    assertEquals(List.of(1, 1), graphs(c));
    assertTrue(c.walls().get(0).vertical());
    assertEquals(1, c.walls().get(0).nodes().size());
  }

  /** {x^2 = 2, y = x}: two points with irrational coordinates and no curve. */
  @Test
  void finiteSetIsFoundByItsPoints() {
    PlaneCells c = cells("x^2 - 2; x - y");
    assertEquals(List.of("-141", "141"), walls(c));
    assertTrue(c.curves().isEmpty());
    for (Wall w : c.walls()) {
      assertEquals(1, w.nodes().size());
      assertEquals(0, w.nodes().get(0).at().sign(Read.polynomial(XY, "y^2 - 2")));
      assertFalse(w.plain());
    }
  }

  /** {x(x-1), x(y-2)}: the line x = 0 and the point (1, 2). */
  @Test
  void commonFactorIsACurveAndTheRestPoints() {
    PlaneCells c = cells("x*(x-1); x*(y-2)");
    assertEquals(List.of(Read.polynomial(XY, "x")), c.curves());
    assertEquals(List.of("0", "100"), walls(c));
    assertEquals(List.of(true, false), c.walls().stream().map(Wall::vertical).toList());
    assertEquals(0, c.walls().get(1).nodes().get(0).at().compare(1, BigFraction.of(2)));
  }

  /** Two circles that meet above x = 1/2 at y = +-sqrt(3)/2: nodes over an irrational fibre. */
  @Test
  void circlesCrossInTwoNodes() {
    PlaneCells c = cells("x^2 + y^2 - 1", "(x-1)^2 + y^2 - 1");
    Wall w =
        c.walls().stream()
            .filter(v -> v.at().compare(0, BigFraction.of(1, 2)) == 0)
            .findFirst()
            .orElseThrow();
    assertEquals(2, w.nodes().size());
    assertTrue(w.nodes().stream().allMatch(n -> n.curves().equals(Set.of(0, 1))));
    assertEquals(0, w.nodes().get(1).at().sign(Read.polynomial(XY, "4*y^2 - 3")));
    assertEquals(1, w.nodes().get(1).at().sign(Polynomial.variable(XY, 1)));
  }

  /** y^2 = 2 x^2 over the square root of 2: two lines, each a curve of its own. */
  @Test
  void constantsSplitCurves() {
    Variables ring = new Variables(List.of("x", "y", "w"), 1);
    Polynomial rule = Read.polynomial(ring, "w^2 - 2");
    TowerPoint root =
        TowerPoint.of(
            new Chain(ring, List.of(new Chain.Rule(2, rule))), Map.of(2, BigFraction.of(7, 5)));
    PlaneCells c =
        PlaneCells.of(
                new Plane(root, 0, 1),
                List.of(
                    List.of(Read.polynomial(ring, "y^2 - 2*x^2")),
                    List.of(Read.polynomial(ring, "x - w"))),
                () -> {})
            .orElseThrow();
    assertEquals(3, c.curves().size());
    assertEquals(List.of("0", "141"), walls(c));
    assertEquals(List.of(2, 2, 2), graphs(c));
    assertTrue(c.walls().get(1).vertical());
    assertEquals(2, c.walls().get(1).nodes().size());
    assertEquals(0, c.walls().get(1).nodes().get(1).at().compare(1, BigFraction.of(2)));
  }

  /** Sums to Euler's number of the plane: cells minus graphs and gaps plus nodes give 1. */
  @Test
  void cellsOfTheWholePlaneHaveEulersNumberOne() {
    for (String[] sets :
        List.of(
            new String[] {"x*y*(x - y)", "x^2 + y^2 - 4"},
            new String[] {"y^3 - x*y + x - 2"},
            new String[] {"(x^2 + y^2)^2 - x^2 + y^2", "x^2 - y; y - 1/1"})) {
      PlaneCells c = cells(Stream.of(sets).map(s -> s.replace("/1", "")).toArray(String[]::new));
      int sum = 0;
      for (Column k : c.columns()) {
        sum += k.cells().size() - k.branches().size();
      }
      for (Wall w : c.walls()) {
        sum += w.nodes().size() - w.gaps().size();
      }
      assertEquals(1, sum);
    }
  }
}
