package rankfall.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import rankfall.Analysis.Covering;
import rankfall.Analysis.Stratum;

/**
 * Draws which stratum lies in the closure of which, as SVG: codimension grows from top to bottom, a
 * line joins a stratum to those directly in its closure. Layers are ordered by the barycentres of
 * their neighbours (Sugiyama, Tagawa, Toda 1981); a line over several layers gets a place in each.
 */
final class ClosureDiagram {
  private static final int BOX_WIDTH = 118;
  private static final int BOX_HEIGHT = 46;
  private static final int GAP = 14;
  private static final int BEND_WIDTH = 14;
  private static final int LAYER_HEIGHT = 104;
  private static final int MARGIN = 12;
  private static final int LABELS = 92;
  private static final int SWEEPS = 12;
  private static final int LETTERS = 16;

  /** A stratum, or a bend (empty list) of a line, in a layer. */
  private static final class Node {
    private final List<Stratum> stratum;
    private final int layer;
    private final List<Node> up = new ArrayList<>();
    private final List<Node> down = new ArrayList<>();
    private double x;

    private Node(List<Stratum> stratum, int layer) {
      this.stratum = stratum;
      this.layer = layer;
    }

    private int width() {
      return stratum.isEmpty() ? BEND_WIDTH : BOX_WIDTH + GAP;
    }
  }

  private final List<List<Node>> layers = new ArrayList<>();
  private final List<Integer> codimensions;

  private ClosureDiagram(List<Stratum> strata, List<Covering> coverings) {
    TreeMap<Integer, List<Stratum>> byCodimension = new TreeMap<>();
    strata.forEach(
        s -> byCodimension.computeIfAbsent(s.codimension(), k -> new ArrayList<>()).add(s));
    codimensions = List.copyOf(byCodimension.keySet());
    Map<String, Node> nodes = new HashMap<>();
    for (List<Stratum> row : byCodimension.values()) {
      List<Node> layer = new ArrayList<>();
      for (Stratum s : row) {
        Node n = new Node(List.of(s), layers.size());
        nodes.put(s.name(), n);
        layer.add(n);
      }
      layers.add(layer);
    }
    coverings.forEach(c -> join(nodes.get(c.upper()), nodes.get(c.lower())));
    place();
    for (int k = 0; k < SWEEPS; k++) {
      sweep(k % 2 == 0);
    }
  }

  /** The picture as one {@code svg} element; strata that a covering names must exist. */
  static String of(List<Stratum> strata, List<Covering> coverings) {
    return new ClosureDiagram(strata, coverings).svg();
  }

  private void join(Node upper, Node lower) {
    Node at = upper;
    for (int k = upper.layer + 1; k < lower.layer; k++) {
      Node bend = new Node(List.of(), k);
      layers.get(k).add(bend);
      at.down.add(bend);
      bend.up.add(at);
      at = bend;
    }
    at.down.add(lower);
    lower.up.add(at);
  }

  private void sweep(boolean downwards) {
    for (int k = 0; k < layers.size(); k++) {
      List<Node> layer = layers.get(downwards ? k : layers.size() - 1 - k);
      Map<Node, Double> centre = new HashMap<>();
      layer.forEach(n -> centre.put(n, barycentre(n, downwards ? n.up : n.down)));
      layer.sort(Comparator.comparingDouble(centre::get));
      place();
    }
  }

  private static double barycentre(Node n, List<Node> neighbours) {
    return neighbours.stream().mapToDouble(m -> m.x).average().orElse(n.x);
  }

  private void place() {
    for (List<Node> layer : layers) {
      double left = -layer.stream().mapToInt(Node::width).sum() / 2.0;
      for (Node n : layer) {
        n.x = left + n.width() / 2.0;
        left += n.width();
      }
    }
  }

  private double middle() {
    return layers.stream()
            .mapToInt(layer -> layer.stream().mapToInt(Node::width).sum())
            .max()
            .orElse(0)
        / 2.0;
  }

