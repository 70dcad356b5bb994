package rankfall.lie.family;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.Span;
import rankfall.spec.Spec.Relation;

class SpanTest {
  private static final String LX = "0,0,0; 0,0,-c; 0,b,0";
  private static final String LY = "0,0,c; 0,0,0; -a,0,0";
  private static final String LZ = "0,-b,0; a,0,0; 0,0,0";

  private static Specs rotations() {
    return Specs.real("a", "b", "c").matrix("X", LX).matrix("Y", LY).matrix("Z", LZ);
  }

  /** By hand: the matrices preserve diag(a, b, c). */
  @Test
  void rotationsOfAMetric() {
    Family f = Brackets.family(rotations());
    assertEquals(List.of("[X,Y]=(c)Z", "[X,Z]=(-b)Y", "[Y,Z]=(a)X"), Brackets.of(f));
    assertEquals(List.of("a", "b", "c"), f.ring().variables().names());
  }

  @Test
  void generatorsThatBecomeDependentAtAPointAreLeftOut() {
    Family f = Brackets.family(rotations());
    Span<BigInteger> at = rational(f, "a=0", "b=0", "c=1/2");
    assertEquals(List.of(0, 1), at.kept());
    Family parallel =
        Brackets.family(Specs.real("a").matrix("X", "0,1;0,0").matrix("Y", "0,a;0,0"));
    assertEquals(List.of("X"), Brackets.closed(parallel).names());
    assertEquals(0, Brackets.closed(parallel).constants().brackets().size());
  }

  private static Span<BigInteger> rational(Family f, String... point) {
    return Span.of(assertInstanceOf(FamilySite.Rational.class, f.at(Specs.point(point))).input());
  }

  @Test
  void fractionsAtAPoint() {
    Span<BigInteger> at = rational(Brackets.family(rotations()), "a=2/3", "b=-5", "c=1/2");
    assertEquals(
        List.of("[X,Y]=(1/2)Z", "[X,Z]=(5)Y", "[Y,Z]=(2/3)X"),
        Brackets.ofIntegers((Span.Closed<BigInteger>) at));
  }

  /** The Pauli matrices, T_k = sigma_k / 2: [T_1, T_2] = i T_3 (common practice, no source). */
  @Test
  void hermitianMatricesAndHermitianBracketsGiveTheSameRealConstants() {
    Specs matrices =
        Specs.real()
            .hermitian()
            .matrix("A", "0,1/2; 1/2,0")
            .matrix("B", "0,-i/2; i/2,0")
            .matrix("C", "1/2,0; 0,-1/2");
    Specs brackets =
        Specs.real()
            .hermitian()
            .bracket("A", "B", "i*C")
            .bracket("B", "C", "i*A")
            .bracket("C", "A", "i*B");
    List<String> expected = List.of("[A,B]=(1)C", "[A,C]=(-1)B", "[B,C]=(1)A");
    assertEquals(expected, Brackets.of(Brackets.family(matrices)));
    assertEquals(expected, Brackets.of(Brackets.family(brackets)));
  }

  @Test
  void hermitianMatricesOverAComplexGround() {
    Specs matrices =
        Specs.complex()
            .hermitian()
            .matrix("A", "0,1/2; 1/2,0")
            .matrix("B", "0,-i/2; i/2,0")
            .matrix("C", "1/2,0; 0,-1/2");
    assertEquals(
        List.of("[A,B]=(1)C", "[A,C]=(-1)B", "[B,C]=(1)A"), Brackets.of(Brackets.family(matrices)));
  }

  @Test
  void aComplexAlgebraOverTheRealsHasTwiceTheDimension() {
    Specs s =
        Specs.real()
            .matrix("H", "1,0;0,-1")
            .matrix("E", "0,1;0,0")
            .matrix("F", "0,0;1,0")
            .matrix("iH", "i,0;0,-i")
            .matrix("iE", "0,i;0,0")
            .matrix("iF", "0,0;i,0");
    Span.Closed<Polynomial> c = Brackets.closed(Brackets.family(s));
    assertEquals(6, c.constants().dimension());
    assertTrue(Brackets.of(Brackets.family(s)).containsAll(List.of("[H,E]=(2)E", "[iH,iE]=(-2)E")));
    Specs over = Specs.complex().matrix("H", "1,0;0,-1").matrix("iH", "i,0;0,-i");
    assertEquals(List.of(0), Brackets.closed(Brackets.family(over)).kept());
  }

  @Test
  void rootsBecomeVariablesAndConstantsAreRationalised() {
    Family f =
        Brackets.family(
            Specs.real("a")
                .matrix("H", "sqrt(2)*a,0;0,-a/sqrt(2)")
                .matrix("E", "0,sqrt(6);0,0")
                .matrix("F", "0,sqrt(1/2);0,0"));
    assertEquals(List.of("a", "sqrt(2)", "sqrt(3)"), f.ring().variables().names());
    assertEquals(List.of("[H,E]=(3*sqrt(2)*a/2)E"), Brackets.of(f));
    assertEquals(List.of(0, 1), Brackets.closed(f).kept());
    FamilySite.Algebraic site =
        assertInstanceOf(FamilySite.Algebraic.class, f.at(Specs.point("a=2/3")));
    assertEquals(
        List.of("[H,E]=(sqrt(2))E"),
        Brackets.of((Span.Closed<Polynomial>) Span.of(site.input()), site.chain()));
  }

  @Test
  void cubicConstant() {
    Family f =
        Brackets.family(
            Specs.real().constant("w", 1.3247, -1, -1, 0, 1).bracket("H", "E", "w^3*E + E/w"));
    // 1/w = w^2 - 1 and w^3 = w + 1
    assertEquals(List.of("[H,E]=(w^2 + w)E"), Brackets.of(f));
  }

