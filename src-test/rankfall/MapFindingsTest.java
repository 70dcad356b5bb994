package rankfall;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.function.DoubleBinaryOperator;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import rankfall.RegionMap.Arc;
import rankfall.RegionMap.Area;
import rankfall.RegionMap.Kind;
import rankfall.RegionMap.Line;
import rankfall.RegionMap.Mark;
import rankfall.RegionMap.Missing;
import rankfall.RegionMap.Place;
import rankfall.RegionMap.Plane;
import rankfall.RegionMap.Spot;
import rankfall.spec.Spec;
import rankfall.spec.SpecReader;
import rankfall.spec.SpecResult;

/**
 * Maps of rotations whose second structure constant is f: the Killing form is diag(-2, -2f, -2f)
 * (by hand, from ad-traces), so the signature is (0, 3) where f is positive and (2, 1) where it is
 * negative, and the stratum S2 is the curve f = 0. Its shape is that of the curve, as textbooks of
 * plane curves draw it.
 */
class MapFindingsTest {
  private static List<RegionMap> maps(String head, String f) throws Exception {
    String spec =
        """
        family: curve
        %s
        brackets: |
          [X, Y] = Z
          [Y, Z] = (%s)*X
          [Z, X] = Y
        """
            .formatted(head, f);
    Analysis a = Engine.analyse(read(spec), Budget.DEFAULT);
    assertEquals(Analysis.Status.COMPLETE, a.status());
    return a.findings().orElseThrow().maps();
  }

  private static Spec read(String text) {
    byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
    return ((SpecResult.Read) SpecReader.read("curve.yaml", bytes).get(0)).spec();
  }

  private static Plane plane(String f) throws Exception {
    List<RegionMap> maps = maps("parameters: [a, b]", f);
    assertEquals(1, maps.size());
    return (Plane) maps.get(0);
  }

  /** By counting the crossings of a ray. */
  private static boolean contains(List<Spot> polygon, double x, double y) {
    boolean inside = false;
    for (int k = 0; k < polygon.size(); k++) {
      Spot a = polygon.get(k);
      Spot b = polygon.get((k + 1) % polygon.size());
      if ((a.y() > y) != (b.y() > y)
          && x > a.x() + (y - a.y()) / (b.y() - a.y()) * (b.x() - a.x())) {
        inside = !inside;
      }
    }
    return inside;
  }

  /** The sign of f tells the region at random points, away from the curve. */
  private static void assertColoured(Plane p, DoubleBinaryOperator f) {
    Random random = new Random(7);
    double x0 = p.across().from().doubleValue();
    double x1 = p.across().to().doubleValue();
    double y0 = p.up().from().doubleValue();
    double y1 = p.up().to().doubleValue();
    Set<Place> positive = new HashSet<>();
    Set<Place> negative = new HashSet<>();
    for (int k = 0; k < 400; k++) {
      double x = x0 + (x1 - x0) * random.nextDouble();
      double y = y0 + (y1 - y0) * random.nextDouble();
      double value = f.applyAsDouble(x, y);
      if (Math.abs(value) > 0.02) {
        List<Area> here = p.areas().stream().filter(a -> contains(a.outline(), x, y)).toList();
        assertEquals(1, here.size(), "areas at " + x + ", " + y);
        (value > 0 ? positive : negative).add(here.get(0).place());
      }
    }
    assertTrue(positive.size() == 1, positive.toString());
    assertTrue(negative.size() <= 1, negative.toString());
    assertFalse(positive.equals(negative));
  }

  private static void assertOnCurve(Plane p, DoubleBinaryOperator f) {
    for (Arc a : p.arcs()) {
      assertEquals("S2", a.place().stratum().orElseThrow());
      for (Spot s : a.line()) {
        assertEquals(0, f.applyAsDouble(s.x(), s.y()), 0.01, s.toString());
      }
    }
  }

  private static boolean touches(Plane p, double x, double y) {
    return p.arcs().stream()
        .flatMap(a -> List.of(a.line().get(0), a.line().get(a.line().size() - 1)).stream())
        .anyMatch(s -> Math.abs(s.x() - x) < 1e-3 && Math.abs(s.y() - y) < 1e-3);
  }

  @Test
  void parabolaPartsThePlane() throws Exception {
    Plane p = plane("a^2 - 4*b");
    DoubleBinaryOperator f = (a, b) -> a * a - 4 * b;
    assertColoured(p, f);
    assertOnCurve(p, f);
    assertEquals(1, p.arcs().size());
    assertTrue(p.marks().isEmpty());
  }

  @Test
  void cuspEndsAtTheOrigin() throws Exception {
    Plane p = plane("4*a^3 + 27*b^2");
    DoubleBinaryOperator f = (a, b) -> 4 * a * a * a + 27 * b * b;
    assertColoured(p, f);
    assertOnCurve(p, f);
    assertEquals(2, p.arcs().size());
    assertTrue(p.arcs().stream().allMatch(a -> a.line().get(a.line().size() - 1).x() < 1e-4));
    assertTrue(touches(p, 0, 0));
    assertTrue(p.marks().isEmpty(), "the cusp belongs to the curve");
  }

