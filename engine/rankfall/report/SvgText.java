package rankfall.report;

import java.util.stream.Collectors;

/** A name as text of a picture: letters in italics, subscripts below the line. */
final class SvgText {
  private SvgText() {}

  /** Finished markup to stand inside a {@code text} element. */
  static String of(Formula f) {
    if (f instanceof Formula.Letter l) {
      return "<tspan font-style=\"italic\">" + Markup.escape(l.text()) + "</tspan>";
    }
    if (f instanceof Formula.Subscript s) {
      String below = s.below().stream().map(SvgText::of).collect(Collectors.joining(","));
      return of(s.base()) + "<tspan dy=\"3.5\" font-size=\"75%\">" + below + "</tspan>";
    }
    if (f instanceof Formula.Word w) {
      return Markup.escape(w.text());
    }
    if (f instanceof Formula.Number n) {
      return Markup.escape(n.digits());
    }
    if (f instanceof Formula.Function g) {
      return Markup.escape(g.name()) + "(" + of(g.argument()) + ")";
    }
    throw new IllegalArgumentException("not a name: " + f);
  }
}
