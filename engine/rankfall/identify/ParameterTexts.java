package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Factoring;
import rankfall.exact.Factorization;
import rankfall.exact.NumberFieldTower;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;

/**
 * The continuous parameters of classes as expressions on a set: the number h of a Bianchi type, and
 * for the classes of dimension 4 the eigenvalues that the parameters are ratios of, since the
 * normal range of the parameters depends on their sizes.
 *
 * @param chain the set
 * @param constants the chain of the algebraic numbers
 */
record ParameterTexts(Chain chain, Chain constants) {
  private static final String RATIO = "eigenvalues in the ratio ";

  /**
   * How the names end, by the text before the first comma.
   *
   * @return empty for classes without parameters, and where they are constant on the set
   */
  SortedMap<String, String> of(SmallAlgebra<Polynomial> g) {
    List<Polynomial> d = g.data();
    return switch (g.shape()) {
      case PLANE -> plane(d.get(0), d.get(1));
      case SYMPLECTIC -> eigenvalues(d, List.of("A_{4,9}", "A_{4,11}"));
      case SPACE -> eigenvalues(d, List.of("A_{4,5}", "A_{4,6}"));
      case SPACE_DOUBLE -> eigenvalues(d, List.of("A_{4,5}"));
      case SPACE_DOUBLE_BLOCK -> eigenvalues(d, List.of("A_{4,2}"));
      default -> new TreeMap<>();
    };
  }

  private RationalFunction value(Polynomial above, Polynomial below) {
    return ChainFractions.canonical(chain, above, below);
  }

  private boolean isNumber(Polynomial p) {
    return constants.rules().stream().map(Chain.Rule::variable).toList().containsAll(p.support());
  }

  /** The number h, which the matrix on the plane has in every basis. */
  private SortedMap<String, String> plane(Polynomial t, Polynomial d) {
    Polynomial discriminant = t.pow(2).minus(d.times(BigInteger.valueOf(4)));
    RationalFunction h = value(t.pow(2).negate(), discriminant);
    SortedMap<String, String> out = new TreeMap<>();
    if (!isNumber(h.numerator()) || !isNumber(h.denominator())) {
      for (String type : List.of("Bianchi VI_h", "Bianchi VII_h")) {
        out.put(type, "h = " + h);
        out.put(type + " + R", "h = " + h);
      }
    }
    return out;
  }

  /**
   * The eigenvalues up to a common factor.
   *
   * @param c their elementary symmetric functions
   * @param classes the names of the classes
   */
  private SortedMap<String, String> eigenvalues(List<Polynomial> c, List<String> classes) {
    SortedMap<String, String> out = new TreeMap<>();
    if (!chain.normal(weighted(c)).entries().stream().allMatch(this::isNumber)) {
      String text = "eigenvalues in the ratio " + ratio(c).orElseGet(() -> roots(c));
      classes.forEach(k -> out.put(k, text));
    }
    return out;
  }

  private String roots(List<Polynomial> c) {
    StringBuilder out = new StringBuilder("of the roots of x^" + c.size());
    for (int k = 1; k <= c.size(); k++) {
      int e = c.size() - k;
      Polynomial s = c.get(k - 1);
      out.append(term(k % 2 == 0 ? s : s.negate(), e == 0 ? "" : e == 1 ? "x" : "x^" + e));
    }
    return out.toString();
  }

  /** Powers of equal degree: the eigenvalues are constant up to a factor if their ratios are. */
  private static List<Polynomial> weighted(List<Polynomial> c) {
    return c.size() == 2
        ? List.of(c.get(0).pow(2), c.get(1))
        : List.of(c.get(0).pow(6), c.get(1).pow(3), c.get(2).pow(2));
  }

  /**
   * The eigenvalues, if they are rational functions, as polynomials without a common factor.
   *
   * @param c the elementary symmetric functions of the eigenvalues
   * @return joined by colons
   */
  private Optional<String> ratio(List<Polynomial> c) {
    Variables ring = RealField.extended(chain, 1);
    int x = ring.count() - 1;
    Polynomial p = Polynomial.variable(ring, x).pow(c.size());
    for (int k = 1; k <= c.size(); k++) {
      Polynomial s =
          NumberFieldTower.inRing(k % 2 == 0 ? c.get(k - 1) : c.get(k - 1).negate(), ring);
      p = p.plus(s.times(Polynomial.variable(ring, x).pow(c.size() - k)));
    }
    List<RationalFunction> roots = new ArrayList<>();
    for (Factorization.Factor f : Factoring.overRationals(p).factors()) {
      if (f.base().degree(x) > 1) {
        return Optional.empty();
      }
      List<Polynomial> q =
          f.base().coefficientsIn(x).stream()
              .map(b -> NumberFieldTower.inRing(b, chain.variables()))
              .toList();
      roots.addAll(Collections.nCopies(f.multiplicity(), value(q.get(0).negate(), q.get(1))));
    }
    Polynomial below =
        roots.stream().map(RationalFunction::denominator).reduce(chain.one(), Polynomial::times);
    return Optional.of(
        signed(
                chain
                    .normal(
                        roots.stream()
                            .map(r -> r.numerator().times(below).over(r.denominator()))
                            .toList())
                    .entries())
            .stream()
            .map(r -> r.termCount() > 1 ? "(" + r + ")" : r.toString())
            .collect(Collectors.joining(" : ")));
  }

  /** In order, all times 1 or -1 so that the first one begins with a positive coefficient. */
  private static List<Polynomial> signed(List<Polynomial> numbers) {
    List<Polynomial> sorted =
        numbers.stream()
            .sorted(
                Comparator.comparing(Polynomial::totalDegree)
                    .thenComparing(p -> p.primitive().toString()))
            .toList();
    return sorted.get(0).leadingCoefficient().signum() < 0
        ? sorted.stream().map(Polynomial::negate).toList()
        : sorted;
  }

  private String term(Polynomial coefficient, String power) {
    RationalFunction c = value(coefficient, chain.one());
    if (c.isZero()) {
      return "";
    }
    boolean minus = c.numerator().leadingCoefficient().signum() < 0;
    RationalFunction size = minus ? c.negate() : c;
    boolean closed = size.denominator().isOne() && size.numerator().termCount() == 1;
    String number = closed ? size.toString() : "(" + size + ")";
    boolean one = size.numerator().isOne() && size.denominator().isOne();
    String product = power.isEmpty() ? number : one ? power : number + "*" + power;
    return (minus ? " - " : " + ") + product;
  }
}
