package rankfall.report;

import io.pebbletemplates.pebble.extension.escaper.SafeString;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Collectors;
import rankfall.Analysis.Findings;
import rankfall.RegionMap.Kind;
import rankfall.RegionMap.Place;
import rankfall.ScanAxis;
import rankfall.ScanCount;
import rankfall.ScanCounts;
import rankfall.exact.Rationals;

/** What the page shows of the default grid, piece by piece. */
record ScanParts(Findings findings, ScanCounts scan, Formulas formulas) {
  private static final int MOST_VALUES = 6;

  /** The view. */
  ScanView view() {
    boolean drawn = !scan.points().isEmpty() && ScanPicture.varying(scan).size() == 2;
    boolean alone = drawn && findings.maps().isEmpty();
    List<String> fills = fills();
    List<String> names = scan.counts().stream().map(this::titled).toList();
    List<ScanView.RowView> rows = new ArrayList<>();
    for (int k = 0; k < fills.size(); k++) {
      List<SafeString> chips = drawn ? List.of(chip(fills.get(k))) : List.of();
      rows.add(row(scan.counts().get(k), chips));
    }
    return new ScanView(
        new SafeString(scan.axes().stream().map(this::axis).collect(Collectors.joining("; "))),
        alone ? List.of(new SafeString(Palette.patterns())) : List.of(),
        alone ? List.of(new SafeString(Palette.style())) : List.of(),
        drawn ? List.of(new SafeString(ScanPicture.of(scan, fills, names, formulas))) : List.of(),
        rows,
        number(scan.counts().stream().mapToLong(ScanCount::points).sum()));
  }

  private String axis(ScanAxis a) {
    String name = MathMl.inline(formulas.text(a.name()));
    int n = a.values().size();
    String first = Rationals.text(a.values().get(0));
    if (n == 1) {
      return name + " is " + MathMl.inline(formulas.text(first));
    }
    if (n <= MOST_VALUES) {
      return name
          + " is "
          + a.values().stream()
              .map(v -> MathMl.inline(formulas.text(Rationals.text(v))))
              .collect(Collectors.joining(", "));
    }
    String last = Rationals.text(a.values().get(n - 1));
    return name
        + " takes "
        + n
        + " values from "
        + MathMl.inline(formulas.text(first))
        + " to "
        + MathMl.inline(formulas.text(last));
  }

  /** A place of the maps keeps its fill; others get those that are left. */
  private List<String> fills() {
    MapKey key = new MapKey(findings);
    int next = key.fills();
    List<String> out = new ArrayList<>();
    for (ScanCount c : scan.counts()) {
      Place p = place(c);
      boolean known = key.isFilled(p) || p.kind() == Kind.OUTSIDE || c.status().equals("open");
      out.add(known ? key.fill(p) : Palette.fill(next++));
    }
    return out;
  }

  private static Place place(ScanCount c) {
    if (!c.stratum().isEmpty()) {
      return Place.in(
          c.stratum(), c.region().isEmpty() ? Optional.empty() : Optional.of(c.region()));
    }
    return Place.of(
        c.status().equals("outside") || c.status().equals("off") ? Kind.OUTSIDE : Kind.NOWHERE);
  }

  private ScanView.RowView row(ScanCount c, List<SafeString> chips) {
    return new ScanView.RowView(
        chips,
        name(c),
        c.stratum().isEmpty()
            ? ""
            : c.region().isEmpty()
                ? "stratum-" + c.stratum()
                : "region-" + c.stratum() + "-" + c.region(),
        text(c.dimension()),
        text(c.rank()),
        c.signature().map(Words::signature).orElse(""),
        new SafeString(TypeText.html(c.type())),
        number(c.points()));
  }

  private static SafeString chip(String fill) {
    return new SafeString(
        "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"map chip\" width=\"28\" height=\"16\""
            + " aria-hidden=\"true\"><rect class=\"area chip-edge "
            + fill
            + "\" x=\"1\" y=\"1\" width=\"26\" height=\"14\" rx=\"2\"></rect></svg>");
  }

  private static String name(ScanCount c) {
    return switch (c.status()) {
      case "ok" ->
          c.stratum().isEmpty()
              ? "not placed"
              : c.region().isEmpty()
                  ? c.stratum() + ", in no region"
                  : c.stratum() + " " + c.region();
      case "outside" -> "outside the conditions of the spec";
      case "off" -> "off a relation";
      case "pole" -> "an entry has a pole";
      default -> "no algebra";
    };
  }

  private String titled(ScanCount c) {
    return name(c)
        + c.signature().map(s -> ": signature " + Words.signature(s)).orElse("")
        + (c.type().isEmpty() ? "" : ", " + TypeText.signs(c.type()));
  }

  private static String text(OptionalInt n) {
    return n.isPresent() ? Integer.toString(n.getAsInt()) : "";
  }

  /** With spaces between thousands. */
  private static String number(long n) {
    return String.format(Locale.ROOT, "%,d", n).replace(',', '\u202f');
  }
}
