package rankfall;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/** The version of the program, as the build file states it. */
public final class Version {
  private static final String RESOURCE = "version.properties";

  private Version() {}

  /**
   * The version, which also stands in every machine-readable report.
   *
   * @return text such as {@code 0.1.0}
   */
  public static String text() {
    try (InputStream in = Version.class.getResourceAsStream(RESOURCE)) {
      if (in == null) {
        throw new IllegalStateException("the program was packed without " + RESOURCE);
      }
      Properties properties = new Properties();
      properties.load(in);
      return properties.getProperty("version");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
