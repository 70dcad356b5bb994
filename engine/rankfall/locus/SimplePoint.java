package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;

/** A rational point with small coordinates in a piece that is given rationally. */
final class SimplePoint {
  private static final int TRIES = 240;
  private static final List<BigFraction> VALUES =
      List.of(
          BigFraction.of(1),
          BigFraction.of(0),
          BigFraction.of(-1),
          BigFraction.of(2),
          BigFraction.of(-2),
          BigFraction.of(1, 2),
          BigFraction.of(3),
          BigFraction.of(-3),
          BigFraction.of(1, 3));

  private SimplePoint() {}

  /**
   * Searches a point by its free coordinates.
   *
   * @param family gives poles and domain
   * @param piece where to search
   * @return a coordinate a variable; empty if none was found, or if the piece or the family needs
   *     algebraic numbers
   */
  static Optional<List<BigFraction>> in(Family family, Piece piece) {
    Chain chain = piece.chain();
    if (!chain.tower().isEmpty()) {
      return Optional.empty();
    }
    Random random = new Random(1);
    for (int k = 0; k < TRIES; k++) {
      int choices = Math.min(VALUES.size(), 1 + k / 4);
      Optional<List<BigFraction>> point = complete(chain, random, choices);
      if (point.isPresent() && belongs(family, piece, point.get())) {
        return point;
      }
    }
    return Optional.empty();
  }

  private static Optional<List<BigFraction>> complete(Chain chain, Random random, int choices) {
    List<BigFraction> point = new ArrayList<>();
    for (int v = 0; v < chain.variables().count(); v++) {
      point.add(VALUES.get(random.nextInt(choices)));
    }
    for (Chain.Rule r : chain.rules()) {
      BigFraction slope = r.initial().at(point);
      if (slope.signum() == 0) {
        return Optional.empty();
      }
      Polynomial rest = r.equation().coefficient(r.variable(), 0);
      point.set(r.variable(), rest.at(point).negate().divide(slope));
    }
    return Optional.of(point);
  }

  private static boolean belongs(Family family, Piece piece, List<BigFraction> point) {
    for (Polynomial p : piece.nonZero()) {
      if (p.at(point).signum() == 0) {
        return false;
      }
    }
    for (Polynomial p : family.poles()) {
      if (p.at(point).signum() == 0) {
        return false;
      }
    }
    for (FamilyCondition c : family.domain()) {
      if (!c.allows(c.polynomial().at(point).signum())) {
        return false;
      }
    }
    return true;
  }
}
