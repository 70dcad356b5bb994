package rankfall.locus;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Predicate;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.ConstantRoot;
import rankfall.exact.OpenCells;
import rankfall.exact.Polynomial;
import rankfall.exact.RealFibre;
import rankfall.exact.RealSample;
import rankfall.exact.Variables;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;

/**
 * The cells of a stratum above the free variables of an irreducible set inside it.
 *
 * @param family of a real ground
 * @param stratum where the points must lie
 * @param meter ends the work early
 */
record CellSearch(Family family, Strata.Stratum stratum, Meter meter) {
  private static final int MOST_CELLS = 2000;
  private static final int SAMPLES = 400;
  private static final int TRIES = 120;

  /** Parts of right triangles with integer sides: of use on circles and hyperbolas. */
  private static final List<BigFraction> PARTS =
      List.of(
          BigFraction.of(1),
          BigFraction.of(-1),
          BigFraction.of(0),
          BigFraction.of(3, 5),
          BigFraction.of(4, 5),
          BigFraction.of(-3, 5),
          BigFraction.of(-4, 5),
          BigFraction.of(5, 3),
          BigFraction.of(5, 4),
          BigFraction.of(3, 4),
          BigFraction.of(4, 3),
          BigFraction.of(-5, 3),
          BigFraction.of(-5, 4),
          BigFraction.of(-3, 4),
          BigFraction.of(-4, 3),
          BigFraction.of(2),
          BigFraction.of(-2),
          BigFraction.of(1, 2),
          BigFraction.of(-1, 2),
          BigFraction.of(5, 13),
          BigFraction.of(12, 13),
          BigFraction.of(-5, 13),
          BigFraction.of(-12, 13));

  private static final List<BigFraction> VALUES =
      List.of(
          BigFraction.of(1),
          BigFraction.of(-1),
          BigFraction.of(2),
          BigFraction.of(-2),
          BigFraction.of(1, 2),
          BigFraction.of(-1, 2),
          BigFraction.of(3),
          BigFraction.of(-3),
          BigFraction.of(1, 3),
          BigFraction.of(5),
          BigFraction.of(0));

  /**
   * What was found.
   *
   * @param points real points of the stratum in the domain
   * @param walls polynomials in the free variables; each keeps its sign on the cells
   * @param exact whether there is a point in every cell
   */
  record Found(List<RealSample> points, Set<Polynomial> walls, boolean exact) {
    /** Whether a polynomial is known to keep its sign on the cells. */
    boolean keepsSign(Chart chart, Polynomial p) {
      return chart.chain().vanishes(p) || walls.containsAll(chart.walls(p));
    }
  }

  /**
   * Points in the cells of a set.
   *
   * @param chain irreducible, its general point is one of the stratum or of an exclusion
   * @param invariant polynomials that are to keep their signs on the cells
   */
  Found in(Chain chain, Collection<Polynomial> invariant) {
    Chart chart = new Chart(chain);
    Set<Polynomial> walls = chart.ownWalls();
    for (List<Polynomial> exclusion : stratum.exclusions()) {
      Optional<Set<Polynomial>> own = walls(chart, exclusion);
      if (own.isEmpty()) {
        return new Found(List.of(), walls, true);
      }
      walls.addAll(own.get());
    }
    for (FamilyCondition c : family.domain()) {
      if (!chain.vanishes(c.polynomial())) {
        walls.addAll(chart.walls(c.polynomial()));
      } else if (!c.allows(0)) {
        return new Found(List.of(), walls, true);
      }
    }
    for (Polynomial p : invariant) {
      if (!chain.vanishes(p)) {
        walls.addAll(chart.walls(p));
      }
    }
    return decomposed(chart, walls);
  }

  /**
   * The walls of codimension one along which a closed set meets the chart; empty if it holds all of
   * it.
   */
  private static Optional<Set<Polynomial>> walls(Chart chart, List<Polynomial> exclusion) {
    Set<Polynomial> common = null;
    for (Polynomial e : exclusion) {
      if (!chart.chain().vanishes(e)) {
        Set<Polynomial> own = chart.walls(e);
        if (common == null) {
          common = own;
        } else {
          common.retainAll(own);
        }
      }
    }
    return Optional.ofNullable(common);
  }

