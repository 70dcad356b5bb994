package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Quotient;
import rankfall.exact.Factorization.Factor;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;

/** What is set for names and exact values; expected strings are written by hand. */
class FormulasTest {
  private static final Variables V =
      new Variables(List.of("a", "g12", "alpha", "w", "cos(t)", "sqrt(2)"));
  private static final Formulas FORMULAS = new Formulas(Notation.of(V.names()));

  private static Polynomial x(String name) {
    return Polynomial.variable(V, name);
  }

  private static Polynomial number(long n) {
    return Polynomial.constant(V, n);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a|a",
        "g12|g_{12}",
        "a_1|a_{1}",
        "a_1_2|a_{1,2}",
        "x_ab|x_{\\mathrm{ab}}",
        "J_x|J_{x}",
        "alpha|\\alpha",
        "\u03b1|\\alpha",
        "omega_c|\\omega_{c}",
        "m_beta|m_{\\beta}",
        "Gamma2|\\Gamma_{2}",
        "\u0393|\\Gamma",
        "\u0391|\\mathrm{A}",
        "Alpha|\\mathrm{Alpha}",
        "Lx|\\mathrm{Lx}",
        "a_|\\mathrm{a\\_}",
        "cos(t)|\\cos t",
        "cos(2*t - s)|\\cos(2t - s)",
        "exp(t)|\\exp(t)",
        "sqrt(2)|\\sqrt{2}",
        "sqrt(1/2)|\\sqrt{\\frac{1}{2}}",
        "[X,[Y_1,Z]]|[X, \\allowbreak [Y_{1}, Z]]",
        "a*b - 2*c^2 >= 0|ab - 2c^{2} \\geq 0",
        "a != -1/2|a \\neq -\\frac{1}{2}",
        "(a + b)^2*c = 0|(a + b)^{2}c = 0",
        "3 of %|\\text{3 of \\%}",
        "run(a)|\\text{run(a)}",
      })
  void namesAndConditions(String text, String latex) {
    assertEquals(latex, Latex.of(new Formulas(Notation.of(List.of())).text(text)));
  }

  @Test
  void namesThatWouldLookAlikeStayAsTyped() {
    Notation n = Notation.of(List.of("a1", "a_1", "alpha", "\u03b1", "b1"));
    assertEquals("\\mathrm{a1}", Latex.of(n.name("a1")));
    assertEquals("\\mathrm{a\\_1}", Latex.of(n.name("a_1")));
    assertNotEquals(n.name("alpha"), n.name("\u03b1"));
    assertEquals("b_{1}", Latex.of(n.name("b1")));
  }

  @Test
  void polynomialKeepsItsTermsAndPutsRootsFirstFunctionsLast() {
    Polynomial p =
        x("a")
            .pow(2)
            .negate()
            .plus(x("cos(t)").pow(2).times(x("w")).times(BigInteger.TWO))
            .minus(x("a").times(x("sqrt(2)")));
    assertEquals("2w\\cos^{2}t - a^{2} - \\sqrt{2}a", Latex.of(FORMULAS.of(p)));
    assertEquals("0", Latex.of(FORMULAS.of(number(0))));
    assertEquals("-1", Latex.of(FORMULAS.of(number(-1))));
  }

  @Test
  void quotientIsAFractionWhereShortElseOneLine() {
    assertEquals(
        "-\\frac{a}{2g_{12}}",
        Latex.of(
            FORMULAS.of(RationalFunction.of(x("a").negate(), x("g12").times(BigInteger.TWO)))));
    Polynomial wide = Polynomial.zero(V);
    for (String name : V.names()) {
      wide = wide.plus(x(name).pow(7).times(BigInteger.valueOf(1234)));
    }
    wide = wide.plus(number(1));
    String latex = Latex.of(FORMULAS.of(RationalFunction.of(wide, x("a"))));
    assertTrue(latex.startsWith("(1234a^{7} + "), latex);
    assertTrue(latex.endsWith(" + 1)/\\rankfallbreak a"), latex);
  }

  @Test
  void factoredQuotientShowsSignPowersAndDenominator() {
    Polynomial sum = x("a").plus(x("alpha"));
    assertEquals(
        "-\\frac{8(a + \\alpha)^{2}g_{12}}{w^{3}}",
        Latex.of(
                FORMULAS.of(
                    new Quotient(
                        SampleAnalyses.factored(-8, new Factor(sum, 2), new Factor(x("g12"), 1)),
                        SampleAnalyses.factored(1, new Factor(x("w"), 3)))))
            .replace(Latex.BREAK, ""));
    assertEquals(
        "-1",
        Latex.of(
            FORMULAS.of(new Quotient(SampleAnalyses.factored(-1), SampleAnalyses.factored(1)))));
  }

  @Test
  void combinationNamesGenerators() {
    Combination c =
        new Combination(
            List.of(number(2), x("a").negate(), number(0), x("a").minus(number(1)), number(-1)));
    assertEquals(
        "2X - aY_{1} + (a - 1)\\,\\mathrm{Lz} - W",
        Latex.of(FORMULAS.of(c, List.of("X", "Y1", "Q", "Lz", "W"))));
    assertEquals("0", Latex.of(FORMULAS.of(new Combination(List.of(number(0))), List.of("X"))));
  }

  @Test
  void mathMlOfASmallPolynomial() {
    assertEquals(
        "<math><mrow><mn>2</mn><mo>&#x2062;</mo><mi>a</mi><mo form=\"infix\">\u2212</mo>"
            + "<msub><mrow><mi>g</mi></mrow><mrow><mn>12</mn></mrow></msub></mrow></math>",
        MathMl.inline(FORMULAS.of(x("a").times(BigInteger.TWO).minus(x("g12")))));
  }

  @Test
  void longFormulaIsCutBeforeItsOperators() {
    Polynomial p = x("a").plus(x("alpha")).plus(x("w")).plus(number(1)).pow(5);
    String cut = MathMl.inline(FORMULAS.of(p));
    assertEquals(p.termCount(), cut.split("<wbr/>").length);
    assertFalse(cut.contains("\ue000"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"<script>", "a & b", "x\"y'", "\u0000\ue000"})
  void foreignTextIsEscapedInMathMl(String text) throws Exception {
    String markup = MathMl.inline(FORMULAS.text(text));
    assertEquals("math", Xml.parse(markup).getDocumentElement().getTagName());
    assertFalse(markup.contains("<script"));
  }
}
