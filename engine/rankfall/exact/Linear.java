package rankfall.exact;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * An equation {@code a*v + b = 0}, solved for v where a does not vanish.
 *
 * @param equation irreducible
 * @param variable the position of v
 * @param a free of v
 * @param b free of v
 */
record Linear(Polynomial equation, int variable, Polynomial a, Polynomial b) {
  /** The one that is cheapest to solve: constant coefficient first, then few terms. */
  static Optional<Linear> simplest(List<Polynomial> equations) {
    List<Linear> all = new ArrayList<>();
    for (Polynomial f : equations) {
      for (int v : f.support()) {
        if (f.degree(v) == 1) {
          all.add(new Linear(f, v, f.coefficient(v, 1), f.coefficient(v, 0)));
        }
      }
    }
    return all.stream()
        .min(
            Comparator.comparingInt((Linear l) -> l.a().isConstant() ? 0 : 1)
                .thenComparingInt(l -> l.equation().termCount())
                .thenComparingInt(l -> l.a().termCount()));
  }

  /** A polynomial with -b/a in place of v, times a power of a. */
  Polynomial into(Polynomial f) {
    return into(f, 0);
  }

  /** A polynomial with -b/a in place of v, times an even power of a. */
  Polynomial keepingSign(Polynomial f) {
    return into(f, f.degree(variable) % 2);
  }

  private Polynomial into(Polynomial f, int extra) {
    int d = f.degree(variable);
    Polynomial sum = Polynomial.zero(f.variables());
    Polynomial minus = b.negate();
    for (int k = 0; k <= d; k++) {
      sum = sum.plus(f.coefficient(variable, k).times(minus.pow(k)).times(a.pow(d - k + extra)));
    }
    return sum;
  }
}
