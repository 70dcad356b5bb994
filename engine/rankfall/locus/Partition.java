package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilyRelation;
import rankfall.lie.FamilySite;
import rankfall.lie.Span;
import rankfall.lie.SpanInput;

/**
 * The points of a family, cut up.
 *
 * @param conditions what the general point of the whole space fails: closure or Jacobi conditions,
 *     primitive; empty if it fails nothing
 * @param variety the components of the relations' zeros, checked; empty if the budget ended before
 * @param leaves those that are done
 * @param strata assembled from the leaves; empty if not all leaves are done
 * @param undecided pieces that were not looked at to the end
 * @param reason why not; empty if all is done
 */
public record Partition(
    List<Polynomial> conditions,
    Optional<Decomposition> variety,
    List<Leaf> leaves,
    Optional<Strata.Result> strata,
    List<Piece> undecided,
    String reason) {
  /** Copies the lists. */
  public Partition {
    conditions = List.copyOf(conditions);
    leaves = List.copyOf(leaves);
    undecided = List.copyOf(undecided);
  }

  /** A family of which nothing is known yet. */
  public static Partition unknown(Family family) {
    Piece all = new Piece(family.ring().constants(), List.of());
    return new Partition(
        List.of(), Optional.empty(), List.of(), Optional.empty(), List.of(all), "out of budget");
  }

  /**
   * A family of which only the general point of the whole space was looked at.
   *
   * @param family the family
   * @return no leaf, unless every choice of parameters is a point; then that of the general point
   */
  public static Partition notYet(Family family) {
    Chain constants = family.ring().constants();
    Piece all = new Piece(constants, List.of());
    List<Polynomial> conditions = generalConditions(family);
    List<Leaf> leaves = new ArrayList<>();
    if (conditions.isEmpty()
        && family.relations().isEmpty()
        && new FamilyAlgebras(family).on(all) instanceof Algebras.Closed closed) {
      leaves.add(Exploration.general(all, closed.algebra()));
    }
    return new Partition(
        conditions, Optional.empty(), leaves, Optional.empty(), List.of(all), "out of budget");
  }

  /**
   * Cuts up the points of a family.
   *
   * @param family the family
   * @param meter ends the work early
   */
  public static Partition of(Family family, Meter meter) {
    Chain constants = family.ring().constants();
    FamilyAlgebras algebras = new FamilyAlgebras(family);
    List<Polynomial> excluded = irreducible(constants, algebras.excluded());
    List<Polynomial> conditions = generalConditions(family);
    List<Polynomial> equations =
        new ArrayList<>(family.relations().stream().map(FamilyRelation::polynomial).toList());
    if (isTable(family)) {
      equations.addAll(conditions);
    }
    try {
      Decomposition variety = Decomposition.of(constants, equations, excluded, meter);
      Exploration.Result e = Exploration.of(constants, algebras, variety.pieces(), meter);
      Optional<Strata.Result> strata =
          e.undecided().isEmpty()
              ? Optional.of(Strata.of(constants, e.leaves(), excluded, meter))
              : Optional.empty();
      return new Partition(
          conditions, Optional.of(variety), e.leaves(), strata, e.undecided(), e.reason());
    } catch (Meter.Exhausted e) {
      return new Partition(
          conditions,
          Optional.empty(),
          List.of(),
          Optional.empty(),
          List.of(new Piece(constants, List.of())),
          e.getMessage());
    }
  }

  private static boolean isTable(Family family) {
    return family.generic() instanceof FamilySite.Algebraic at
        && at.input() instanceof SpanInput.Table<Polynomial>;
  }

  /** Closure or Jacobi conditions where no relation is used. */
  private static List<Polynomial> generalConditions(Family family) {
    if (family.on(family.ring().constants()) instanceof FamilySite.Algebraic at
        && Span.of(at.input()) instanceof Span.Open<Polynomial> open) {
      return open.conditions().stream().map(Polynomial::primitive).distinct().toList();
    }
    return List.of();
  }

  private static List<Polynomial> irreducible(Chain constants, List<Polynomial> polynomials) {
    List<Polynomial> out = new ArrayList<>();
    for (Polynomial p : polynomials) {
      for (Polynomial f : ChainFactoring.irreducible(constants, p)) {
        if (!out.contains(f)) {
          out.add(f);
        }
      }
    }
    return out;
  }
}
