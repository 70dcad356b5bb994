package rankfall.spec;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The JSON Schema of the spec format, for editors that check while typing. */
public final class SpecSchema {
  private SpecSchema() {}

  /**
   * The schema (JSON Schema, draft 2020-12). It knows keys and shapes; what stands inside
   * expressions is checked by {@link SpecReader} only.
   *
   * @return the text of the schema, ending with a line feed
   */
  public static String text() {
    try (InputStream in = SpecSchema.class.getResourceAsStream("spec-schema.json")) {
      if (in == null) {
        throw new IllegalStateException("spec-schema.json is not beside its class");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
