package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import rankfall.Analysis;
import rankfall.Analysis.Status;

class HtmlPageTest {
  private static final String NASTY = "<script>alert(1)</script> & 100% \"{{ page }}\" $x$ \\input";

  static Stream<Analysis> samples() {
    return Stream.of(
        SampleAnalyses.scaled(),
        SampleAnalyses.scaled(Status.INCOMPLETE, "Title & more", "notes < text"),
        SampleAnalyses.failed(),
        SampleAnalyses.stratified(),
        SampleAnalyses.undecomposed(),
        LargeAnalyses.large(9),
        LargeAnalyses.large(50),
        LargeAnalyses.manyStrata(25));
  }

  private static List<Element> elements(Document d, String tag) {
    NodeList found = d.getElementsByTagName(tag);
    List<Element> out = new ArrayList<>();
    for (int k = 0; k < found.getLength(); k++) {
      out.add((Element) found.item(k));
    }
    return out;
  }

  @ParameterizedTest
  @MethodSource("samples")
  void pageIsWellFormedAndItsLinksHaveTargets(Analysis a) throws Exception {
    Document d = Xml.parse(HtmlPage.of(a));
    Set<String> ids = new HashSet<>();
    for (Element e : elements(d, "*")) {
      if (e.hasAttribute("id")) {
        assertTrue(ids.add(e.getAttribute("id")), "twice: " + e.getAttribute("id"));
      }
    }
    for (Element link : elements(d, "a")) {
      String target = link.getAttribute("href");
      assertTrue(target.startsWith("#") && ids.contains(target.substring(1)), target);
    }
    assertEquals(1, elements(d, "h1").size());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void pageNeedsNothingFromElsewhere(Analysis a) {
    String page = HtmlPage.of(a);
    String elsewhere = page.replace("url(#", "");
    for (String reference : List.of("<script", "<link", "src=", "url(", "@import", "<img")) {
      assertFalse(elsewhere.contains(reference), reference);
    }
    assertFalse(page.contains("\r"));
  }

  @Test
  void textOfTheSpecIsNeverMarkup() throws Exception {
    String page = HtmlPage.of(SampleAnalyses.scaled(Status.COMPLETE, NASTY, NASTY));
    Document d = Xml.parse(page);
    assertEquals(0, elements(d, "script").size());
    assertEquals(NASTY, elements(d, "h1").get(0).getTextContent());
  }

  @Test
  void answerStandsFirst() throws Exception {
    Document d = Xml.parse(HtmlPage.of(SampleAnalyses.scaled()));
    Element first = elements(d, "section").get(0);
    assertEquals("answer", first.getAttribute("id"));
    assertTrue(first.getTextContent().contains("It degenerates exactly here:"));
  }

  @Test
  void undecidedStandsBeforeTheAnswerAndNothingIsCalledExact() throws Exception {
    String page = HtmlPage.of(SampleAnalyses.scaled(Status.INCOMPLETE, "", ""));
    Document d = Xml.parse(page);
    Element first = elements(d, "section").get(0);
    assertEquals("undecided", first.getAttribute("id"));
    assertTrue(first.getTextContent().contains("Factors of the determinant: time ran out."));
    assertFalse(page.contains("exactly"), "an incomplete list must not claim to be exact");
    assertTrue(page.contains("the list can lack entries"));
  }

  @Test
  void varietyThatWasNotDecomposedShowsItsRelationsAndNoAnswer() throws Exception {
    String page = HtmlPage.of(SampleAnalyses.undecomposed());
    assertTrue(page.contains(Words.NO_GENERAL_POINT));
    assertTrue(page.contains("needed for the span to close under the bracket"));
    assertFalse(page.contains("It degenerates"));
  }

  @Test
  void failedFamilyShowsItsMessageAndNoResults() throws Exception {
    Document d = Xml.parse(HtmlPage.of(SampleAnalyses.failed()));
    assertTrue(d.getDocumentElement().getTextContent().contains(SampleAnalyses.failed().message()));
    assertTrue(
        elements(d, "section").stream().noneMatch(s -> s.getAttribute("id").equals("answer")));
  }

  @Test
  void diagramHasABoxAStratumBelowThoseThatCoverIt() throws Exception {
    Document d = Xml.parse(HtmlPage.of(SampleAnalyses.stratified()));
    Element svg = elements(d, "svg").get(0);
    NodeList boxes = svg.getElementsByTagName("rect");
    assertEquals(4, boxes.getLength());
    assertEquals(3, svg.getElementsByTagName("path").getLength());
    double last = -1;
    for (int k = 0; k < boxes.getLength(); k++) {
      double y = Double.parseDouble(((Element) boxes.item(k)).getAttribute("y"));
      assertTrue(y > last);
      last = y;
    }
  }

  @Test
  void boxesOfTheDiagramDoNotOverlap() throws Exception {
    Analysis a = LargeAnalyses.manyStrata(25);
    Document d = Xml.parse(HtmlPage.of(a));
    List<Element> boxes = elements(d, "rect");
    assertEquals(25, boxes.size());
    Set<String> seen = new HashSet<>();
    for (Element b : boxes) {
      for (Element c : boxes) {
        double dx = Math.abs(number(b, "x") - number(c, "x"));
        double dy = Math.abs(number(b, "y") - number(c, "y"));
        boolean apart = dx >= number(b, "width") || dy >= number(b, "height");
        assertTrue(b == c || apart);
      }
      assertTrue(number(b, "x") >= 0 && seen.add(b.getAttribute("x") + "," + b.getAttribute("y")));
    }
  }

  private static double number(Element e, String attribute) {
    return Double.parseDouble(e.getAttribute(attribute));
  }

  @Test
  void matrixTooLargeForAPageIsGivenByItsEntries() {
    assertTrue(HtmlPage.of(LargeAnalyses.large(9)).contains("<mtable>"));
    assertFalse(HtmlPage.of(LargeAnalyses.large(50)).contains("<mtable>"));
  }
}
