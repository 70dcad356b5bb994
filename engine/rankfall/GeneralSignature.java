package rankfall;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Signature;
import rankfall.exact.Polynomial;
import rankfall.exact.RealZeros;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;
import rankfall.locus.Leaf;
import rankfall.locus.Profile;
import rankfall.locus.RealPoints;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/**
 * The signature where it is one and the same at all real points of the general rank.
 *
 * <p>It is where the points form a convex set, no relation and only half-spaces as bounds, that no
 * real hypersurface cuts on which there is a pole or the rank or the span falls: the set stays
 * connected then, and the signature, which changes only where the rank does, is that of any of its
 * points.
 */
record GeneralSignature(Family family, Profile profile, List<Leaf> leaves) {
  private static final int TRIES = 50;

  Optional<Signature> of(List<Condition> conditions) {
    boolean open =
        family.relations().isEmpty()
            && family.domain().stream().allMatch(GeneralSignature::isHalfSpace)
            && family.poles().stream().noneMatch(this::mayCut)
            && !family.ring().complex()
            && conditions.stream().allMatch(c -> c.realPoints() == Analysis.RealPoints.NO)
            && leaves.stream().noneMatch(this::cutsSpan);
    return open ? atSomePoint() : Optional.empty();
  }

  private static boolean isHalfSpace(FamilyCondition c) {
    return c.polynomial().totalDegree() == 1 && c.relation() != Spec.Relation.UNEQUAL;
  }

  private boolean mayCut(Polynomial pole) {
    return new RealPoints(family).onZeros(List.of(pole)).verdict() != RealZeros.Verdict.NO;
  }

  /** Whether the span falls, or fails to close, on a hypersurface. */
  private boolean cutsSpan(Leaf leaf) {
    int parameters = family.ring().variables().indeterminates();
    return leaf.piece().chain().dimension() == parameters - 1
        && !(leaf instanceof Leaf.Defined d && d.profile().dimension() == profile.dimension())
        && new RealPoints(family).onClosure(leaf.piece().chain()).verdict() != RealZeros.Verdict.NO;
  }

  private Optional<Signature> atSomePoint() {
    Random random = new Random(1);
    for (int k = 0; k < TRIES; k++) {
      Map<String, BigFraction> point = new TreeMap<>();
      int spread = 1 + k;
      for (int v = 0; v < family.ring().variables().indeterminates(); v++) {
        point.put(
            family.ring().variables().names().get(v),
            BigFraction.of(random.nextInt(2 * spread + 1) - spread));
      }
      if (facts(point) instanceof PointResult.Facts f
          && f.dimension() == profile.dimension()
          && f.killing().rank() == profile.rank()) {
        return f.killing().signature();
      }
    }
    return Optional.empty();
  }

  private PointResult facts(Map<String, BigFraction> point) {
    try {
      return Points.of(family.spec()).at(point);
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }
}
