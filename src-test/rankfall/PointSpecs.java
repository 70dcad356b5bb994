package rankfall;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.ExactNumber;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;
import rankfall.spec.SpecResult;

/** Small families to be asked at points. */
public final class PointSpecs {
  /** Rotations of a metric: the Killing form is diag(-2b, -2a, -2ab). */
  public static final String ROTOR =
      """
      family: stretched-rotor
      parameters: [a, b]
      brackets: |
        [X, Y] = Z
        [Y, Z] = a*X
        [Z, X] = b*Y
      """;

  /** The same over the complex numbers. */
  public static final String COMPLEX_ROTOR = ROTOR + "ground: complex\n";

  /** The form pairs H with itself to 4 and E with F to 2*sqrt(2)*(p - sqrt(2)). */
  public static final String ROOT =
      """
      family: root-scale
      parameters: [p]
      brackets: |
        [H, E] = sqrt(2)*E
        [H, F] = -sqrt(2)*F
        [E, F] = (p - sqrt(2))*H
      """;

  /** A rotation by an angle, and two translations. */
  public static final String ANGLE =
      """
      family: turned-plane
      parameters: [t]
      brackets: |
        [R, X] = cos(t)*Y
        [R, Y] = -sin(t)*X
      """;

  /** Closed where c = 0; a pole at d = 0, and d below 5. */
  public static final String OPEN =
      """
      family: half-open
      parameters: [c, d]
      where: ["d < 5"]
      matrices:
        X: [[0, 1/d], [0, 0]]
        Y: [[c, 0], [0, 1]]
        Z: [[0, 0], [c, 0]]
      """;

  private PointSpecs() {}

  /** Prepares a family. */
  public static Points points(String spec) throws SpecException {
    SpecResult read =
        SpecReader.read("s.yaml", spec.getBytes(StandardCharsets.UTF_8)).stream()
            .findFirst()
            .orElseThrow();
    return Points.of(((SpecResult.Read) read).spec());
  }

  /** A point as {@code a=1 b=-3/2}; may be empty. */
  public static Map<String, BigFraction> point(String text) {
    Map<String, BigFraction> out = new LinkedHashMap<>();
    for (String part : text.isEmpty() ? List.<String>of() : List.of(text.split(" "))) {
      int sign = part.indexOf('=');
      out.put(part.substring(0, sign), ExactNumber.of(part.substring(sign + 1)).orElseThrow());
    }
    return out;
  }
}
