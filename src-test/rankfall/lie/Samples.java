package rankfall.lie;

import java.util.ArrayList;
import java.util.List;

/** Well-known algebras; brackets from memory of the textbooks. */
final class Samples {
  private Samples() {}

  static Brackets abelian(int n) {
    return Brackets.of(n, "");
  }

  static Brackets so3() {
    return Brackets.of(3, "1 2 3, 2 3 1, 3 1 2");
  }

  /** h, e, f. */
  static Brackets sl2() {
    return Brackets.of(3, "1 2 2 2, 1 3 3 -2, 2 3 1");
  }

  static Brackets heisenberg() {
    return Brackets.of(3, "1 2 3");
  }

  /** n, q, p, z: [n,q] = p, [n,p] = -q, [q,p] = z. */
  static Brackets oscillator() {
    return Brackets.of(4, "1 2 3, 1 3 2 -1, 2 3 4");
  }

  /** Real matrices of given order, all of them. */
  static Brackets gl(int d) {
    List<long[][]> out = new ArrayList<>();
    for (int r = 0; r < d; r++) {
      for (int c = 0; c < d; c++) {
        out.add(elementary(d, r, c));
      }
    }
    return Brackets.ofMatrices(out);
  }

  static Brackets sl(int d) {
    List<long[][]> out = new ArrayList<>();
    for (int r = 0; r < d; r++) {
      for (int c = 0; c < d; c++) {
        long[][] m = elementary(d, r, c);
        if (r == c) {
          if (r == d - 1) {
            continue;
          }
          m[r + 1][r + 1] = -1;
        }
        out.add(m);
      }
    }
    return Brackets.ofMatrices(out);
  }

  /** Upper triangular matrices. */
  static Brackets upper(int d, boolean withDiagonal) {
    List<long[][]> out = new ArrayList<>();
    for (int r = 0; r < d; r++) {
      for (int c = withDiagonal ? r : r + 1; c < d; c++) {
        out.add(elementary(d, r, c));
      }
    }
    return Brackets.ofMatrices(out);
  }

  /** Rotations that keep a diagonal form, with or without translations. */
  static Brackets rotations(long[] metric, boolean translations) {
    int d = metric.length;
    List<long[][]> out = new ArrayList<>();
    for (int r = 0; r < d; r++) {
      for (int c = r + 1; c < d; c++) {
        long[][] m = new long[d + 1][d + 1];
        m[r][c] = metric[c];
        m[c][r] = -metric[r];
        out.add(m);
      }
    }
    for (int r = 0; translations && r < d; r++) {
      out.add(elementary(d + 1, r, d));
    }
    return Brackets.ofMatrices(out);
  }

  /** Rotations, boosts, translations and time shift of the Galilei group in d + 1 dimensions. */
  static Brackets galilei(int d) {
    List<long[][]> out = new ArrayList<>();
    for (int r = 0; r < d; r++) {
      for (int c = r + 1; c < d; c++) {
        long[][] m = new long[d + 2][d + 2];
        m[r][c] = 1;
        m[c][r] = -1;
        out.add(m);
      }
      out.add(elementary(d + 2, r, d));
      out.add(elementary(d + 2, r, d + 1));
    }
    out.add(elementary(d + 2, d, d + 1));
    return Brackets.ofMatrices(out);
  }

  /**
   * Class A in the form of Ellis and MacCallum 1969 with n = diag(0, n2, n3) and vector a along 1:
   * [e1,e2] = a e2 + n3 e3, [e3,e1] = n2 e2 - a e3, [e2,e3] = 0.
   */
  static Brackets bianchi(long a, long n2, long n3) {
    return Brackets.of(3, ("1 2 2 " + a + ", 1 2 3 " + n3) + (", 3 1 2 " + n2 + ", 3 1 3 " + -a));
  }

  static long[][] elementary(int d, int r, int c) {
    long[][] m = new long[d][d];
    m[r][c] = 1;
    return m;
  }

  /** One of every kind: semisimple, solvable, nilpotent, mixed, small. */
  static List<Brackets> varied() {
    return List.of(
        abelian(0),
        abelian(1),
        abelian(4),
        so3(),
        sl2(),
        heisenberg(),
        oscillator(),
        gl(2),
        sl(3),
        upper(3, true),
        upper(4, false),
        bianchi(1, 1, -1),
        bianchi(1, 1, 1),
        bianchi(0, 1, 1),
        bianchi(0, 1, -1),
        bianchi(1, 0, 0),
        bianchi(1, 0, 1),
        rotations(new long[] {1, 1, 1}, true),
        rotations(new long[] {1, 1, -1}, true),
        rotations(new long[] {1, 1, 1, 1}, false),
        rotations(new long[] {1, 1, 1, -1}, true),
        galilei(2),
        galilei(3),
        so3().plus(heisenberg()),
        sl2().plus(bianchi(1, 1, 1)),
        oscillator().plus(abelian(2)));
  }
}
