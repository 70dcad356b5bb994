package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/**
 * Colours as people without one kind of cone see them: Machado, Oliveira and Fernandes, A
 * Physiologically-based Model for Simulation of Color Vision Deficiency (2009), matrices of
 * severity 1 on linear RGB, from memory. Differences are those of CIE L*a*b* (1976); 2.3 is just
 * noticeable (Mahy, Van Eycken, Oosterlinck 1994, from memory).
 */
class PaletteTest {
  private static final double[][][] EYES = {
    {{1, 0, 0}, {0, 1, 0}, {0, 0, 1}},
    {
      {0.152286, 1.052583, -0.204868},
      {0.114503, 0.786281, 0.099216},
      {-0.003882, -0.048116, 1.051998}
    },
    {
      {0.367322, 0.860646, -0.227968},
      {0.280085, 0.672501, 0.047413},
      {-0.011820, 0.042940, 0.968881}
    },
    {
      {1.255528, -0.076749, -0.178779},
      {-0.078411, 0.930809, 0.147602},
      {0.004733, 0.691367, 0.303900}
    }
  };

  private static final double LEAST_DIFFERENCE = 15;

  private static double[] linear(String colour) {
    double[] out = new double[3];
    for (int k = 0; k < 3; k++) {
      double c = Integer.parseInt(colour.substring(1 + 2 * k, 3 + 2 * k), 16) / 255.0;
      out[k] = c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }
    return out;
  }

  private static double[] times(double[][] m, double[] v) {
    double[] out = new double[3];
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        out[i] += m[i][j] * v[j];
      }
      out[i] = Math.max(0, Math.min(1, out[i]));
    }
    return out;
  }

  /** sRGB to L*a*b* under D65 (IEC 61966-2-1, CIE 15). */
  private static double[] lab(double[] c) {
    double x = f((0.4124564 * c[0] + 0.3575761 * c[1] + 0.1804375 * c[2]) / 0.95047);
    double y = f(0.2126729 * c[0] + 0.7151522 * c[1] + 0.0721750 * c[2]);
    double z = f((0.0193339 * c[0] + 0.1191920 * c[1] + 0.9503041 * c[2]) / 1.08883);
    return new double[] {116 * y - 16, 500 * (x - y), 200 * (y - z)};
  }

  private static double f(double t) {
    return t > 0.008856 ? Math.cbrt(t) : 7.787 * t + 16.0 / 116;
  }

  private static double difference(double[][] eye, String a, String b) {
    double[] p = lab(times(eye, linear(a)));
    double[] q = lab(times(eye, linear(b)));
    return Math.sqrt(
        Math.pow(p[0] - q[0], 2) + Math.pow(p[1] - q[1], 2) + Math.pow(p[2] - q[2], 2));
  }

  @Test
  void everyEyeTellsAllColoursApart() {
    List<String> colours = new ArrayList<>(Palette.COLOURS);
    colours.add("#FFFFFF");
    for (double[][] eye : EYES) {
      for (int i = 0; i < colours.size(); i++) {
        for (int j = 0; j < i; j++) {
          double d = difference(eye, colours.get(i), colours.get(j));
          assertTrue(d > LEAST_DIFFERENCE, colours.get(i) + " and " + colours.get(j) + ": " + d);
        }
      }
    }
  }

  /** Red and green of one lightness are what a deuteranope confuses. */
  @Test
  void colourBlindEyeConfusesRedAndGreen() {
    assertTrue(difference(EYES[0], "#C86400", "#829600") > 2 * LEAST_DIFFERENCE);
    assertTrue(difference(EYES[2], "#C86400", "#829600") < LEAST_DIFFERENCE);
  }

  @Test
  void everyFillHasAPatternOfItsOwnOnPaper() {
    String patterns = Palette.patterns();
    Set<String> seen = new HashSet<>();
    Matcher m = Pattern.compile("id=\"tile-(\\d+)\"[^>]*>(.*?)</pattern>").matcher(patterns);
    while (m.find()) {
      assertTrue(seen.add(m.group(2)), m.group(1));
      assertTrue(Palette.style().contains("url(#tile-" + m.group(1) + ")"));
    }
    assertEquals(Palette.size(), seen.size());
    assertNotEquals(Palette.fill(0), Palette.fill(Palette.size() - 1));
  }
}
