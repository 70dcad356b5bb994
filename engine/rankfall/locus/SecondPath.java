package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.KillingForm;
import rankfall.lie.PlainKilling;
import rankfall.lie.Span;
import rankfall.lie.StructureConstants;

/**
 * Recomputes a Killing form from the generators at one exact point by plain sums, and compares it
 * with the symbolic matrix evaluated there.
 */
public final class SecondPath {
  private static final int TRIES = 60;

  private SecondPath() {}

  /**
   * Looks for a difference.
   *
   * @param family the family
   * @param piece the set over which the form was computed
   * @param basis names of the basis of the form
   * @param form the form
   * @param nonVanishing what the computation of the form assumed
   * @param seed chooses the point
   * @return what differs, or empty if nothing does
   * @throws IllegalStateException if no point was found at which to compare
   */
  public static Optional<String> difference(
      Family family,
      Piece piece,
      List<String> basis,
      KillingForm form,
      List<Polynomial> nonVanishing,
      long seed) {
    Random random = new Random(seed);
    List<Polynomial> off = new ArrayList<>(piece.nonZero());
    off.addAll(piece.chain().initials());
    off.addAll(nonVanishing);
    off.addAll(family.poles());
    for (int k = 0; k < TRIES; k++) {
      Optional<Chain> point = point(piece.chain(), random, 3 + k);
      if (point.isPresent() && off.stream().noneMatch(point.get()::vanishes)) {
        return compare(family, point.get(), basis, form);
      }
    }
    throw new IllegalStateException("no point found for the second path");
  }

  /** A point of the chain; empty if its algebraic coordinates are not determined by their rules. */
  private static Optional<Chain> point(Chain chain, Random random, int spread) {
    List<Chain.Rule> rules = new ArrayList<>();
    for (int v : chain.freeVariables()) {
      Polynomial x = Polynomial.variable(chain.variables(), v);
      int value = random.nextInt(2 * spread + 1) - spread;
      rules.add(new Chain.Rule(v, x.minus(Polynomial.constant(chain.variables(), value))));
    }
    Chain at = new Chain(chain.variables(), rules);
    List<Chain.Rule> linear = new ArrayList<>(rules);
    List<Chain.Rule> tower = new ArrayList<>();
    for (Chain.Rule r : chain.rules()) {
      Polynomial e = at.reduced(r.equation());
      if (e.degree(r.variable()) != r.degree()) {
        return Optional.empty();
      }
      (r.isLinear() ? linear : tower).add(new Chain.Rule(r.variable(), e));
    }
    List<Chain.Rule> below = new ArrayList<>();
    for (Chain.Rule r : tower) {
      Chain lower = new Chain(chain.variables(), below);
      if (ChainFactoring.inVariable(lower, r.equation(), r.variable()).size() != 1) {
        return Optional.empty();
      }
      below.add(r);
    }
    linear.addAll(tower);
    return Optional.of(new Chain(chain.variables(), linear));
  }

  private static Optional<String> compare(
      Family family, Chain point, List<String> basis, KillingForm form) {
    FamilySite site = family.on(point);
    if (!(site instanceof FamilySite.Algebraic at)) {
      return Optional.of("the generators have a pole at a point where the matrix has none");
    }
    Span<Polynomial> span = Span.of(at.input());
    if (!(span instanceof Span.Closed<Polynomial> closed)) {
      return Optional.of("the generators are not closed at a point of the set");
    }
    if (!closed.names().equals(basis)) {
      return Optional.of("the basis is " + closed.names() + " at a point, not " + basis);
    }
    return entries(point, closed.constants(), form);
  }

  private static Optional<String> entries(
      Chain point, StructureConstants<Polynomial> constants, KillingForm form) {
    List<List<Polynomial>> plain = PlainKilling.of(constants);
    Polynomial squared = constants.denominator().times(constants.denominator());
    for (int i = 0; i < plain.size(); i++) {
      for (int j = 0; j < plain.size(); j++) {
        RationalFunction f = form.matrix().get(i).get(j);
        Polynomial below = squared.times(constants.scale().get(i)).times(constants.scale().get(j));
        Polynomial difference =
            f.numerator().times(below).minus(plain.get(i).get(j).times(f.denominator()));
        if (!point.vanishes(difference)) {
          return Optional.of(
              "entry " + (i + 1) + ", " + (j + 1) + " of the Killing matrix differs at a point");
        }
      }
    }
    return Optional.empty();
  }
}
