package rankfall.locus;

import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.ChainPoint;
import rankfall.exact.ComplexNumber;
import rankfall.exact.ConstantRoot;
import rankfall.exact.Polynomial;
import rankfall.exact.RealZeros;
import rankfall.lie.Family;

/**
 * Points of a family on pieces, as algebraic numbers: a short rational value for each free variable
 * that leaves something of the piece, then roots for the others.
 */
public final class ComplexPoint {
  private static final int MOST_TRIES = 120;
  private static final int MOST_BRANCHES = 4000;
  private static final Duration LONGEST = Duration.ofSeconds(30);
  private static final List<BigFraction> VALUES =
      List.of(
          BigFraction.ZERO,
          BigFraction.ONE,
          BigFraction.of(-1),
          BigFraction.of(2),
          BigFraction.of(-2),
          BigFraction.of(1, 2),
          BigFraction.of(-1, 2),
          BigFraction.of(3),
          BigFraction.of(-3),
          BigFraction.of(5),
          BigFraction.of(7),
          BigFraction.of(-5));

  private final List<Polynomial> excluded;
  private final Map<Integer, ConstantRoot> numbers = new HashMap<>();
  private final List<RealZeros.Condition> conditions;
  private final Splitter splitter;
  private final boolean realOnly;
  private int tries;

  private ComplexPoint(Family family, boolean realOnly) {
    Chain constants = family.ring().constants();
    List<ConstantRoot> roots = family.ring().tower().roots();
    for (int k = 0; k < roots.size(); k++) {
      numbers.put(constants.rules().get(k).variable(), roots.get(k));
    }
    this.excluded = new FamilyAlgebras(family).excluded();
    this.conditions = family.domain().stream().map(RealPoints::condition).toList();
    this.splitter = new Splitter(constants, new Meter(LONGEST, MOST_BRANCHES));
    this.realOnly = realOnly;
  }

  /**
   * A point of a piece at which the family is defined; what bounds real points is left aside.
   *
   * @param family the family
   * @param piece in its ring
   * @return a coordinate a variable of the ring; empty if the search gave up
   */
  public static Optional<List<ComplexNumber>> on(Family family, Piece piece) {
    return new ComplexPoint(family, false).start(piece);
  }

  /**
   * A real point of a piece within the domain.
   *
   * @param family the family
   * @param piece in its ring
   * @return a coordinate a variable of the ring; empty if the search gave up
   */
  public static Optional<List<ComplexNumber>> realOn(Family family, Piece piece) {
    return family.ring().variables().numbers() > family.ring().tower().roots().size()
        ? Optional.empty()
        : new ComplexPoint(family, true).start(piece);
  }

  private Optional<List<ComplexNumber>> start(Piece piece) {
    try {
      return among(splitter.within(piece, List.of(), excluded));
    } catch (Meter.Exhausted e) {
      return Optional.empty();
    }
  }

  private Optional<List<ComplexNumber>> among(List<Piece> pieces) {
    for (Piece p : pieces) {
      Optional<List<ComplexNumber>> out = inside(p);
      if (out.isPresent()) {
        return out;
      }
    }
    return Optional.empty();
  }

  private Optional<List<ComplexNumber>> inside(Piece piece) {
    List<Integer> free = piece.chain().freeVariables();
    if (free.isEmpty()) {
      return ChainPoint.of(piece.chain(), numbers, realOnly, conditions);
    }
    for (BigFraction value : VALUES) {
      if (++tries > MOST_TRIES) {
        return Optional.empty();
      }
      List<Polynomial> at = new ArrayList<>();
      Polynomial x = Polynomial.variable(piece.chain().variables(), free.get(0));
      at.add(
          x.times(value.getDenominator())
              .minus(Polynomial.constant(x.variables(), value.getNumerator())));
      Optional<List<ComplexNumber>> out = among(splitter.within(piece, at, List.of()));
      if (out.isPresent()) {
        return out;
      }
    }
    return Optional.empty();
  }
}