  /** A frame turned by t in the plane of two rotations: the brackets do not know t. */
  @Test
  void rotatingFrame() {
    Family f =
        Brackets.family(
            Specs.real("t")
                .combination(3, "X", "cos(t)*(E(3,2) - E(2,3)) + sin(t)*(E(1,3) - E(3,1))")
                .combination(3, "Y", "-sin(t)*(E(3,2) - E(2,3)) + cos(t)*(E(1,3) - E(3,1))")
                .combination(3, "Z", "E(2,1) - E(1,2)"));
    assertEquals(List.of("cos(t)", "sin(t)"), f.ring().variables().names());
    assertEquals(List.of("[X,Y]=(1)Z", "[X,Z]=(-1)Y", "[Y,Z]=(1)X"), Brackets.of(f));
    assertEquals(
        List.of("[X,Y]=(1)Z", "[X,Z]=(-1)Y", "[Y,Z]=(1)X"),
        Brackets.ofIntegers((Span.Closed<BigInteger>) rational(f, "cos(t)=3/5", "sin(t)=4/5")));
  }

  @Test
  void closureGenerates() {
    Family f =
        Brackets.family(
            Specs.real("a")
                .generate()
                .matrix("X", "0,1,0;0,0,0;0,0,0")
                .matrix("Y", "0,0,0;0,0,a;0,0,0"));
    assertEquals(List.of("X", "Y", "[X,Y]"), Brackets.closed(f).names());
    assertEquals(List.of("[X,Y]=(1)[X,Y]"), Brackets.of(f));
    assertEquals(List.of("X"), rational(f, "a=0").names());
    Family sl2 =
        Brackets.family(Specs.real("a").generate().matrix("E", "0,a;0,0").matrix("F", "0,0;1/a,0"));
    assertEquals(List.of("[E,F]=(1)[E,F]", "[E,[E,F]]=(-2)E", "[F,[E,F]]=(2)F"), Brackets.of(sl2));
  }

  /** By hand: [X, Y] = (a - b) E13 leaves the span unless a = b. */
  @Test
  void closureConditionsOfAnOpenSpan() {
    Family f =
        Brackets.family(
            Specs.real("a", "b", "m")
                .matrix("X", "0,m,0;0,0,b;0,0,0")
                .matrix("Y", "0,1,0;0,0,a/m;0,0,0"));
    assertInstanceOf(Span.Open.class, Brackets.generic(f));
    Span.Open<Polynomial> open = (Span.Open<Polynomial>) Brackets.generic(f);
    assertEquals(List.of("a - b"), open.conditions().stream().map(this::text).toList());
    assertEquals(List.of(0, 1), open.missing().get(0).generators());
    assertInstanceOf(Span.Open.class, rational(f, "a=1", "b=2", "m=1"));
    assertInstanceOf(Span.Closed.class, rational(f, "a=2", "b=2", "m=3"));
  }

  private String text(Polynomial p) {
    return p.primitive().toString();
  }

  /** A common factor of what is missing is a condition, too. */
  @Test
  void closureConditionThatDividesTheWholeRest() {
    Family f =
        Brackets.family(
            Specs.real("a")
                .matrix("X", "0,1,0,0;0,0,0,0;0,0,0,1;0,0,0,0")
                .matrix("Y", "0,0,0,0;0,0,a,0;0,0,0,0;0,0,0,0")
                .matrix("Z", "0,0,0,0;0,0,1,0;0,0,0,0;0,0,0,0"));
    Span<Polynomial> span = Brackets.generic(f);
    assertEquals(List.of(0, 1), span.kept());
    assertInstanceOf(Span.Open.class, span);
    Family g =
        Brackets.family(
            Specs.real("a")
                .matrix("X", "0,1,0,0;0,0,0,0;0,0,0,0;0,0,0,0")
                .matrix("Y", "0,0,0,0;0,0,a,0;0,0,0,0;0,0,0,1"));
    Span.Open<Polynomial> open = (Span.Open<Polynomial>) Brackets.generic(g);
    assertEquals(List.of("a"), open.conditions().stream().map(this::text).toList());
  }

  /** By hand: the cyclic sum of X, Y, Z is (a - b) W. */
  @Test
  void jacobiFails() {
    Family f =
        Brackets.family(
            Specs.real("a", "b")
                .generators("X", "Y", "Z", "W")
                .bracket("Y", "Z", "a*Y")
                .bracket("X", "Y", "W")
                .bracket("W", "Z", "b*W"));
    Span.Open<Polynomial> open = (Span.Open<Polynomial>) Brackets.generic(f);
    assertEquals(List.of("a - b"), open.conditions().stream().map(this::text).toList());
    assertEquals(List.of(0, 1, 2), open.missing().get(0).generators());
    assertInstanceOf(Span.Closed.class, rational(f, "a=1/3", "b=1/3"));
  }

  @Test
  void aHundredAndTwentyRotationsTakeASecondAtMost() {
    Specs s = Specs.real("a").where("a", Relation.UNEQUAL, "0");
    for (int i = 1; i <= 16; i++) {
      for (int j = i + 1; j <= 16; j++) {
        s.combination(16, "L" + i + "x" + j, "E(" + i + "," + j + ") - E(" + j + "," + i + ")");
      }
    }
    Family f = Brackets.family(s);
    Span.Closed<Polynomial> c = assertTimeout(Duration.ofSeconds(10), () -> Brackets.closed(f));
    assertEquals(120, c.constants().dimension());
    assertEquals(16 * 15 * 14 / 2, c.constants().brackets().size());
  }
}