  @Test
  void circleCloses() throws Exception {
    Plane p = plane("a^2 + b^2 - 1");
    DoubleBinaryOperator f = (a, b) -> a * a + b * b - 1;
    assertColoured(p, f);
    assertOnCurve(p, f);
    assertTrue(touches(p, -1, 0) && touches(p, 1, 0));
    assertTrue(p.across().from().doubleValue() < -1 && p.across().to().doubleValue() > 1);
  }

  @Test
  void sumOfSquaresIsAPoint() throws Exception {
    Plane p = plane("a^2 + b^2");
    assertTrue(p.arcs().isEmpty());
    assertEquals(1, p.marks().size());
    Mark m = p.marks().get(0);
    assertEquals("S2", m.place().stratum().orElseThrow());
    assertEquals(List.of(BigFraction.ZERO, BigFraction.ZERO), m.exact());
    assertEquals(1, p.areas().stream().map(Area::place).distinct().count());
  }

  @Test
  void hyperbolaLeavesTheWindowAtItsAsymptote() throws Exception {
    Plane p = plane("a*b - 1");
    DoubleBinaryOperator f = (a, b) -> a * b - 1;
    assertColoured(p, f);
    assertOnCurve(p, f);
    assertEquals(2, p.arcs().size());
    double top = p.up().to().doubleValue();
    assertTrue(touches(p, 1 / top, top) && touches(p, -1 / top, -top));
  }

  @Test
  void lemniscateCrossesItselfWithoutAPointOfItsOwn() throws Exception {
    Plane p = plane("(a^2 + b^2)^2 - a^2 + b^2");
    DoubleBinaryOperator f = (a, b) -> Math.pow(a * a + b * b, 2) - a * a + b * b;
    assertColoured(p, f);
    assertOnCurve(p, f);
    assertTrue(touches(p, -1, 0) && touches(p, 0, 0) && touches(p, 1, 0));
    assertTrue(p.marks().isEmpty());
  }

  @Test
  void pointsOutsideTheConditionsAreNoRegion() throws Exception {
    Plane p = (Plane) maps("parameters: [a, b]\nwhere: [\"a > 0\"]", "b").get(0);
    for (Area a : p.areas()) {
      boolean left = a.outline().stream().allMatch(s -> s.x() <= 1e-9);
      assertEquals(left ? Kind.OUTSIDE : Kind.STRATUM, a.place().kind());
    }
    assertTrue(p.areas().stream().anyMatch(a -> a.place().kind() == Kind.OUTSIDE));
  }

  @Test
  void lineHasItsRootsAsPoints() throws Exception {
    Line l = (Line) maps("parameters: [a]", "a^2 - 2").get(0);
    assertEquals(3, l.stretches().size());
    assertEquals(2, l.marks().size());
    assertEquals(-Math.sqrt(2), l.marks().get(0).spot().x(), 1e-4);
    assertTrue(l.marks().get(0).exact().isEmpty());
    assertEquals(l.stretches().get(0).place(), l.stretches().get(2).place());
    assertFalse(l.stretches().get(0).place().equals(l.stretches().get(1).place()));
  }

  @Test
  void threeParametersGiveThreePlanesThroughOnePoint() throws Exception {
    List<RegionMap> maps = maps("parameters: [a, b, c]", "a*b - c");
    assertEquals(3, maps.size());
    Set<String> held =
        maps.stream()
            .map(m -> ((Plane) m).slice().held().get(0).variable())
            .collect(Collectors.toSet());
    assertEquals(Set.of("a", "b", "c"), held);
  }

  /** On the relation c = a^2 the plane of a and b is free, and c follows. */
  @Test
  void relationThatCanBeSolvedIsFollowed() throws Exception {
    List<RegionMap> maps = maps("parameters: [a, b, c]\nwhere: [\"c = a^2\"]", "c - b");
    Plane p = (Plane) maps.get(0);
    assertEquals("c", p.slice().dependent().get(0).variable());
    assertEquals("a^2", p.slice().dependent().get(0).value().numerator().toString());
    assertColoured(p, (a, b) -> a * a - b);
  }

  @Test
  void circleOfAnglesIsNotDrawnAndSaysSo() throws Exception {
    List<RegionMap> maps = maps("parameters: [t]", "cos(t)");
    assertTrue(((Missing) maps.get(0)).reason().startsWith("Functions of one parameter"));
  }

  @Test
  void algebraicNumbersArePlaced() throws Exception {
    Plane p = plane("a - sqrt(2)*b");
    assertColoured(p, (a, b) -> a - Math.sqrt(2) * b);
    assertOnCurve(p, (a, b) -> a - Math.sqrt(2) * b);
  }
}
