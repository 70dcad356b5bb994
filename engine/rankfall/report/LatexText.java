package rankfall.report;

import java.text.Normalizer;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * Plain text inside LaTeX, in any input encoding: the output is ASCII. Accented Latin letters are
 * written with accent commands, Greek letters as mathematics; what remains is named by its code
 * point, {@code [U+4E2D]}.
 */
final class LatexText {
  private static final Map<Integer, String> SPECIAL =
      Map.ofEntries(
          Map.entry((int) '\\', "\\textbackslash{}"),
          Map.entry((int) '{', "\\{"),
          Map.entry((int) '}', "\\}"),
          Map.entry((int) '$', "\\$"),
          Map.entry((int) '&', "\\&"),
          Map.entry((int) '#', "\\#"),
          Map.entry((int) '%', "\\%"),
          Map.entry((int) '_', "\\_"),
          Map.entry((int) '^', "\\textasciicircum{}"),
          Map.entry((int) '~', "\\textasciitilde{}"),
          Map.entry((int) '<', "\\ensuremath{<}"),
          Map.entry((int) '>', "\\ensuremath{>}"),
          Map.entry((int) '|', "\\ensuremath{|}"),
          Map.entry((int) '"', "{\\char34}"),
          Map.entry((int) '[', "{[}"),
          Map.entry((int) ']', "{]}"),
          Map.entry((int) '\t', " "),
          Map.entry((int) '\n', "\n"),
          Map.entry((int) '\r', ""));

  private static final Map<Integer, String> SIGNS =
      Map.ofEntries(
          Map.entry(0x00a0, "~"),
          Map.entry(0x00b7, "\\ensuremath{\\cdot}"),
          Map.entry(0x00d7, "\\ensuremath{\\times}"),
          Map.entry(0x00b1, "\\ensuremath{\\pm}"),
          Map.entry(0x00b2, "\\ensuremath{^{2}}"),
          Map.entry(0x00b3, "\\ensuremath{^{3}}"),
          Map.entry(0x00df, "\\ss{}"),
          Map.entry(0x00e6, "\\ae{}"),
          Map.entry(0x00c6, "\\AE{}"),
          Map.entry(0x00f8, "\\o{}"),
          Map.entry(0x00d8, "\\O{}"),
          Map.entry(0x0142, "\\l{}"),
          Map.entry(0x0141, "\\L{}"),
          Map.entry(0x0153, "\\oe{}"),
          Map.entry(0x0131, "\\i{}"),
          Map.entry(0x2013, "--"),
          Map.entry(0x2014, "---"),
          Map.entry(0x2018, "`"),
          Map.entry(0x2019, "'"),
          Map.entry(0x201c, "``"),
          Map.entry(0x201d, "''"),
          Map.entry(0x2026, "\\dots{}"),
          Map.entry(0x2192, "\\ensuremath{\\to}"),
          Map.entry(0x2212, "\\ensuremath{-}"),
          Map.entry(0x221a, "\\ensuremath{\\surd}"),
          Map.entry(0x2260, "\\ensuremath{\\neq}"),
          Map.entry(0x2264, "\\ensuremath{\\leq}"),
          Map.entry(0x2265, "\\ensuremath{\\geq}"),
          Map.entry(0x2295, "\\ensuremath{\\oplus}"),
          Map.entry(0x22ca, "\\ensuremath{\\rtimes}"));

  /** Accent commands by combining character. */
  private static final Map<Integer, String> ACCENTS =
      Map.ofEntries(
          Map.entry(0x0300, "\\`"),
          Map.entry(0x0301, "\\'"),
          Map.entry(0x0302, "\\^"),
          Map.entry(0x0303, "\\~"),
          Map.entry(0x0304, "\\="),
          Map.entry(0x0306, "\\u"),
          Map.entry(0x0307, "\\."),
          Map.entry(0x0308, "\\\""),
          Map.entry(0x030a, "\\r"),
          Map.entry(0x030b, "\\H"),
          Map.entry(0x030c, "\\v"),
          Map.entry(0x0327, "\\c"));

  private LatexText() {}

  /** The text with nothing in it that LaTeX would act on. */
  static String escape(String text) {
    StringBuilder out = new StringBuilder();
    text.codePoints().forEach(c -> out.append(one(c)));
    return out.toString();
  }

  private static String one(int c) {
    if (SPECIAL.containsKey(c)) {
      return SPECIAL.get(c);
    }
    if (c >= 0x20 && c < 0x7f) {
      return Character.toString(c);
    }
    if (SIGNS.containsKey(c)) {
      return SIGNS.get(c);
    }
    Optional<Formula.Letter> greek = GreekLetters.named(Character.toString(c));
    if (greek.isPresent()) {
      return "\\ensuremath{" + greek.get().latex() + "}";
    }
    return accented(c).orElseGet(() -> String.format(Locale.ROOT, "{[}U+%04X{]}", c));
  }

  private static Optional<String> accented(int c) {
    int[] parts =
        Normalizer.normalize(Character.toString(c), Normalizer.Form.NFD).codePoints().toArray();
    if (parts.length != 2 || parts[0] >= 0x7f || !ACCENTS.containsKey(parts[1])) {
      return Optional.empty();
    }
    return Optional.of(ACCENTS.get(parts[1]) + "{" + Character.toString(parts[0]) + "}");
  }
}
