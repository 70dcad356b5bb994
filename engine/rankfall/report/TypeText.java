package rankfall.report;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * The name of an algebra as it is set. Names travel as plain text, such as {@code so(3,1) |x R^4}
 * or {@code Bianchi VI_h, h = -a^2/b^2}: {@code |x} stands for a semidirect sum, {@code ^} and
 * {@code _} raise and lower what follows, a word or a group in braces.
 */
final class TypeText {
  private static final Pattern RAISED =
      Pattern.compile("([\\^_])(?:\\{([^{}]*)\\}|(-?[\\p{L}\\p{N}]+(?:,\\p{N}+)*))");

  private static final String PLAIN = "0123456789-,h";
  private static final String SUPERSCRIPTS =
      "\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079\u207b,\u02b0";
  private static final String SUBSCRIPTS =
      "\u2080\u2081\u2082\u2083\u2084\u2085\u2086\u2087\u2088\u2089\u208b,\u2095";

  private TypeText() {}

  /** Markup of a page. */
  static String html(String name) {
    return set(Markup.escape(name), "<sup>", "</sup>", "<sub>", "</sub>")
        .replace(" |x ", " \u22c9 ")
        .replace(" (+) ", " \u2295 ");
  }

  /**
   * Plain text with the signs of the trade, for titles and pictures: what Unicode can raise or
   * lower is, the rest stays as it is.
   */
  static String signs(String name) {
    Matcher m = RAISED.matcher(name.replace(" |x ", " \u22c9 ").replace(" (+) ", " \u2295 "));
    StringBuilder out = new StringBuilder();
    while (m.find()) {
      String inner = m.group(2) != null ? m.group(2) : m.group(3);
      String signs = m.group(1).equals("^") ? SUPERSCRIPTS : SUBSCRIPTS;
      boolean known = inner.chars().allMatch(c -> PLAIN.indexOf(c) >= 0);
      m.appendReplacement(
          out,
          Matcher.quoteReplacement(
              known
                  ? inner
                      .chars()
                      .mapToObj(c -> signs.substring(PLAIN.indexOf(c), PLAIN.indexOf(c) + 1))
                      .collect(Collectors.joining())
                  : m.group()));
    }
    return m.appendTail(out).toString();
  }

  /** LaTeX for running text; it needs no further package. */
  static String latex(String name) {
    Matcher m = RAISED.matcher(name);
    StringBuilder out = new StringBuilder();
    int from = 0;
    while (m.find()) {
      out.append(words(name.substring(from, m.start())));
      String inner = m.group(2) != null ? m.group(2) : m.group(3);
      out.append("\\ensuremath{").append(m.group(1)).append("{\\text{");
      out.append(LatexText.escape(inner)).append("}}}");
      from = m.end();
    }
    return out.append(words(name.substring(from))).toString();
  }

  private static String words(String text) {
    return LatexText.escape(text.replace(" |x ", "\ue000").replace(" (+) ", " \u2295 "))
        .replace("{[}U+E000{]}", " \\ensuremath{\\mathbin{|\\mkern-5.5mu\\times}} ");
  }

  private static String set(String text, String up, String upEnd, String low, String lowEnd) {
    Matcher m = RAISED.matcher(text);
    StringBuilder out = new StringBuilder();
    while (m.find()) {
      String inner = m.group(2) != null ? m.group(2) : m.group(3);
      boolean raised = m.group(1).equals("^");
      m.appendReplacement(
          out, Matcher.quoteReplacement((raised ? up : low) + inner + (raised ? upEnd : lowEnd)));
    }
    return m.appendTail(out).toString();
  }
}
