package rankfall.report;

import io.pebbletemplates.pebble.PebbleEngine;
import io.pebbletemplates.pebble.loader.ClasspathLoader;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Locale;
import java.util.Map;
import rankfall.Analysis;

/**
 * One self-contained page that is valid both as HTML and as XML. The template is the resource
 * {@code report.peb}; every text is escaped by it, formulas and pictures come as finished markup.
 */
final class HtmlPage {
  private HtmlPage() {}

  /** {@code report.html}. */
  static String of(Analysis analysis) {
    PebbleEngine engine =
        new PebbleEngine.Builder()
            .loader(new ClasspathLoader(HtmlPage.class.getClassLoader()))
            .defaultLocale(Locale.ROOT)
            .strictVariables(true)
            .autoEscaping(true)
            .build();
    StringWriter out = new StringWriter();
    try {
      engine
          .getTemplate("rankfall/report/report.peb")
          .evaluate(out, Map.of("page", PageView.of(analysis)), Locale.ROOT);
    } catch (IOException e) {
      throw new UncheckedIOException("a string cannot be written", e);
    }
    return out.toString();
  }
}
