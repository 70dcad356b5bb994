package rankfall;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import rankfall.Analysis.Findings;
import rankfall.Forms.InvariantForms;
import rankfall.Forms.Roots;
import rankfall.Forms.TorusForm;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** Families whose forms are asked. */
final class FormSpecs {
  private FormSpecs() {}

  static Analysis analysis(String yaml) throws SpecException {
    return Engine.analyse(
        SpecReader.read("test.yaml", yaml.getBytes(StandardCharsets.UTF_8)).get(0).orThrow(),
        new Budget(Duration.ofMinutes(5), 100_000));
  }

  static Findings findings(String yaml) throws SpecException {
    return analysis(yaml).findings().orElseThrow();
  }

  static TorusForm torus(String yaml) throws SpecException {
    return findings(yaml).components().get(0).torus().orElseThrow();
  }

  static Roots roots(String yaml) throws SpecException {
    return (Roots) torus(yaml).roots();
  }

  static InvariantForms forms(Findings f, int stratum) {
    return f.strata().get(stratum).invariantForms().orElseThrow();
  }

  /** Traceless matrices of order n; the torus H1, H2, ... holds E(k,k) - E(k+1,k+1). */
  static String sl(int n) {
    StringBuilder out = new StringBuilder("family: sl\norder: " + n + "\nmatrices:\n");
    List<String> torus = new ArrayList<>();
    for (int k = 1; k < n; k++) {
      out.append("  H" + k + ": \"E(" + k + "," + k + ") - E(" + (k + 1) + "," + (k + 1) + ")\"\n");
      torus.add("H" + k);
    }
    for (int r = 1; r <= n; r++) {
      for (int c = 1; c <= n; c++) {
        if (r != c) {
          out.append("  X" + r + c + ": \"E(" + r + "," + c + ")\"\n");
        }
      }
    }
    return out + "torus: [" + String.join(", ", torus) + "]\n";
  }

  /** Skew matrices of order 5 with the rotations of two planes as torus. */
  static String so5() {
    StringBuilder out = new StringBuilder("family: so5\norder: 5\nmatrices:\n");
    for (int r = 1; r <= 5; r++) {
      for (int c = r + 1; c <= 5; c++) {
        out.append("  L" + r + c + ": \"E(" + r + "," + c + ") - E(" + c + "," + r + ")\"\n");
      }
    }
    return out + "torus: [L12, L34]\n";
  }

  /** Derivations of the octonions (Helgason 1978, ch. X, table V). */
  static String g2() {
    return """
        family: g2
        order: 7
        matrices:
          D1: "-E(2,5) + E(3,4) - E(4,3) + E(5,2)"
          D2: "-E(2,4) - E(3,5) + E(4,2) + E(5,3)"
          D3: "E(2,3) - E(3,2) - E(4,5) + E(5,4)"
          D4: "-E(1,6) - E(3,4) + E(4,3) + E(6,1)"
          D5: "E(1,5) - E(2,6) - E(5,1) + E(6,2)"
          D6: "E(1,4) - E(3,6) - E(4,1) + E(6,3)"
          D7: "-E(1,3) + E(3,1) - E(4,6) + E(6,4)"
          D8: "-E(1,2) + E(2,1) - E(5,6) + E(6,5)"
          D9: "-E(1,7) + E(2,4) - E(4,2) + E(7,1)"
          D10: "-E(1,4) - E(2,7) + E(4,1) + E(7,2)"
          D11: "E(1,5) - E(3,7) - E(5,1) + E(7,3)"
          D12: "E(1,2) - E(2,1) - E(4,7) + E(7,4)"
          D13: "-E(1,3) + E(3,1) - E(5,7) + E(7,5)"
          D14: "-E(2,3) + E(3,2) - E(6,7) + E(7,6)"
        torus: [D1, D4]
        """;
  }
}