  private static double top(Node n) {
    return MARGIN + (double) n.layer * LAYER_HEIGHT;
  }

  private String svg() {
    double origin = LABELS + MARGIN + middle();
    long width = Math.round(origin + middle() + MARGIN);
    long height = 2L * MARGIN + (layers.size() - 1L) * LAYER_HEIGHT + BOX_HEIGHT;
    StringBuilder out = new StringBuilder();
    out.append(
        String.format(
            Locale.ROOT,
            "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"closure\" role=\"img\""
                + " aria-labelledby=\"closure-title\" width=\"%d\" height=\"%d\" viewBox=\"0 0 %d"
                + " %d\">\n<title id=\"closure-title\">Strata by codimension; a line joins a"
                + " stratum to those directly in its closure</title>\n",
            width,
            height,
            width,
            height));
    for (int k = 0; k < layers.size(); k++) {
      out.append(layerLabel(k, width));
    }
    layers.forEach(
        layer -> layer.forEach(n -> n.down.forEach(m -> out.append(edge(n, m, origin)))));
    layers.forEach(
        layer -> layer.forEach(n -> n.stratum.forEach(s -> out.append(box(n, s, origin)))));
    return out.append("</svg>\n").toString();
  }

  private String layerLabel(int k, long width) {
    double y = MARGIN + (double) k * LAYER_HEIGHT + BOX_HEIGHT / 2.0;
    return String.format(
        Locale.ROOT,
        "<line class=\"level\" x1=\"0\" y1=\"%.1f\" x2=\"%d\" y2=\"%.1f\"></line>\n"
            + "<text class=\"level\" x=\"0\" y=\"%.1f\">codimension %d</text>\n",
        y,
        width,
        y,
        y - 6,
        codimensions.get(k));
  }

  /** From box to box; within the layer of a bend the line runs straight down between the boxes. */
  private static String edge(Node n, Node m, double origin) {
    double x1 = origin + n.x;
    double y1 = top(n) + BOX_HEIGHT;
    double x2 = origin + m.x;
    double y2 = top(m);
    double middle = (y1 + y2) / 2;
    String through =
        m.stratum.isEmpty() ? String.format(Locale.ROOT, "V%.1f", y2 + BOX_HEIGHT) : "";
    return String.format(
        Locale.ROOT,
        "<path class=\"edge\" d=\"M%.1f %.1fC%.1f %.1f %.1f %.1f %.1f %.1f%s\"></path>\n",
        x1,
        y1,
        x1,
        middle,
        x2,
        middle,
        x2,
        y2,
        through);
  }

  private static String box(Node n, Stratum s, double origin) {
    double x = origin + n.x;
    String type = s.type().map(TypeText::signs).orElse(s.kind());
    return String.format(
        Locale.ROOT,
        "<a href=\"#stratum-%s\"><title>%s</title><rect class=\"%s\" x=\"%.1f\" y=\"%.1f\""
            + " width=\"%d\" height=\"%d\" rx=\"7\"></rect><text class=\"name\" x=\"%.1f\""
            + " y=\"%.1f\">%s</text><text class=\"kind\" x=\"%.1f\" y=\"%.1f\">%s</text></a>\n",
        Markup.escape(s.name()),
        Markup.escape(s.name() + ": rank " + s.rank() + ", " + type),
        s.kernelDimension() == 0 ? "box full" : "box",
        x - BOX_WIDTH / 2.0,
        top(n),
        BOX_WIDTH,
        BOX_HEIGHT,
        x,
        top(n) + 19,
        Markup.escape(s.name() + " \u00b7 rank " + s.rank() + " of " + s.dimension()),
        x,
        top(n) + 36,
        Markup.escape(shortened(type)));
  }

  private static String shortened(String text) {
    int letters = text.codePointCount(0, text.length());
    return letters <= LETTERS
        ? text
        : text.substring(0, text.offsetByCodePoints(0, LETTERS - 1)) + "\u2026";
  }
}
