package rankfall.exact;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * Rational points in every full-dimensional cell of the complement of hypersurfaces.
 *
 * <p>Open cylindrical algebraic decomposition: projection by leading coefficients, discriminants
 * and resultants (Collins 1975; McCallum 1988; Brown 2001), lifting by rational points between
 * isolated real roots (Strzebonski 2000). Over a cell of the projection the real roots neither meet
 * nor run to infinity, so every connected piece of the complement holds one of the points.
 */
public final class OpenCells {
  private static final int MOST_POLYNOMIALS = 120;
  private static final long MOST_COST = 100_000;

  private OpenCells() {}

  /**
   * A decomposition.
   *
   * @param points with one value a variable of the ring, 0 for those that are no coordinates; at
   *     least one in every connected piece of the complement
   * @param walls irreducible polynomials, those given and those of the projections: none vanishes
   *     in a cell, so each has one sign there
   */
  public record Decomposition(List<List<BigFraction>> points, List<Polynomial> walls) {
    /** Copies the lists. */
    public Decomposition {
      points = List.copyOf(points);
      walls = List.copyOf(walls);
    }
  }

  /**
   * Decomposes the complement of hypersurfaces into open cells.
   *
   * @param ring the ring of the polynomials
   * @param polynomials none 0
   * @param variables positions of the coordinates of the space; all that occur in the polynomials
   * @param most number of points that is not to be passed
   * @return a point in each cell; empty where the bound, or a bound on the size of the projection,
   *     would be passed
   */
  public static Optional<Decomposition> of(
      Variables ring, List<Polynomial> polynomials, List<Integer> variables, int most) {
    return lifted(ring, irreducible(polynomials), variables, most);
  }

  /** The points of {@link #of}. */
  static Optional<List<List<BigFraction>>> samples(
      Variables ring, List<Polynomial> polynomials, List<Integer> variables, int most) {
    return of(ring, polynomials, variables, most).map(Decomposition::points);
  }

  /**
   * The projection along one variable: off its zeros the real roots in this variable stay apart.
   *
   * @param polynomials irreducible and different
   * @param variable the one to project away
   * @return irreducible polynomials without it; empty if they grow too great
   */
  static Optional<List<Polynomial>> projection(List<Polynomial> polynomials, int variable) {
    List<Polynomial> out = new ArrayList<>();
    List<Polynomial> upper = new ArrayList<>();
    for (Polynomial p : polynomials) {
      (p.contains(variable) ? upper : out).add(p);
    }
    for (int k = 0; k < upper.size(); k++) {
      Polynomial f = upper.get(k);
      int d = f.degree(variable);
      if (cost(f, f, variable) > MOST_COST) {
        return Optional.empty();
      }
      out.add(f.coefficient(variable, d));
      if (d > 1) {
        out.add(f.resultant(f.derivative(variable), variable));
      }
      for (int j = 0; j < k; j++) {
        if (cost(f, upper.get(j), variable) > MOST_COST) {
          return Optional.empty();
        }
        out.add(f.resultant(upper.get(j), variable));
      }
    }
    List<Polynomial> small = irreducible(out);
    return small.size() > MOST_POLYNOMIALS ? Optional.empty() : Optional.of(small);
  }

  private static long cost(Polynomial f, Polynomial g, int variable) {
    return (long) f.termCount() * g.termCount() * f.degree(variable) * g.degree(variable);
  }

  /** The different irreducible factors, in the order of their text. */
  static List<Polynomial> irreducible(List<Polynomial> polynomials) {
    Set<Polynomial> out = new LinkedHashSet<>();
    for (Polynomial p : polynomials) {
      out.addAll(Factoring.irreducible(p));
    }
    return out.stream().sorted(Comparator.comparing(Polynomial::toString)).toList();
  }

  private static Optional<Decomposition> lifted(
      Variables ring, List<Polynomial> polynomials, List<Integer> variables, int most) {
    if (variables.isEmpty()) {
      List<BigFraction> origin = Collections.nCopies(ring.count(), BigFraction.ZERO);
      return Optional.of(new Decomposition(List.of(origin), polynomials));
    }
    int v = cheapest(polynomials, variables);
    List<Integer> rest = variables.stream().filter(w -> w != v).toList();
    Optional<Decomposition> below =
        projection(polynomials, v).flatMap(p -> lifted(ring, p, rest, most));
    if (below.isEmpty()) {
      return below;
    }
    List<Polynomial> upper = polynomials.stream().filter(p -> p.contains(v)).toList();
    List<List<BigFraction>> out = new ArrayList<>();
    for (List<BigFraction> point : below.get().points()) {
      for (BigFraction x : between(roots(upper, point, v))) {
        List<BigFraction> q = new ArrayList<>(point);
        q.set(v, x);
        out.add(Collections.unmodifiableList(q));
      }
      if (out.size() > most) {
        return Optional.empty();
      }
    }
    Set<Polynomial> walls = new LinkedHashSet<>(polynomials);
    walls.addAll(below.get().walls());
    return Optional.of(new Decomposition(out, List.copyOf(walls)));
  }

  private static int cheapest(List<Polynomial> polynomials, List<Integer> variables) {
    return variables.stream()
        .min(
            Comparator.comparingInt(
                    (Integer v) -> polynomials.stream().mapToInt(p -> p.degree(v)).sum())
                .thenComparing(Comparator.reverseOrder()))
        .orElseThrow();
  }

  /** The real roots in one variable of polynomials at a point, each once, ascending. */
  static List<AlgebraicNumber> roots(List<Polynomial> upper, List<BigFraction> point, int v) {
    Set<AlgebraicNumber> out = new LinkedHashSet<>();
    for (Polynomial p : upper) {
      Polynomial f = at(p, point, v);
      if (!f.isZero()) {
        out.addAll(AlgebraicNumber.rootsOf(f));
      }
    }
    return out.stream().sorted().toList();
  }

  /** A positive multiple of the polynomial at a point, one variable kept. */
  static Polynomial at(Polynomial p, List<BigFraction> point, int kept) {
    List<Optional<BigFraction>> some =
        IntStream.range(0, point.size())
            .mapToObj(k -> k == kept ? Optional.<BigFraction>empty() : Optional.of(point.get(k)))
            .toList();
    return p.partlyAt(some).numerator();
  }

  /** Rational numbers below, between and above numbers in ascending order. */
  private static List<BigFraction> between(List<AlgebraicNumber> roots) {
    if (roots.isEmpty()) {
      return List.of(BigFraction.ZERO);
    }
    List<BigFraction> out = new ArrayList<>();
    out.add(BigFraction.of(roots.get(0).floor()).subtract(BigFraction.ONE));
    for (int k = 1; k < roots.size(); k++) {
      out.add(AlgebraicNumber.between(roots.get(k - 1), roots.get(k)));
    }
    out.add(BigFraction.of(roots.get(roots.size() - 1).ceil()).add(BigFraction.ONE));
    return out;
  }
}
