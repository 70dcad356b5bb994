package rankfall.locus;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import rankfall.exact.Chain;
import rankfall.exact.Echelon;
import rankfall.exact.Polynomial;

/**
 * Cuts the parameter variety into leaves: on each the profile is the same at every point.
 *
 * <p>Parametric elimination in the sense of Sit (An algorithm for solving parametric linear
 * systems, J. Symb. Comp. 13, 1992): at the general point of a piece the matrices are reduced;
 * where a pivot vanishes, the piece is cut and its part looked at anew.
 */
public final class Exploration {
  private final Algebras algebras;
  private final Splitter splitter;
  private final Cutter cutter;
  private final Meter meter;
  private final Deque<Task> open = new ArrayDeque<>();
  private final List<Leaf> leaves = new ArrayList<>();

  /**
   * A piece to look at, with the algebra of the piece that it was cut from, if that still holds.
   */
  private record Task(Piece piece, List<BranchAlgebra> inherited) {}

  private Exploration(Chain constants, Algebras algebras, Meter meter) {
    this.cutter = new Cutter(constants, meter);
    this.algebras = algebras;
    this.meter = meter;
    this.splitter = new Splitter(constants, meter);
  }

  /**
   * All leaves.
   *
   * @param constants the chain of the algebraic numbers
   * @param algebras the family
   * @param start disjoint pieces that cover the points to look at
   * @param meter ends the work early
   */
  public static Result of(Chain constants, Algebras algebras, List<Piece> start, Meter meter) {
    Exploration e = new Exploration(constants, algebras, meter);
    start.forEach(p -> e.open.add(new Task(p, List.of())));
    return e.run();
  }

  /**
   * What was found.
   *
   * @param leaves those that are done
   * @param undecided pieces that were not looked at to the end
   * @param reason why not; empty if all is done
   */
  public record Result(List<Leaf> leaves, List<Piece> undecided, String reason) {
    /** Copies the lists. */
    public Result {
      leaves = List.copyOf(leaves);
      undecided = List.copyOf(undecided);
    }
  }

  private Result run() {
    while (!open.isEmpty()) {
      Task task = open.pop();
      try {
        explore(task);
      } catch (Meter.Exhausted e) {
        List<Piece> rest = new ArrayList<>(List.of(task.piece()));
        open.forEach(t -> rest.add(t.piece()));
        return new Result(leaves, rest, e.getMessage());
      }
    }
    return new Result(leaves, List.of(), "");
  }

  private void explore(Task task) {
    meter.branch();
    Piece piece = task.piece();
    Algebras.Outcome outcome =
        task.inherited().isEmpty()
            ? algebras.on(piece)
            : new Algebras.Closed(task.inherited().get(0).on(piece.chain()), List.of());
    List<Task> cut = new ArrayList<>();
    if (outcome instanceof Algebras.NotClosed notClosed) {
      Piece rest = cut(piece, notClosed.nonVanishing(), List.of(), cut);
      for (Piece p : splitter.within(rest, notClosed.conditions(), List.of())) {
        cut.add(new Task(p, List.of()));
      }
      leaves.add(new Leaf.Open(rest, notClosed.dimension()));
    } else if (outcome instanceof Algebras.Closed closed) {
      Piece regular = cut(piece, closed.nonVanishing(), List.of(), cut);
      leaves.add(profiled(regular, closed.algebra(), cut));
    }
    cut.forEach(open::push);
  }

  /** The leaf of the general point of a piece; what it assumes not to vanish is not cut off. */
  static Leaf.Defined general(Piece piece, BranchAlgebra algebra) {
    KnownNonZero domain = KnownNonZero.on(piece);
    int n = algebra.constants().dimension();
    return new Leaf.Defined(
        piece,
        new Profile(
            n,
            algebra.killingRank(domain).rank(),
            algebra.derivedRank(domain).rank(),
            n - algebra.centreRank(domain).rank()),
        algebra);
  }

  private Leaf profiled(Piece piece, BranchAlgebra algebra, List<Task> cut) {
    KnownNonZero domain = KnownNonZero.on(piece);
    Echelon<Polynomial> derived = algebra.derivedRank(domain);
    Echelon<Polynomial> centre = algebra.centreRank(domain);
    Echelon<Polynomial> killing = algebra.killingRank(domain);
    List<Polynomial> watched = new ArrayList<>(derived.nonVanishing());
    watched.addAll(centre.nonVanishing());
    watched.addAll(killing.nonVanishing());
    int n = algebra.constants().dimension();
    Profile profile = new Profile(n, killing.rank(), derived.rank(), n - centre.rank());
    return new Leaf.Defined(cut(piece, watched, List.of(algebra), cut), profile, algebra);
  }

  /** Cuts off the zeros of polynomials and returns what is left. */
  private Piece cut(
      Piece piece, List<Polynomial> watched, List<BranchAlgebra> inherited, List<Task> cut) {
    Cutter.Parts parts = cutter.cut(piece, watched);
    parts.cut().forEach(p -> cut.add(new Task(p, inherited)));
    return parts.rest();
  }
}
