package rankfall.report;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The name of an algebra as it is set. Names travel as plain text, such as {@code so(3,1) |x R^4}
 * or {@code Bianchi VI_h, h = -a^2/b^2}: {@code |x} stands for a semidirect sum, {@code ^} and
 * {@code _} raise and lower what follows, a word or a group in braces.
 */
final class TypeText {
  private static final Pattern RAISED =
      Pattern.compile("([\\^_])(?:\\{([^{}]*)\\}|(-?[\\p{L}\\p{N}]+(?:,\\p{N}+)*))");

  private TypeText() {}

  /** Markup of a page. */
  static String html(String name) {
    return set(Markup.escape(name), "<sup>", "</sup>", "<sub>", "</sub>")
        .replace(" |x ", " \u22c9 ")
        .replace(" (+) ", " \u2295 ");
  }

  /** Plain text with the signs of the trade, for titles and pictures. */
  static String signs(String name) {
    return name.replace(" |x ", " \u22c9 ").replace(" (+) ", " \u2295 ");
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
