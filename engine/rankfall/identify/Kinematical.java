package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import rankfall.exact.Domain;
import rankfall.exact.Polynomial;
import rankfall.lie.AlgebraFacts;
import rankfall.lie.Ideals;
import rankfall.lie.LieBracket;
import rankfall.lie.Subspace;

/**
 * The kinematical algebras in 3+1 dimensions that are not told by their Levi factor alone: static,
 * Carroll, Galilei, the two of Newton and Hooke (Bacry and Levy-Leblond, J. Math. Phys. 9 (1968)
 * 1605, from memory), and the extended Galilei algebra of Bargmann 1954.
 *
 * <p>Why the name is proved. Let R be the radical, of dimension 7, g/R = so(3), and let tr over R
 * of ad x ad y be twice the Killing form of g/R for x, y in [g, g]. The trace form of the module of
 * spin j is j (j+1) (2j+1) / 6 times the Killing form, so among the modules of dimension 7 only V +
 * V + 1 has the sum 2, V the vectors. As module R = W (x) V + R H with W = R^2. Invariance leaves
 * [H, w v] = (A w) v, [w u, w' v] = b(w, w') (u x v) + omega(w, w') (u.v) H with b symmetric and
 * omega alternating.
 *
 * <ul>
 *   <li>[R, R] = 0: static, so(3) |x (V + V) + R.
 *   <li>[R, R] of dimension 1: no copy of V lies in it, so b = 0 and A = 0, and omega is unique up
 *       to a factor: R is the Heisenberg algebra h7, Carroll.
 *   <li>M = [g, R] of dimension 6 and abelian: b = 0 and omega = 0; g is given by A up to
 *       conjugation and a factor. With tr A = 0: A nilpotent, not 0, is Galilei (and para-Galilei,
 *       in which W has another basis); A^2 = k is the expanding algebra of Newton and Hooke for
 *       positive k, the oscillating one for negative k.
 * </ul>
 *
 * <p>Bargmann: the centre has dimension 1 and lies in [g, g], and modulo it g is Galilei. The
 * central extensions of the Galilei algebra in 3+1 dimensions have one class up to a factor, and a
 * trivial one would not lie in [g, g] (Bargmann 1954).
 */
public final class Kinematical {
  private static final int ROTATIONS = 3;

  private Kinematical() {}

  /** Which algebra. */
  enum Kind {
    /** No brackets beyond the rotations. */
    STATIC,
    /** Boosts and translations give the energy. */
    CARROLL,
    /** Energy takes boosts to translations. */
    GALILEI,
    /** Energy turns, or stretches, boosts and translations. */
    NEWTON_HOOKE,
    /** Galilei with a central mass. */
    BARGMANN
  }

  /**
   * The structure, as far as no sign is needed; that the rotations are compact is not among it.
   *
   * @param kind which algebra
   * @param square a number with the sign of k; 0 but for {@link Kind#NEWTON_HOOKE}
   * @param assumed elements such that it is so wherever none of them vanishes
   * @param <E> the numbers
   */
  record Structure<E>(Kind kind, E square, List<E> assumed) {}

  /**
   * The name of a real algebra.
   *
   * @param g real
   * @return empty if it is none of these
   */
  public static Optional<TypeName> of(ExactAlgebra g) {
    if (g.complex() || g.dimension() < 10 || g.dimension() > 11) {
      return Optional.empty();
    }
    LieBracket<Polynomial> bracket = LieBracket.of(g.constants());
    Optional<Structure<Polynomial>> found = structure(bracket);
    if (found.isEmpty() || !compact(g, bracket)) {
      return Optional.empty();
    }
    return found.map(
        s ->
            switch (s.kind()) {
              case STATIC ->
                  new TypeName(
                      "static", List.of("so(3) |x (R^3 + R^3) + R", "static kinematical algebra"));
              case CARROLL -> new TypeName("Carroll", List.of("so(3) |x h7"));
              case GALILEI -> new TypeName("Galilei", List.of("para-Galilei"));
              case NEWTON_HOOKE ->
                  g.signs().orElseThrow().signum(s.square()) > 0
                      ? new TypeName("Newton-Hooke (expanding)", List.of())
                      : new TypeName("Newton-Hooke (oscillating)", List.of());
              case BARGMANN -> new TypeName("Bargmann", List.of("extended Galilei"));
            });
  }

