package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import rankfall.Analysis;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Findings;
import rankfall.RegionMap;
import rankfall.RegionMap.Arc;
import rankfall.RegionMap.Area;
import rankfall.RegionMap.Axis;
import rankfall.RegionMap.Kind;
import rankfall.RegionMap.Line;
import rankfall.RegionMap.Mark;
import rankfall.RegionMap.Missing;
import rankfall.RegionMap.Place;
import rankfall.RegionMap.Plane;
import rankfall.RegionMap.Slice;
import rankfall.RegionMap.Spot;
import rankfall.RegionMap.Stretch;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;

class MapPictureTest {
  private static final Place R1 = Place.in("S1", Optional.of("R1"));
  private static final Place S2 = Place.in("S2", Optional.empty());
  private static final Place OUTSIDE = Place.of(Kind.OUTSIDE);

  private static Axis axis(String name) {
    return new Axis(name, BigFraction.of(-2), BigFraction.of(2));
  }

  private static Area box(Place place, double from, double to) {
    return new Area(
        place, List.of(new Spot(from, -2), new Spot(to, -2), new Spot(to, 2), new Spot(from, 2)));
  }

  private static RegionMap plane(String x, String y) {
    Polynomial a = Polynomial.variable(new Variables(List.of("a", "b", "c")), "a");
    return new Plane(
        new Slice(1, List.of(new Coordinate("c", "1/2")), List.of()),
        axis(x),
        axis(y),
        List.of(box(R1, -2, 0), box(OUTSIDE, 0, 2)),
        List.of(new Arc(S2, a, List.of(new Spot(0, -2), new Spot(0, 2)))),
        List.of(
            new Mark(
                Place.in("S4", Optional.of("R1")),
                new Spot(0, 0),
                List.of(BigFraction.ZERO, BigFraction.of(-1, 3)))));
  }

  private static RegionMap line() {
    return new Line(
        new Slice(1, List.of(), List.of()),
        axis("alpha"),
        List.of(new Stretch(R1, -2, 1), new Stretch(OUTSIDE, 1, 2)),
        List.of(new Mark(S2, new Spot(1, 0), List.of(BigFraction.ONE))));
  }

  private static Document page(RegionMap... maps) throws Exception {
    Analysis a = SampleAnalyses.stratified();
    Findings f = a.findings().orElseThrow();
    Findings with =
        new Findings(
            f.listed(),
            f.variables(),
            f.relations(),
            f.poles(),
            f.components(),
            f.strata(),
            f.coverings(),
            f.regions(),
            f.contractions(),
            List.of(maps),
            Optional.empty());
    return Xml.parse(
        HtmlPage.of(
            new Analysis(
                a.spec(),
                a.version(),
                a.status(),
                a.message(),
                a.remarks(),
                a.undecided(),
                Optional.of(with))));
  }

  private static List<Element> ofClass(Document d, String tag, String style) {
    NodeList found = d.getElementsByTagName(tag);
    List<Element> out = new ArrayList<>();
    for (int k = 0; k < found.getLength(); k++) {
      Element e = (Element) found.item(k);
      if (Stream.of(e.getAttribute("class").split(" ")).anyMatch(style::equals)) {
        out.add(e);
      }
    }
    return out;
  }

  @Test
  void everythingSeenIsInTheLegendWithWords() throws Exception {
    Document d = page(plane("a", "b"));
    Element legend = ofClass(d, "ul", "legend").get(0);
    NodeList items = legend.getElementsByTagName("li");
    assertEquals(4, items.getLength());
    String text = legend.getTextContent();
    for (String part :
        List.of("S1", "signature (2, 1)", "sl(2,R)", "outside", "S2", "rank 1 of 3", "S4")) {
      assertTrue(text.contains(part), part + " in " + text);
    }
  }

  @Test
  void pictureHasATextInItsPlace() throws Exception {
    Document d = page(plane("a", "b"));
    Element svg = ofClass(d, "svg", "map").get(0);
    String title = svg.getElementsByTagName("title").item(0).getTextContent();
    String words = svg.getElementsByTagName("desc").item(0).getTextContent();
    assertEquals("Map of regions in the plane of a and b", title);
    assertTrue(words.contains("Areas: S1: signature (2, 1), sl(2,R)"), words);
    assertTrue(words.contains("Curves: S2"), words);
    assertTrue(svg.getTextContent().contains("at (0, \u22121/3)"));
  }

  @Test
  void planesAreChosenWithoutAScript() throws Exception {
    Document d = page(plane("a", "b"), plane("a", "c"));
    NodeList inputs = d.getElementsByTagName("input");
    assertEquals(2, inputs.getLength());
    assertEquals("checked", ((Element) inputs.item(0)).getAttribute("checked"));
    assertEquals(2, ofClass(d, "figure", "plane").size());
    assertEquals(0, d.getElementsByTagName("script").getLength());
  }

  @Test
  void reasonStandsWhereThereIsNoPicture() throws Exception {
    Document d = page(new Missing("Nothing can be drawn & here is why."));
    assertEquals(0, ofClass(d, "figure", "plane").size());
    assertTrue(d.getDocumentElement().getTextContent().contains("drawn & here is why."));
  }

  @Test
  void axisShowsTheSymbolAndFractions() throws Exception {
    Document d = page(line());
    Element svg = ofClass(d, "svg", "map").get(0);
    List<String> texts = new ArrayList<>();
    NodeList all = svg.getElementsByTagName("text");
    for (int k = 0; k < all.getLength(); k++) {
      texts.add(all.item(k).getTextContent());
    }
    assertTrue(texts.contains("\u03b1"), texts.toString());
    assertTrue(texts.contains("\u22123/2") && texts.contains("1/2"), texts.toString());
    assertTrue(texts.contains("S2 (1)"), texts.toString());
  }
}
