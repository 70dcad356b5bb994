package rankfall.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Determinants by minors and by elimination. */
class DeterminantTest {
  private static final Variables XYZ = new Variables(List.of("x", "y", "z"));

  private static Polynomial variable(int k) {
    return Polynomial.variable(XYZ, k);
  }

  /** Vandermonde: (y - x)(z - x)(z - y); common practice, no source. */
  @Test
  void vandermonde() {
    List<List<Polynomial>> m = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      m.add(List.of(Polynomial.one(XYZ), variable(i), variable(i).pow(2)));
    }
    Polynomial due =
        variable(1)
            .minus(variable(0))
            .times(variable(2).minus(variable(0)))
            .times(variable(2).minus(variable(1)));
    assertEquals(due, Determinant.byMinors(XYZ, m));
    assertEquals(due, Determinant.byElimination(XYZ, m));
  }

  /** Two roads: the expansion against the elimination, with zeros and rows that depend. */
  @Test
  void minorsAgreeWithElimination() {
    Random random = new Random(31);
    for (int n = 0; n < 7; n++) {
      for (int tries = 0; tries < 8; tries++) {
        List<List<Polynomial>> m = new ArrayList<>();
        for (int i = 0; i < n; i++) {
          List<Polynomial> row = new ArrayList<>();
          for (int j = 0; j < n; j++) {
            row.add(entry(random));
          }
          m.add(row);
        }
        if (tries == 7 && n > 1) {
          m.set(0, m.get(n - 1));
        }
        assertEquals(Determinant.byElimination(XYZ, m), Determinant.byMinors(XYZ, m));
      }
    }
  }

  private static Polynomial entry(Random random) {
    return random.nextInt(3) == 0
        ? Polynomial.zero(XYZ)
        : variable(random.nextInt(3))
            .times(BigInteger.valueOf(random.nextInt(7) - 3))
            .plus(Polynomial.constant(XYZ, BigInteger.valueOf(random.nextInt(5) - 2)));
  }
}
