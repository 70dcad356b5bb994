package rankfall.bench;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** Specs to measure. */
final class BenchSpecs {
  /** so(5), its generators mixed with one another by five parameters in a ring. */
  private static final String MIXED =
      """
      family: mixed-five
      parameters: [a, b, c, d, e]
      order: 5
      matrices:
        A1: "E(1,2) - E(2,1) + a*E(1,3) - a*E(3,1)"
        A2: "E(1,3) - E(3,1) + b*E(1,4) - b*E(4,1)"
        A3: "E(1,4) - E(4,1) + c*E(1,5) - c*E(5,1)"
        A4: "E(1,5) - E(5,1) + d*E(2,3) - d*E(3,2)"
        A5: "E(2,3) - E(3,2) + e*E(1,2) - e*E(2,1)"
        A6: "E(2,4) - E(4,2)"
        A7: "E(2,5) - E(5,2)"
        A8: "E(3,4) - E(4,3)"
        A9: "E(3,5) - E(5,3)"
        A10: "E(4,5) - E(5,4)"
      """;

  private BenchSpecs() {}

  /** A family by its name: {@code mixed-five}, or one that ships alone in a file of its name. */
  static Spec named(String name) {
    try {
      byte[] text =
          name.equals("mixed-five")
              ? MIXED.getBytes(StandardCharsets.UTF_8)
              : Files.readAllBytes(Path.of("specs", name + ".yaml"));
      return SpecReader.read(name, text).get(0).orThrow();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }
}
