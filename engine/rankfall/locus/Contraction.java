package rankfall.locus;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.LieBracket;
import rankfall.lie.PlainKilling;
import rankfall.lie.StructureConstants;
import rankfall.lie.StructureConstants.Pair;

/**
 * The brackets at the general point of a set, followed into a smaller set: the contracted algebra
 * (Inonu and Wigner 1953, Proc. Natl. Acad. Sci. 39, 510).
 */
public final class Contraction {
  private Contraction() {}

  /**
   * A structure constant.
   *
   * @param left position of the left element, from 0
   * @param right position of the right element, above {@code left}
   * @param target position of the element whose coefficient in the bracket this is
   * @param value the coefficient
   */
  public record Entry(int left, int right, int target, RationalFunction value) {}

  /** What becomes of the brackets at the general point of the smaller set. */
  public sealed interface Outcome permits Limit, NoLimit, Undecided {}

  /**
   * All brackets have a limit.
   *
   * @param brackets those that are not 0
   * @param profile of the algebra that they describe
   */
  public record Limit(List<Entry> brackets, Profile profile) implements Outcome {
    /** Copies the list. */
    public Limit {
      brackets = List.copyOf(brackets);
    }
  }

  /**
   * Some bracket has no limit.
   *
   * @param poles the constants without a limit, with their values at the general point of the
   *     larger set
   */
  public record NoLimit(List<Entry> poles) implements Outcome {
    /** Copies the list. */
    public NoLimit {
      poles = List.copyOf(poles);
    }
  }

  /**
   * It was not decided.
   *
   * @param open the constants in question, with their values at the general point of the larger set
   * @param reason a clause
   */
  public record Undecided(List<Entry> open, String reason) implements Outcome {
    /** Copies the list. */
    public Undecided {
      open = List.copyOf(open);
    }
  }

  /**
   * Follows the brackets.
   *
   * @param bases for the ring
   * @param general the larger set
   * @param equations a basis of its prime ideal
   * @param dimension of the algebra there
   * @param brackets the structure constants there
   * @param special the smaller set, inside the larger one
   * @throws ComponentForm.Mismatch if the limit is no Lie algebra
   */
  public static Outcome of(
      GroebnerBasis bases,
      Chain general,
      List<Polynomial> equations,
      int dimension,
      List<Entry> brackets,
      Chain special) {
    Approach approach = new Approach(bases, general, equations, special);
    List<Entry> values = new ArrayList<>();
    List<Entry> poles = new ArrayList<>();
    List<Entry> open = new ArrayList<>();
    String reason = "";
    for (Entry e : brackets) {
      Approach.Answer answer = approach.of(e.value());
      if (answer instanceof Approach.Value v) {
        if (!v.function().isZero()) {
          values.add(new Entry(e.left(), e.right(), e.target(), v.function()));
        }
      } else if (answer instanceof Approach.Unknown u) {
        open.add(e);
        reason = reason.isEmpty() ? u.reason() : reason;
      } else {
        poles.add(e);
      }
    }
    if (!poles.isEmpty()) {
      return new NoLimit(poles);
    }
    return open.isEmpty() ? limit(special, dimension, values) : new Undecided(open, reason);
  }

  private static Limit limit(Chain special, int dimension, List<Entry> values) {
    StructureConstants<Polynomial> constants = cleared(special, dimension, values);
    requireJacobi(special, constants);
    List<String> names = Collections.nCopies(dimension, "");
    BranchAlgebra algebra =
        new BranchAlgebra(
            constants, names, BranchAlgebra.reducedMatrix(special, PlainKilling.of(constants)));
    KnownNonZero domain = new KnownNonZero(special, List.of());
    return new Limit(
        values,
        new Profile(
            dimension,
            algebra.killingRank(domain).rank(),
            algebra.derivedRank(domain).rank(),
            dimension - algebra.centreRank(domain).rank()));
  }

  /** The constants over one common denominator. */
  private static StructureConstants<Polynomial> cleared(
      Chain special, int dimension, List<Entry> values) {
    Polynomial common = special.one();
    for (Entry e : values) {
      Polynomial d = e.value().denominator();
      common = common.times(d.over(common.gcd(d)));
    }
    SortedMap<Pair, SortedMap<Integer, Polynomial>> out = new TreeMap<>();
    for (Entry e : values) {
      out.computeIfAbsent(new Pair(e.left(), e.right()), p -> new TreeMap<>())
          .put(e.target(), e.value().numerator().times(common.over(e.value().denominator())));
    }
    return BranchAlgebra.reduced(
        special,
        new StructureConstants<>(
            special, dimension, out, common, Collections.nCopies(dimension, special.one())));
  }

  /** A limit of Lie algebras is one; a limit that is none was computed wrongly. */
  static void requireJacobi(Chain special, StructureConstants<Polynomial> constants) {
    LieBracket<Polynomial> bracket = LieBracket.of(constants);
    int n = constants.dimension();
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        for (int k = j + 1; k < n; k++) {
          SortedMap<Integer, Polynomial> sum = new TreeMap<>();
          add(sum, bracket, i, j, k);
          add(sum, bracket, j, k, i);
          add(sum, bracket, k, i, j);
          if (!sum.values().stream().allMatch(special::vanishes)) {
            throw new ComponentForm.Mismatch(
                "the contracted brackets do not satisfy Jacobi's identity");
          }
        }
      }
    }
  }

  /** Adds [[e_i, e_j], e_k]. */
  private static void add(
      SortedMap<Integer, Polynomial> sum, LieBracket<Polynomial> bracket, int i, int j, int k) {
    bracket
        .of(i, j)
        .forEach(
            (m, c) ->
                bracket.of(m, k).forEach((t, d) -> sum.merge(t, c.times(d), Polynomial::plus)));
  }
}
