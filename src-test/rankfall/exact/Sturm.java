package rankfall.exact;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;

/** Counts real roots by Sturm's theorem (Sturm 1829), with rational coefficients, for tests. */
final class Sturm {
  private final List<List<BigFraction>> sequence = new ArrayList<>();

  Sturm(Polynomial p) {
    List<BigFraction> f = new ArrayList<>();
    for (Polynomial c : p.coefficientsIn(0)) {
      f.add(BigFraction.of(c.constantValue()));
    }
    List<BigFraction> g = new ArrayList<>();
    for (int k = 1; k < f.size(); k++) {
      g.add(f.get(k).multiply(k));
    }
    while (!f.isEmpty()) {
      sequence.add(f);
      List<BigFraction> r = g.isEmpty() ? List.of() : negativeRemainder(f, g);
      f = g;
      g = r;
    }
  }

  private static List<BigFraction> negativeRemainder(List<BigFraction> f, List<BigFraction> g) {
    List<BigFraction> r = new ArrayList<>(f);
    while (r.size() >= g.size()) {
      BigFraction q = r.get(r.size() - 1).divide(g.get(g.size() - 1));
      int shift = r.size() - g.size();
      for (int k = 0; k < g.size(); k++) {
        r.set(k + shift, r.get(k + shift).subtract(q.multiply(g.get(k))));
      }
      r.remove(r.size() - 1);
      while (!r.isEmpty() && r.get(r.size() - 1).signum() == 0) {
        r.remove(r.size() - 1);
      }
    }
    r.replaceAll(BigFraction::negate);
    return r;
  }

  /** The number of different roots above {@code a} and up to {@code b}; neither a multiple root. */
  int count(BigFraction a, BigFraction b) {
    return variations(a) - variations(b);
  }

  private int variations(BigFraction x) {
    int n = 0;
    int last = 0;
    for (List<BigFraction> f : sequence) {
      BigFraction v = BigFraction.ZERO;
      for (int k = f.size() - 1; k >= 0; k--) {
        v = v.multiply(x).add(f.get(k));
      }
      if (v.signum() != 0) {
        n += last != 0 && last != v.signum() ? 1 : 0;
        last = v.signum();
      }
    }
    return n;
  }
}