  /**
   * Whether g modulo its radical is compact: on [g, g], of codimension 1 at most, the Killing form
   * is a positive multiple of that of the quotient, so two positive squares tell sl(2,R), and one
   * at most so(3).
   */
  private static boolean compact(ExactAlgebra g, LieBracket<Polynomial> bracket) {
    return Forms.signature(AlgebraFacts.of(bracket).killing(), g).plus() <= 1;
  }

  /**
   * The structure of an algebra.
   *
   * @param bracket over a ring of characteristic 0
   * @return empty if it is none of these, whatever the real form of the Levi factor
   */
  static <E> Optional<Structure<E>> structure(LieBracket<E> bracket) {
    if (bracket.dimension() == 10) {
      return withoutMass(bracket);
    }
    return bracket.dimension() == 11 ? withMass(bracket) : Optional.empty();
  }

  private static <E> Optional<Structure<E>> withMass(LieBracket<E> bracket) {
    Subspace<E> centre = Ideals.centre(bracket);
    Subspace<E> derived = Ideals.derived(bracket);
    if (centre.dimension() != 1 || !derived.contains(centre)) {
      return Optional.empty();
    }
    Quotient<E> quotient = Quotient.of(bracket, centre);
    Optional<Structure<E>> galilei = withoutMass(LieBracket.of(quotient.constants()));
    if (galilei.isEmpty() || galilei.get().kind() != Kind.GALILEI) {
      return Optional.empty();
    }
    List<E> assumed = new ArrayList<>(quotient.assumed());
    assumed.addAll(derived.nonVanishing());
    assumed.addAll(galilei.get().assumed());
    return Optional.of(new Structure<>(Kind.BARGMANN, bracket.domain().zero(), assumed));
  }

  private static <E> Optional<Structure<E>> withoutMass(LieBracket<E> bracket) {
    AlgebraFacts<E> facts = AlgebraFacts.of(bracket);
    Subspace<E> r = facts.radical();
    if (r.dimension() != bracket.dimension() - ROTATIONS || !actsOnVectors(bracket, facts)) {
      return Optional.empty();
    }
    List<E> assumed = new ArrayList<>(r.nonVanishing());
    Subspace<E> square = Ideals.bracket(bracket, r, r);
    assumed.addAll(square.nonVanishing());
    E zero = bracket.domain().zero();
    if (square.dimension() < 2) {
      Kind kind = square.dimension() == 0 ? Kind.STATIC : Kind.CARROLL;
      return Optional.of(new Structure<>(kind, zero, assumed));
    }
    Subspace<E> m = Ideals.bracket(bracket, Subspace.whole(bracket.domain(), 10), r);
    assumed.addAll(m.nonVanishing());
    if (m.dimension() != 6 || Ideals.bracket(bracket, m, m).dimension() > 0) {
      return Optional.empty();
    }
    IdealAction<E> h = IdealAction.of(bracket, m, r);
    assumed.addAll(h.assumed());
    Arithmetic<E> ring = new Arithmetic<>(bracket.domain());
    if (!ring.vanishes(ring.trace(h.matrix()))) {
      return Optional.empty();
    }
    if (square.dimension() == 3) {
      return Optional.of(new Structure<>(Kind.GALILEI, zero, assumed));
    }
    E k = ring.trace(ring.product(h.matrix(), h.matrix()));
    return Optional.of(new Structure<>(Kind.NEWTON_HOOKE, k, assumed));
  }

  /** Whether three times the trace form over R is twice the Killing form, on [g, g]. */
  private static <E> boolean actsOnVectors(LieBracket<E> bracket, AlgebraFacts<E> facts) {
    Domain<E> domain = bracket.domain();
    Arithmetic<E> ring = new Arithmetic<>(domain);
    IdealBasis<E> basis = IdealBasis.of(bracket, facts.radical());
    E square = ring.square(basis.factor());
    List<SortedMap<Integer, E>> xs = facts.derived().basis();
    List<List<List<E>>> ad = xs.stream().map(x -> basis.action(bracket, x)).toList();
    for (int i = 0; i < xs.size(); i++) {
      for (int j = i; j < xs.size(); j++) {
        E over = ring.trace(ring.product(ad.get(i), ad.get(j)));
        E kappa = Forms.value(domain, facts.killing(), xs.get(i), xs.get(j));
        E difference = ring.minus(ring.times(3, over), ring.times(2, domain.times(square, kappa)));
        if (!ring.vanishes(difference)) {
          return false;
        }
      }
    }
    return true;
  }
}
