package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import rankfall.Analysis;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** Torus, Casimir element and invariant forms in every kind of file. */
class FormsReportTest {
  /** With a stratum inside which the forms change. */
  private static final String CLOCK =
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
      torus: [T, C]
      """;

  private static Analysis octet;
  private static Analysis clock;

  @BeforeAll
  static void analyse() throws IOException, SpecException {
    octet = analysis(Files.readString(Path.of("specs", "octet-scale.yaml")));
    clock = analysis(CLOCK);
  }

  private static Analysis analysis(String yaml) throws SpecException {
    return Engine.analyse(
        SpecReader.read("test.yaml", yaml.getBytes(StandardCharsets.UTF_8)).get(0).orThrow(),
        new Budget(Duration.ofMinutes(5), 100_000));
  }

  private static Schema schema() throws IOException {
    try (InputStream in = JsonFile.class.getResourceAsStream("result-schema.json")) {
      return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(new String(in.readAllBytes(), StandardCharsets.UTF_8));
    }
  }

  @Test
  void resultsFitTheSchema() throws IOException {
    for (Analysis a : List.of(octet, clock)) {
      assertEquals("[]", schema().validate(JsonFile.of(a), InputFormat.JSON).toString());
    }
  }

  /** Each pair makes one change that the schema must refuse. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        "\"span\" : \"imaginary\"->\"span\" : \"compact\"",
        "\"degrees\" : 90->\"degrees\" : \"90\"",
        "\"squared_length\" : \"1/9\"->\"squared\" : \"1/9\"",
        "\"extent\" : \"semisimple\"->\"extent\" : \"simple\"",
        "\"somewhere\" : true->\"somewhere\" : \"yes\""
      })
  void schemaRefusesOtherShapes(String change) throws IOException {
    String[] pair = change.split("->");
    String good = JsonFile.of(octet);
    assertTrue(good.contains(pair[0]), pair[0]);
    String bad = good.replaceFirst(java.util.regex.Pattern.quote(pair[0]), pair[1]);
    assertFalse(schema().validate(bad, InputFormat.JSON).isEmpty());
  }

  /**
   * f_acd f_bcd = 3 s^2 for the octet with scale s (Gell-Mann, Phys. Rev. 125 (1962) 1067; from
   * memory), so a weight of squared length s^2/3 as a vector has 1/9 under the dual form.
   */
  @Test
  void valuesOfTheOctet() throws IOException {
    JsonNode torus =
        new ObjectMapper().readTree(JsonFile.of(octet)).at("/findings/components/0/torus");
    assertEquals("3*s^2", torus.at("/form/0/entry").asText());
    assertEquals("[\"s != 0\"]", torus.at("/positive_definite/conditions").toString());
    for (int k = 0; k < 3; k++) {
      assertEquals("1/9", torus.at("/covectors/" + k + "/squared_length").asText());
    }
    assertEquals("{\"T8\":\"-sqrt(3)/(9*s)\"}", torus.at("/covectors/2/sharp").toString());
    assertEquals("A2", torus.at("/roots/type").asText());
  }

  private static Element section(Document d, String id) {
    NodeList all = d.getElementsByTagName("section");
    for (int k = 0; k < all.getLength(); k++) {
      if (((Element) all.item(k)).getAttribute("id").equals(id)) {
        return (Element) all.item(k);
      }
    }
    throw new AssertionError("no section " + id);
  }

  @Test
  void pageHasAChapterForEach() throws Exception {
    String page = HtmlPage.of(octet);
    Document d = Xml.parse(page);
    String torus = section(d, "torus").getTextContent();
    assertTrue(torus.contains("type A2") && torus.contains("90\u00b0"), torus);
    assertTrue(torus.contains("It is positive definite exactly where"), torus);
    // the eight squares, each a piece of the formula between two of which a line may break
    assertEquals(8, section(d, "casimir").getElementsByTagName("math").getLength());
    assertTrue(section(d, "invariant").getTextContent().contains("multiples of the Killing form"));
    for (String id : List.of("torus", "casimir", "invariant")) {
      assertTrue(page.contains("href=\"#" + id + "\""), id);
    }
  }

  @Test
  void pageTellsWhereFormsChangeAndWhyThereAreNoRoots() throws Exception {
    Document d = Xml.parse(HtmlPage.of(clock));
    String invariant = section(d, "invariant").getTextContent();
    assertTrue(invariant.contains("dimension 2, non-degenerate one: no"), invariant);
    String torus = section(d, "torus").getTextContent();
    assertTrue(torus.contains("The form is degenerate on the torus"), torus);
    assertTrue(torus.contains("There is none: the form is degenerate"), torus);
    assertFalse(HtmlPage.of(clock).contains("href=\"#casimir\""));
  }

  @Test
  void appendixHasTheSameChapters() {
    String tex = LatexAppendix.of(octet);
    assertTrue(tex.contains("\\subsection*{Torus and dual form}"));
    assertTrue(tex.contains("\\subsection*{Casimir element}"));
    assertTrue(tex.contains("\\frac{1}{\\sqrt{3s^{2}}}T_{3}"), tex);
    assertTrue(tex.contains("of type A2"));
    assertTrue(LatexAppendix.of(clock).contains("Where also $m = 0$: dimension 2"));
    assertTrue(tex.chars().allMatch(c -> c < 128));
  }
}
