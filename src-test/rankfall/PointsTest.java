package rankfall;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;
import rankfall.spec.SpecResult;

final class PointsTest {
  @ParameterizedTest
  @CsvSource({
    "1, 1, 0, 3, 0, true",
    "1, -3/2, 2, 1, 0, false",
    "-1, -1, 2, 1, 0, false",
    "0, 1, 0, 1, 2, false",
    "0, 0, 0, 0, 3, false"
  })
  void signaturesOfTheRotorAreThoseOfItsDiagonal(
      String a, String b, int plus, int minus, int zero, boolean compact) throws SpecException {
    PointResult.Facts f = facts(PointSpecs.ROTOR, "a=" + a + " b=" + b);
    assertEquals(Optional.of(new Analysis.Signature(plus, minus, zero)), f.killing().signature());
    assertEquals(3 - zero, f.killing().rank());
    assertEquals(compact, f.compact());
    assertEquals(zero == 0, f.semisimple());
  }

  @Test
  void overTheComplexNumbersThereIsNoSignature() throws SpecException {
    PointResult.Facts f = facts(PointSpecs.COMPLEX_ROTOR, "a=1 b=1");
    assertEquals(Optional.empty(), f.killing().signature());
    assertEquals("-8", f.killing().determinant());
    assertTrue(f.semisimple());
    assertFalse(f.compact());
  }

  /** kappa(H,H) = 4 and kappa(E,F) = 2 sqrt(2) (p - sqrt(2)), by hand. */
  @ParameterizedTest
  @CsvSource({"1, 2*sqrt(2) - 4, 64*sqrt(2) - 96", "0, -4, -64"})
  void algebraicNumbersStayExact(String p, String entry, String determinant) throws SpecException {
    PointResult.Facts f = facts(PointSpecs.ROOT, "p=" + p);
    assertEquals("4", f.killing().matrix().get(0).get(0));
    assertEquals(entry, f.killing().matrix().get(1).get(2));
    assertEquals(determinant, f.killing().determinant());
    assertEquals(Optional.of(new Analysis.Signature(2, 1, 0)), f.killing().signature());
  }

  @Test
  void functionsOfAParameterAreCoordinates() throws SpecException {
    PointResult.Facts f = facts(PointSpecs.ANGLE, "cos(t)=3/5 sin(t)=4/5");
    assertEquals("-24/25", f.killing().matrix().get(0).get(0));
    assertEquals(Map.of("cos(t)", "3/5", "sin(t)", "4/5"), f.parameters());
    assertEquals("0", facts(PointSpecs.ANGLE, "t=0").killing().matrix().get(0).get(0));
    Points points = PointSpecs.points(PointSpecs.ANGLE);
    assertEquals(List.of("t", "cos(t)", "sin(t)"), points.names());
    assertEquals(Optional.empty(), points.misfit(List.of("t")));
    assertEquals(
        Optional.of("no value for the parameter 'sin(t)'"), points.misfit(List.of("cos(t)")));
    assertEquals(
        Optional.of("'u' is no parameter of the family; it has t, cos(t), sin(t)"),
        points.misfit(List.of("t", "u")));
  }

  @Test
  void whatIsNoAlgebraSaysWhy() throws SpecException {
    PointResult.Failure open = failure(PointSpecs.OPEN, "c=1 d=1");
    assertEquals("the span is not closed: [X, Z] leaves it", open.error());
    assertTrue(open.open());
    assertEquals(3, open.dimension().getAsInt());
    assertEquals(2, facts(PointSpecs.OPEN, "c=0 d=1").dimension());
    assertOutside("entry has a pole: d = 0", PointSpecs.OPEN, "c=0 d=0");
    assertOutside("outside the domain: d < 5", PointSpecs.OPEN, "c=0 d=7");
    assertOutside(
        "the point is off the relation cos(t)^2 + sin(t)^2 - 1 = 0",
        PointSpecs.ANGLE,
        "cos(t)=1 sin(t)=1");
  }

  @Test
  void brokenJacobiNamesTheTriple() throws SpecException {
    String spec =
        """
        family: broken
        parameters: [k]
        brackets: |
          [X, Y] = X
          [X, Z] = k*Y
        """;
    PointResult.Failure f = failure(spec, "k=1");
    assertEquals("Jacobi's identity fails for (X, Y, Z)", f.error());
    assertTrue(f.open());
    assertEquals(1, facts(spec, "k=0").dimension() - 2);
  }

  @Test
  void strataAreAskedAtAlgebrasOnly() throws SpecException {
    SpecResult read = SpecReader.read("s.yaml", PointSpecs.OPEN.getBytes(UTF_8)).get(0);
    Points points = Points.of(((SpecResult.Read) read).spec(), p -> Optional.of("S2"));
    Map<String, BigFraction> at = PointSpecs.point("c=0 d=1");
    assertEquals(Optional.of("S2"), ((PointResult.Facts) points.at(at)).stratum());
    assertTrue(points.at(PointSpecs.point("c=1 d=1")) instanceof PointResult.Failure);
  }

  private static void assertOutside(String error, String spec, String point) throws SpecException {
    PointResult.Failure f = failure(spec, point);
    assertEquals(error, f.error());
    assertFalse(f.open());
  }

  private static PointResult.Facts facts(String spec, String point) throws SpecException {
    return (PointResult.Facts) PointSpecs.points(spec).at(PointSpecs.point(point));
  }

  private static PointResult.Failure failure(String spec, String point) throws SpecException {
    return (PointResult.Failure) PointSpecs.points(spec).at(PointSpecs.point(point));
  }
}
