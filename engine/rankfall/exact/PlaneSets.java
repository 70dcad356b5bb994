package rankfall.exact;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Closed sets of a plane, taken apart into irreducible curves and finitely many points.
 *
 * @param curves irreducible over the constants, different, none constant; some are vertical lines
 * @param finite sets of finitely many points, each by polynomials without a common factor
 * @param abscissae polynomials in the first coordinate; each point of a finite set lies above one
 *     of their zeros
 */
record PlaneSets(
    List<Polynomial> curves, List<List<Polynomial>> finite, List<Polynomial> abscissae) {
  /** Copies the lists. */
  PlaneSets {
    curves = List.copyOf(curves);
    finite = List.copyOf(finite);
    abscissae = List.copyOf(abscissae);
  }

  /**
   * Takes sets apart.
   *
   * @param constants the numbers that may occur
   * @param y position of the second coordinate
   * @param sets each the common zeros of some polynomials in the two coordinates
   */
  static PlaneSets of(Chain constants, int y, List<List<Polynomial>> sets) {
    Map<Polynomial, Set<Polynomial>> known = new LinkedHashMap<>();
    Set<Polynomial> curves = new LinkedHashSet<>();
    Set<List<Polynomial>> finite = new LinkedHashSet<>();
    Set<Polynomial> abscissae = new LinkedHashSet<>();
    for (List<Polynomial> set : sets) {
      List<Set<Polynomial>> factors = new ArrayList<>();
      for (Polynomial p : set) {
        Polynomial q = constants.reduced(p);
        if (!q.isZero()) {
          factors.add(known.computeIfAbsent(q, r -> factors(constants, r)));
        }
      }
      if (!factors.isEmpty()) {
        Set<Polynomial> common = new LinkedHashSet<>(factors.get(0));
        factors.forEach(common::retainAll);
        curves.addAll(common);
        List<Set<Polynomial>> rest = factors.stream().map(f -> without(f, common)).toList();
        if (rest.stream().noneMatch(Set::isEmpty)) {
          List<Polynomial> products = rest.stream().map(f -> product(constants, f)).toList();
          List<Polynomial> below =
              rest.get(0).stream().map(h -> below(constants, h, rest, products, y)).toList();
          if (below.stream().anyMatch(p -> !p.isConstant())) {
            finite.add(products);
            abscissae.addAll(below);
          }
        }
      }
    }
    return new PlaneSets(List.copyOf(curves), List.copyOf(finite), List.copyOf(abscissae));
  }

  private static Set<Polynomial> factors(Chain constants, Polynomial p) {
    return new LinkedHashSet<>(ChainFactoring.irreducible(constants, p));
  }

  private static Set<Polynomial> without(Set<Polynomial> some, Set<Polynomial> others) {
    Set<Polynomial> out = new LinkedHashSet<>(some);
    out.removeAll(others);
    return out;
  }

  private static Polynomial product(Chain constants, Set<Polynomial> factors) {
    return constants.reduced(factors.stream().reduce(constants.one(), Polynomial::times));
  }

  /**
   * A polynomial without y that vanishes below the common zeros of h and the products: the common
   * divisor of resultants, of one only where numbers may hide a common divisor.
   */
  private static Polynomial below(
      Chain constants,
      Polynomial h,
      List<Set<Polynomial>> factors,
      List<Polynomial> products,
      int y) {
    Polynomial out = constants.zero();
    for (int k = 1;
        k < products.size() && (out.isZero() || constants.rules().isEmpty() && !out.isOne());
        k++) {
      if (!factors.get(k).contains(h)) {
        Polynomial p = products.get(k);
        out =
            out.gcd(!h.contains(y) ? h : !p.contains(y) ? p : constants.reduced(h.resultant(p, y)));
      }
    }
    return out;
  }
}
