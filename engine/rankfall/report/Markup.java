package rankfall.report;

/** Text inside XML and HTML. */
final class Markup {
  private Markup() {}

  /** The text with the five special characters escaped; what XML 1.0 cannot hold becomes U+FFFD. */
  static String escape(String text) {
    StringBuilder out = new StringBuilder(text.length());
    text.codePoints()
        .forEach(
            c -> {
              switch (c) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> out.appendCodePoint(isAllowed(c) ? c : 0xfffd);
              }
            });
    return out.toString();
  }

  /** Whether XML 1.0 can hold the character; private use is refused, as it marks places here. */
  private static boolean isAllowed(int c) {
    return c == '\t'
        || c == '\n'
        || c == '\r'
        || (c >= 0x20 && c < 0xd800)
        || (c > 0xf8ff && c < 0xfffe)
        || c >= 0x10000;
  }
}
