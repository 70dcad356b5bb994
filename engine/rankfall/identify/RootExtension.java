package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.NumberFieldTower;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;
import rankfall.lie.SignRule;
import rankfall.lie.StructureConstants;

/**
 * A field with a root of a polynomial added: over an ordered field its least real root, with the
 * order that this gives; else any root.
 *
 * <p>The sign of a polynomial at the root is found by Tarski's query (Basu, Pollack, Roy,
 * Algorithms in Real Algebraic Geometry, section 2.2.2).
 *
 * @param below the field
 * @param ground the larger one
 */
record RootExtension<E>(Ground<E> below, Ground<Polynomial> ground) {
  /**
   * Adds a root.
   *
   * @param factor irreducible over the field, of degree 2 or more, the constant coefficient first;
   *     over an ordered field it has a real root
   */
  static <E> RootExtension<E> of(Ground<E> below, List<E> factor) {
    List<E> monic = monic(below, factor);
    Variables ring = RealField.extended(below.chain(), 1);
    int v = ring.count() - 1;
    Polynomial equation = Polynomial.zero(ring);
    for (int k = 0; k < monic.size(); k++) {
      Polynomial c = NumberFieldTower.inRing(below.lift().apply(monic.get(k)), ring);
      equation = equation.plus(c.times(Polynomial.variable(ring, v).pow(k)));
    }
    Chain.Rule rule = new Chain.Rule(v, equation);
    List<Chain.Rule> rules = new ArrayList<>();
    for (Chain.Rule r : below.chain().rules()) {
      rules.add(new Chain.Rule(r.variable(), NumberFieldTower.inRing(r.equation(), ring)));
    }
    rules.add(rule);
    Chain chain = new Chain(ring, rules);
    return new RootExtension<>(
        below, Ground.of(chain, below.signs().map(s -> signs(below, s, monic, chain, rule))));
  }

  /** The polynomial of a multiple of the roots by an integer whose leading coefficient is 1. */
  private static <E> List<E> monic(Ground<E> ground, List<E> factor) {
    int degree = factor.size() - 1;
    List<E> all = ground.division().of(factor, factor.get(degree));
    BigInteger lead = ground.lift().apply(all.get(degree + 1)).constantValue();
    List<E> out = new ArrayList<>();
    for (int k = 0; k < degree; k++) {
      out.add(ground.domain().times(ground.integer(lead.pow(degree - 1 - k)), all.get(k)));
    }
    List<E> shorter = new ArrayList<>(ground.shorter().apply(out));
    shorter.add(ground.domain().one());
    return shorter;
  }

  private static <E> SignRule<Polynomial> signs(
      Ground<E> below, SignRule<E> order, List<E> monic, Chain chain, Chain.Rule rule) {
    SturmSequence<E> roots = SturmSequence.of(below, monic);
    BigFraction bound = roots.bound();
    BigFraction low = bound.negate();
    BigFraction high = roots.separators().stream().findFirst().orElse(bound);
    Chain top = new Chain(chain.variables(), List.of(rule));
    return p -> {
      Polynomial rest = top.reduced(p);
      if (chain.vanishes(rest)) {
        return 0;
      }
      List<E> value =
          rest.coefficientsIn(rule.variable()).stream()
              .map(c -> NumberFieldTower.inRing(c, below.chain().variables()))
              .map(below.lower())
              .toList();
      return value.size() == 1
          ? order.signum(value.get(0))
          : SturmSequence.weighted(below, monic, value, low, high);
    };
  }

  /** An element of the field in the larger one. */
  Polynomial image(E element) {
    return NumberFieldTower.inRing(below.lift().apply(element), ground.chain().variables());
  }

  /** A sparse vector in the larger field. */
  SortedMap<Integer, Polynomial> image(SortedMap<Integer, E> x) {
    SortedMap<Integer, Polynomial> out = new TreeMap<>();
    x.forEach((k, c) -> out.put(k, image(c)));
    return out;
  }

  /** Constants whose denominator and scale are 1. */
  StructureConstants<Polynomial> image(StructureConstants<E> constants) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> out = new TreeMap<>();
    constants.brackets().forEach((pair, row) -> out.put(pair, image(row)));
    return Ground.plain(ground.domain(), constants.dimension(), out);
  }
}
