package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Common practice of setting such names; no source. */
class TypeTextTest {
  @Test
  void semidirectSumsPowersAndIndicesAreSetOnThePage() {
    assertEquals("so(3,1) \u22c9 R<sup>4</sup>", TypeText.html("so(3,1) |x R^4"));
    assertEquals(
        "Bianchi VI<sub>h</sub>, h = -a<sup>2</sup>/b<sup>2</sup>",
        TypeText.html("Bianchi VI_h, h = -a^2/b^2"));
    assertEquals("A<sub>4,5</sub><sup>a,b</sup>", TypeText.html("A_{4,5}^{a,b}"));
    assertEquals("a &lt; b", TypeText.html("a < b"));
  }

  @Test
  void latexNeedsNoPackageForTheSignOfASemidirectSum() {
    assertEquals(
        "so(3,1) \\ensuremath{\\mathbin{|\\mkern-5.5mu\\times}} R\\ensuremath{^{\\text{4}}}",
        TypeText.latex("so(3,1) |x R^4"));
    assertEquals("50\\% \\& more", TypeText.latex("50% & more"));
  }

  @Test
  void picturesGetSigns() {
    assertEquals("so(3) \u22c9 R\u00b3", TypeText.signs("so(3) |x R^3"));
  }
}
