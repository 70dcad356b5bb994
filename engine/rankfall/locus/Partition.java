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
   * A family of which only the components of the relations (of the spec, of functions, and Jacobi's
   * identity) were looked at, at their general points.
   *
   * @param family the family
   * @param meter ends the work early
   */
  public static Partition start(Family family, Meter meter) {
    Chain constants = family.ring().constants();
    FamilyAlgebras algebras = new FamilyAlgebras(family);
    List<Polynomial> conditions = generalConditions(family);
    List<Polynomial> equations =
        new ArrayList<>(family.relations().stream().map(FamilyRelation::polynomial).toList());
    if (isTable(family)) {
      equations.addAll(conditions);
    }
    List<Leaf> leaves = new ArrayList<>();
    Optional<Decomposition> variety = Optional.empty();
    String reason = "out of budget";
    try {
      Decomposition d =
          Decomposition.of(
              constants, equations, irreducible(constants, algebras.excluded()), meter);
      variety = Optional.of(d);
      for (Decomposition.Component c : d.components()) {
        Piece piece = new Piece(c.chain(), List.of());
        if (algebras.on(piece) instanceof Algebras.Closed closed) {
          leaves.add(Exploration.general(piece, closed.algebra()));
        }
      }
    } catch (Meter.Exhausted e) {
      reason = e.getMessage();
    }
    Piece all = new Piece(constants, List.of());
    return new Partition(conditions, variety, leaves, Optional.empty(), List.of(all), reason);
  }

  /**
   * Cuts up the points of a family.
   *
   * @param family the family
   * @param meter ends the work early
   * @return this one if the components are not known
   */
  public Partition completed(Family family, Meter meter) {
    if (variety.isEmpty()) {
      return this;
    }
    Chain constants = family.ring().constants();
    FamilyAlgebras algebras = new FamilyAlgebras(family);
    Exploration.Result e = Exploration.of(constants, algebras, variety.get().pieces(), meter);
    if (!e.undecided().isEmpty()) {
      return new Partition(
          conditions, variety, e.leaves(), Optional.empty(), e.undecided(), e.reason());
    }
    try {
      List<Polynomial> excluded = irreducible(constants, algebras.excluded());
      Strata.Result strata = Strata.of(constants, e.leaves(), excluded, meter);
      return new Partition(conditions, variety, e.leaves(), Optional.of(strata), List.of(), "");
    } catch (Meter.Exhausted x) {
      return new Partition(
          conditions,
          variety,
          e.leaves(),
          Optional.empty(),
          variety.get().pieces(),
          x.getMessage());
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
