package rankfall.locus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Factorization.Factor;
import rankfall.exact.Polynomial;

/**
 * The loci of codimension one in a component on which the Killing form degenerates, or falls
 * further in rank.
 */
public final class Loci {
  private final Algebras algebras;
  private final Closures closures;
  private final Splitter splitter;

  /**
   * Loci in the components of one family.
   *
   * @param constants the chain of the algebraic numbers
   * @param algebras the family
   * @param meter ends the work early
   */
  public Loci(Chain constants, Algebras algebras, Meter meter) {
    this.algebras = algebras;
    this.closures = new Closures(constants);
    this.splitter = new Splitter(constants, meter);
  }

  /**
   * A locus.
   *
   * @param closure its general point
   * @param equations those of its prime ideal that do not hold on the whole component
   * @param multiplicity in the determinant; empty where there is none, or where the coordinates of
   *     the component do not tell it
   * @param algebra at its general point; empty where the span is not closed there
   */
  public record Locus(
      Chain closure,
      List<Polynomial> equations,
      Optional<Integer> multiplicity,
      Optional<BranchAlgebra> algebra) {
    /** The rank of the Killing form at the general point. */
    public Optional<Integer> rank() {
      return algebra.map(a -> a.constants().dimension() - a.kernel().size());
    }
  }

  /**
   * The loci in a component.
   *
   * @param component its general point
   * @param profile at the general point
   * @param leaves of an exploration, complete or not
   * @param determinant the factors of the determinant's numerator; empty where it is 0
   * @param blocks polynomials of which the determinant is the product on the component, up to a
   *     number; empty where it is not known in this form
   * @return by text of the equations
   */
  public List<Locus> in(
      Chain component,
      Profile profile,
      List<Leaf> leaves,
      List<Factor> determinant,
      List<Polynomial> blocks) {
    List<Chain> seen = new ArrayList<>();
    List<Locus> out = new ArrayList<>();
    for (Leaf leaf : leaves) {
      Chain w = leaf.piece().chain();
      if (leaf instanceof Leaf.Defined d
          && w.dimension() == component.dimension() - 1
          && d.profile().rank() < profile.rank()
          && closures.isInside(w, component)
          && seen.stream().noneMatch(z -> closures.isInside(w, z))) {
        seen.add(w);
        out.add(locus(component, w, determinant, blocks, Optional.of(d.algebra())));
      }
    }
    for (Factor f : determinant) {
      if (seen.stream().noneMatch(w -> w.vanishes(f.base()))) {
        out.addAll(directly(component, f, determinant, blocks));
      }
    }
    out.removeIf(l -> isRegular(l, profile));
    out.sort(Comparator.comparing((Locus l) -> sizeAndText(l.equations())));
    return out;
  }

  /** Whether only the basis degenerates there: generated ones may where the algebra does not. */
  private static boolean isRegular(Locus l, Profile profile) {
    return l.algebra().map(a -> a.constants().dimension()).equals(Optional.of(profile.dimension()))
        && l.rank().equals(Optional.of(profile.rank()));
  }

  private static String sizeAndText(List<Polynomial> equations) {
    int degree = equations.stream().mapToInt(Polynomial::totalDegree).max().orElse(0);
    int terms = equations.stream().mapToInt(Polynomial::termCount).sum();
    return String.format(java.util.Locale.ROOT, "%04d %06d ", degree, terms)
        + equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
  }

  private Locus locus(
      Chain component,
      Chain w,
      List<Factor> determinant,
      List<Polynomial> blocks,
      Optional<BranchAlgebra> algebra) {
    Optional<Integer> multiplicity =
        isChart(component, w) ? multiplicity(w, determinant) : inAnotherChart(component, w, blocks);
    return new Locus(w, equations(component, w), multiplicity, algebra);
  }

  /**
   * Whether the free coordinates of a component are coordinates near the general point of w too: no
   * initial vanishes there, and there is no tower.
   */
  private static boolean isChart(Chain component, Chain w) {
    return component.initials().stream().noneMatch(w::vanishes)
        && component.tower().size() == ChainFactoring.numbers(component).size();
  }

  /** The exponent of the one factor that vanishes on w. */
  private static Optional<Integer> multiplicity(Chain w, List<Factor> determinant) {
    List<Factor> own = determinant.stream().filter(f -> w.vanishes(f.base())).toList();
    return own.size() == 1 ? Optional.of(own.get(0).multiplicity()) : Optional.empty();
  }

  /** The same in other free coordinates of the component, which serve near w. */
  private Optional<Integer> inAnotherChart(Chain component, Chain w, List<Polynomial> blocks) {
    if (blocks.isEmpty()) {
      return Optional.empty();
    }
    for (Piece p : splitter.near(w).zeros(closures.ideal(component), List.of())) {
      if (p.chain().dimension() == component.dimension() && isChart(p.chain(), w)) {
        int sum = 0;
        for (Polynomial b : blocks) {
          List<Factor> own =
              ChainFactoring.factorization(p.chain(), p.chain().reduced(b)).factors().stream()
                  .filter(f -> w.vanishes(f.base()))
                  .toList();
          if (own.size() > 1) {
            return Optional.empty();
          }
          sum += own.stream().mapToInt(Factor::multiplicity).sum();
        }
        return Optional.of(sum);
      }
    }
    return Optional.empty();
  }

  private List<Polynomial> equations(Chain component, Chain w) {
    return closures.ideal(w).stream().filter(p -> !component.vanishes(p)).toList();
  }

  /** Loci of a factor that no leaf shows: not closed there, or not looked at yet. */
  private List<Locus> directly(
      Chain component, Factor f, List<Factor> determinant, List<Polynomial> blocks) {
    List<Polynomial> equations = new ArrayList<>(closures.ideal(component));
    equations.add(f.base());
    List<Locus> out = new ArrayList<>();
    for (Piece p : splitter.zeros(equations, List.of())) {
      if (p.chain().dimension() == component.dimension() - 1) {
        out.add(locus(component, p.chain(), determinant, blocks, algebra(p)));
      }
    }
    return out;
  }

  private Optional<BranchAlgebra> algebra(Piece piece) {
    return algebras.on(piece) instanceof Algebras.Closed closed
        ? Optional.of(closed.algebra())
        : Optional.empty();
  }
}