  private Found decomposed(Chart chart, Set<Polynomial> given) {
    Set<Polynomial> walls = given;
    while (true) {
      meter.check();
      Variables ring = chart.chain().variables();
      Optional<OpenCells.Decomposition> cells =
          OpenCells.of(ring, List.copyOf(walls), chart.chain().freeVariables(), MOST_CELLS);
      if (cells.isEmpty()) {
        return sampled(chart, walls);
      }
      List<RealSample> points = new ArrayList<>();
      for (List<BigFraction> base : cells.get().points()) {
        meter.check();
        points.addAll(above(chart, base));
      }
      Set<Polynomial> missing = missing(chart, walls, points);
      if (missing.isEmpty()) {
        Set<Polynomial> all = new TreeSet<>(Chart.BY_SIZE);
        all.addAll(cells.get().walls());
        return new Found(points, all, true);
      }
      Set<Polynomial> more = new TreeSet<>(Chart.BY_SIZE);
      more.addAll(walls);
      more.addAll(missing);
      walls = more;
    }
  }

  /** Walls that keep points away from exclusions of higher codimension; none if none is met. */
  private Set<Polynomial> missing(Chart chart, Set<Polynomial> walls, List<RealSample> points) {
    for (List<Polynomial> exclusion : stratum.exclusions()) {
      if (points.stream().anyMatch(p -> holds(exclusion, p))) {
        for (Polynomial e : exclusion) {
          if (!chart.chain().vanishes(e)) {
            Set<Polynomial> own = chart.walls(e);
            if (!walls.containsAll(own)) {
              return own;
            }
          }
        }
        throw new IllegalStateException("a sample point on a wall: " + exclusion);
      }
    }
    return Set.of();
  }

  private static boolean holds(List<Polynomial> equations, RealSample point) {
    return equations.stream().allMatch(e -> point.sign(e) == 0);
  }

  private List<RealSample> above(Chart chart, List<BigFraction> base) {
    return new RealFibre(chart.chain(), numbers())
        .above(base).stream()
            .filter(p -> family.domain().stream().allMatch(c -> c.allows(p.sign(c.polynomial()))))
            .toList();
  }

  private Map<Integer, ConstantRoot> numbers() {
    Map<Integer, ConstantRoot> out = new HashMap<>();
    List<ConstantRoot> roots = family.ring().tower().roots();
    for (int k = 0; k < roots.size(); k++) {
      out.put(family.ring().constants().rules().get(k).variable(), roots.get(k));
    }
    return out;
  }

  /**
   * A point with rational coordinates, short ones if possible.
   *
   * @param wanted what it must satisfy
   * @return empty if none was found
   */
  Optional<RealSample> rational(Predicate<RealSample> wanted) {
    Chart chart = new Chart(stratum.closure());
    List<Integer> free = chart.chain().freeVariables();
    Random random = new Random(1);
    List<BigFraction> base =
        new ArrayList<>(Collections.nCopies(chart.chain().variables().count(), BigFraction.ZERO));
    for (int k = 0; k < TRIES; k++) {
      meter.check();
      int choices = Math.min(PARTS.size(), 3 + k / 4);
      for (int v : free) {
        base.set(v, PARTS.get(free.size() == 1 ? k % PARTS.size() : random.nextInt(choices)));
      }
      for (RealSample p : above(chart, base)) {
        if (p.rationalCoordinates().isPresent()
            && stratum.exclusions().stream().noneMatch(e -> holds(e, p))
            && wanted.test(p)) {
          return Optional.of(p);
        }
      }
      if (free.isEmpty() || (free.size() == 1 && k >= PARTS.size())) {
        break;
      }
    }
    return Optional.empty();
  }

  /** Points at seeded random values of the free variables, off all walls. */
  private Found sampled(Chart chart, Set<Polynomial> walls) {
    Random random = new Random(1);
    List<RealSample> points = new ArrayList<>();
    int count = chart.chain().variables().count();
    for (int k = 0; k < SAMPLES; k++) {
      meter.check();
      List<BigFraction> base = new ArrayList<>(Collections.nCopies(count, BigFraction.ZERO));
      int choices = Math.min(VALUES.size(), 2 + k / 8);
      for (int v : chart.chain().freeVariables()) {
        base.set(v, VALUES.get(random.nextInt(choices)));
      }
      if (walls.stream().allMatch(w -> w.at(base).signum() != 0)) {
        for (RealSample p : above(chart, base)) {
          if (stratum.exclusions().stream().noneMatch(e -> holds(e, p))) {
            points.add(p);
          }
        }
      }
    }
    return new Found(points, walls, false);
  }
}
