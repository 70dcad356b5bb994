package rankfall;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.Analysis.Findings;
import rankfall.Analysis.MatrixEntry;
import rankfall.Forms.Existence;
import rankfall.Forms.Extent;
import rankfall.Forms.InvariantForms;
import rankfall.spec.SpecException;

/** Casimir elements and invariant forms against the literature. */
class InvariantFormsTest {

  private static List<String> cells(List<MatrixEntry> entries) {
    return entries.stream().map(e -> e.row() + " " + e.column() + " " + e.value()).toList();
  }

  private static final String OSCILLATOR =
      """
      family: oscillator
      brackets: |
        [J, P1] = P2
        [J, P2] = -P1
        [P1, P2] = T
      generators: [P1, P2, J, T]
      """;

  /**
   * The forms of the oscillator algebra are k times ((1, 0, 0, 0), (0, 1, 0, 0), (0, 0, b, 1), (0,
   * 0, 1, 0)) (Nappi and Witten, Phys. Rev. Lett. 71 (1993) 3751, eq. 6 and 7; from memory), of
   * determinant -k^4.
   */
  @Test
  void oscillatorHasANonDegenerateForm() throws SpecException {
    InvariantForms f = FormSpecs.forms(FormSpecs.findings(OSCILLATOR), 0);
    assertEquals(2, f.dimension());
    assertEquals(Existence.YES, f.nonDegenerate());
    assertEquals(
        List.of(List.of("2 2 1"), List.of("0 0 1", "1 1 1", "2 3 1")),
        f.basis().stream().map(InvariantFormsTest::cells).toList());
    assertEquals("-c2^4", f.determinant().orElseThrow().numerator().toString());
    // by hand: with b = c1/c2 and k = c2 the inverse has -b/k in place of b
    assertEquals(
        List.of("0 0 1/c2", "1 1 1/c2", "2 3 1/c2", "3 3 -c1/c2^2"),
        cells(f.inverse().orElseThrow().entries()));
  }

  /**
   * iso(2,1): the space is spanned by J.P and J.J, and J.P is not degenerate (Witten, 2+1
   * dimensional gravity as an exactly soluble system, Nucl. Phys. B 311 (1988) 46, sec. 2; from
   * memory).
   */
  @Test
  void poincareAlgebraInThreeDimensions() throws SpecException {
    InvariantForms f =
        FormSpecs.forms(
            FormSpecs.findings(
                """
                family: poincare-3
                brackets: |
                  [J0, J1] = J2
                  [J1, J2] = -J0
                  [J2, J0] = J1
                  [J0, P1] = P2
                  [J0, P2] = -P1
                  [J1, P0] = -P2
                  [J1, P2] = -P0
                  [J2, P0] = P1
                  [J2, P1] = P0
                generators: [J0, J1, J2, P0, P1, P2]
                """),
            0);
    assertEquals(2, f.dimension());
    assertEquals(Existence.YES, f.nonDegenerate());
    assertEquals(
        List.of(List.of("0 0 1", "1 1 -1", "2 2 -1"), List.of("0 3 1", "1 4 -1", "2 5 -1")),
        f.basis().stream().map(InvariantFormsTest::cells).toList());
    assertEquals("-c2^6", f.determinant().orElseThrow().numerator().toString());
  }

  /**
   * The Heisenberg algebra has none: the centre lies in the derived algebra, whose orthogonal
   * complement the centre is (Medina and Revoy, Ann. Sci. Ec. Norm. Sup. 18 (1985) 553; from
   * memory); the forms are those of the plane of q and p.
   */
  @Test
  void heisenbergAlgebraHasNone() throws SpecException {
    InvariantForms f =
        FormSpecs.forms(FormSpecs.findings("family: h\nbrackets: |\n  [q, p] = z\n"), 0);
    assertEquals(3, f.dimension());
    assertEquals(Existence.NO, f.nonDegenerate());
    assertTrue(f.determinant().isEmpty() && f.inverse().isEmpty());
  }

  /**
   * Two oscillators with one clock T, the second of which closes into the centre with the factor m.
   * From B([x,T],y) = B(x,[T,y]) by hand: B(P2,P2) = B(Q2,Q2) = m B(T,C), so the forms are
   * degenerate exactly at m = 0, where dimension, rank, derived algebra and centre are the same.
   */
  @Test
  void formsThatChangeInsideAStratumAreTold() throws SpecException {
    Findings f =
        FormSpecs.findings(
            """
            family: clock
            parameters: [m]
            brackets: |
              [T, Q1] = P1
              [T, P1] = -Q1
              [T, Q2] = P2
              [T, P2] = -Q2
              [Q1, P1] = C
              [Q2, P2] = m*C
            """);
    assertEquals(1, f.strata().size());
    InvariantForms forms = FormSpecs.forms(f, 0);
    assertEquals(2, forms.dimension());
    assertEquals(Existence.YES, forms.nonDegenerate());
    assertTrue(forms.settled());
    assertEquals(1, forms.deviations().size());
    assertEquals("[m]", forms.deviations().get(0).equations().toString());
    assertEquals(2, forms.deviations().get(0).dimension());
    assertEquals(Existence.NO, forms.deviations().get(0).nonDegenerate());
    assertEquals("-c2^6*m^2", forms.determinant().orElseThrow().numerator().toString());
  }

  /** The coefficients of the general member avoid the names of the family. */
  @Test
  void namesOfTheCoefficientsAreNew() throws SpecException {
    Findings f =
        FormSpecs.findings(
            """
            family: named
            parameters: [c1]
            where: ["c1 != 0"]
            brackets: |
              [J, P] = Q
              [J, Q] = -c1*P
              [P, Q] = T
            """);
    assertEquals(List.of("k1", "k2"), FormSpecs.forms(f, 0).coefficients());
  }

  /**
   * A semisimple algebra has as many forms as complex simple ideals: one for sl(3), two for so(4)
   * and for the Lorentz algebra (common practice, no source); an abelian one has all.
   */
  @Test
  void semisimpleAndAbelianAlgebras() throws IOException, SpecException {
    Findings f = FormSpecs.findings(Files.readString(Path.of("specs", "lorentz-to-euclid.yaml")));
    assertEquals(2, FormSpecs.forms(f, 0).dimension());
    assertEquals(Extent.SEMISIMPLE, FormSpecs.forms(f, 0).extent());
    assertEquals(1, FormSpecs.forms(FormSpecs.findings(FormSpecs.sl(3)), 0).dimension());
    InvariantForms plane =
        FormSpecs.forms(FormSpecs.findings("family: r2\nbrackets: |\n  [x, y] = 0*x\n"), 0);
    assertEquals(3, plane.dimension());
    assertEquals(Extent.ABELIAN, plane.extent());
    assertEquals(Existence.YES, plane.nonDegenerate());
  }

  /**
   * h, e, f of sl(2): the Casimir element of the Killing form is (h^2 + 2 e f + 2 f e)/8
   * (Humphreys, sec. 6.2, with the trace form 4 times the one of the plane; from memory).
   */
  @Test
  void casimirElementOfOrderTwo() throws SpecException {
    Findings f =
        FormSpecs.findings(
            "family: sl2\nbrackets: |\n  [h, e] = 2*e\n  [h, f] = -2*f\n  [e, f] = h\n");
    assertEquals(
        List.of("0 0 1/8", "1 2 1/4"),
        cells(f.components().get(0).casimir().orElseThrow().entries()));
    assertTrue(FormSpecs.findings(OSCILLATOR).components().get(0).casimir().isEmpty());
  }
}
