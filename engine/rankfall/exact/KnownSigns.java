package rankfall.exact;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import rankfall.exact.RealZeros.Condition;
import rankfall.exact.RealZeros.Relation;

/**
 * What conditions on single variables tell of the signs of polynomials.
 *
 * @param signs by variable: 1 or -1 where the sign is known, 0 where the variable is not 0
 */
record KnownSigns(Map<Integer, Integer> signs) {
  KnownSigns {
    signs = Map.copyOf(signs);
  }

  /** From those conditions that compare a multiple of a variable with 0. */
  static KnownSigns of(List<Condition> conditions) {
    Map<Integer, Integer> out = new HashMap<>();
    for (Condition c : conditions) {
      Polynomial p = c.polynomial();
      if (p.termCount() == 1 && p.totalDegree() == 1) {
        int v = p.support().get(0);
        if (c.relation() == Relation.POSITIVE) {
          out.put(v, p.leadingCoefficient().signum());
        } else if (c.relation() == Relation.NON_ZERO) {
          out.putIfAbsent(v, 0);
        }
      }
    }
    return new KnownSigns(out);
  }

  /** A sign that no term opposes: 1 if all are 0 or more everywhere, -1 if 0 or less. */
  Optional<Integer> sign(Polynomial f) {
    int sign = 0;
    for (Term t : f.terms()) {
      int s = sign(t);
      if (s == 0 || (sign != 0 && s != sign)) {
        return Optional.empty();
      }
      sign = s;
    }
    return sign == 0 ? Optional.empty() : Optional.of(sign);
  }

  private int sign(Term t) {
    int s = t.coefficient().signum();
    for (int v = 0; v < t.exponents().size(); v++) {
      if (t.exponents().get(v) % 2 == 1) {
        s *= signs.getOrDefault(v, 0);
      }
    }
    return s;
  }

  /** Whether the terms have one sign and one of them vanishes nowhere. */
  boolean isNowhereZero(Polynomial f) {
    return sign(f).isPresent() && f.terms().stream().anyMatch(this::isNowhereZero);
  }

  private boolean isNowhereZero(Term t) {
    for (int v = 0; v < t.exponents().size(); v++) {
      if (t.exponents().get(v) > 0 && !signs.containsKey(v)) {
        return false;
      }
    }
    return true;
  }
}
