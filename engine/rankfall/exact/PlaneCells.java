package rankfall.exact;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * A plane cut into cells by closed sets: a cylindrical algebraic decomposition (Collins 1975) of
 * the whole plane, with the way the curves run from cell to cell.
 *
 * <p>Walls are the vertical lines above the zeros of the projection: leading coefficients,
 * discriminants and resultants of the curves, vertical lines among the curves, and the abscissae of
 * points. Between two walls the curves are graphs of continuous functions that do not meet. Where a
 * graph goes at a wall is found in a strip about the wall that is so narrow that no curve leaves
 * the stretch between two rational heights which part the points on the wall (Arnon, Collins,
 * McCallum 1984, in the spirit of their adjacency by strips).
 */
public final class PlaneCells {
  private static final int MOST_WALL_POLYNOMIALS = 150;
  private static final long MOST_COST = 20_000;
  private static final int MOST_NARROWINGS = 40;

  private final Plane plane;
  private final List<Polynomial> curves;
  private final List<List<Polynomial>> finite;
  private final Runnable clock;
  private final List<Wall> walls = new ArrayList<>();
  private final List<Column> columns = new ArrayList<>();

  /**
   * A plane.
   *
   * @param constants values of the algebraic numbers of the ring
   * @param x position of the first coordinate in the ring
   * @param y position of the second one
   */
  public record Plane(TowerPoint constants, int x, int y) {}

  /**
   * A point on a wall.
   *
   * @param at the point
   * @param curves numbers of the curves through it, vertical lines apart
   */
  public record Node(PlanePoint at, Set<Integer> curves) {
    /** Copies the set. */
    public Node {
      curves = Set.copyOf(curves);
    }
  }

  /**
   * A vertical line that bounds cells.
   *
   * @param at its point of the first axis
   * @param vertical whether it belongs to one of the sets itself
   * @param plain whether it can be left out: each node lies on one graph that passes through it
   * @param nodes the points of curves and of finite sets on it, ascending
   * @param gaps points between the nodes, below and above them; one more than nodes
   */
  public record Wall(
      PlanePoint at, boolean vertical, boolean plain, List<Node> nodes, List<PlanePoint> gaps) {
    /** Copies the lists. */
    public Wall {
      nodes = List.copyOf(nodes);
      gaps = List.copyOf(gaps);
    }
  }

  /**
   * The graph of a function between two walls.
   *
   * @param curve number of its curve
   * @param rank its place from 0 among the graphs of the same curve in this column
   * @param sample one of its points
   * @param left the node of the wall on the left to which it runs: -1 for one that falls below all
   *     bounds, the number of nodes for one that rises above all; 0 where there is no wall
   * @param right the same on the right
   */
  public record Branch(int curve, int rank, PlanePoint sample, int left, int right) {}

  /**
   * The stretch between two walls.
   *
   * @param sample a value of the first coordinate
   * @param branches the graphs, ascending
   * @param cells a point of each cell between them, ascending; one more than graphs
   */
  public record Column(BigFraction sample, List<Branch> branches, List<PlanePoint> cells) {
    /** Copies the lists. */
    public Column {
      branches = List.copyOf(branches);
      cells = List.copyOf(cells);
    }
  }

  private PlaneCells(Plane plane, PlaneSets sets, Runnable clock) {
    this.plane = plane;
    this.curves = sets.curves();
    this.finite = sets.finite();
    this.clock = clock;
  }

  /**
   * Cuts a plane.
   *
   * @param plane the plane
   * @param sets closed sets, each by equations in the two coordinates and the constants; a set
   *     without equations, or with vanishing ones only, cuts nothing
   * @param clock is asked between steps, and may throw
   * @return empty where the projection grows too large
   */
  public static Optional<PlaneCells> of(Plane plane, List<List<Polynomial>> sets, Runnable clock) {
    PlaneSets taken = PlaneSets.of(plane.constants.chain(), plane.y, sets);
    PlaneCells cells = new PlaneCells(plane, taken, clock);
    Optional<Set<Polynomial>> projection = cells.projection(taken.abscissae());
    if (projection.isEmpty()) {
      return Optional.empty();
    }
    return cells.cut(projection.get()) ? Optional.of(cells) : Optional.empty();
  }

  private Chain numbers() {
    return plane.constants.chain();
  }

  private Optional<Set<Polynomial>> projection(List<Polynomial> abscissae) {
    List<Polynomial> raw = new ArrayList<>(abscissae);
    List<Polynomial> upper = new ArrayList<>();
    for (Polynomial f : curves) {
      clock.run();
      if (!f.contains(plane.y)) {
        raw.add(f);
        continue;
      }
      raw.add(f.coefficient(plane.y, f.degree(plane.y)));
      if (cost(f, f) > MOST_COST) {
        return Optional.empty();
      }
      if (f.degree(plane.y) > 1) {
        raw.add(f.resultant(f.derivative(plane.y), plane.y));
      }
      for (Polynomial g : upper) {
        if (cost(f, g) > MOST_COST) {
          return Optional.empty();
        }
        raw.add(f.resultant(g, plane.y));
      }
      upper.add(f);
    }
    Set<Polynomial> out = new LinkedHashSet<>();
    for (Polynomial p : raw) {
      clock.run();
      out.addAll(
          ChainFactoring.irreducible(numbers(), numbers().reduced(p)).stream()
              .filter(q -> q.contains(plane.x))
              .toList());
    }
    return out.size() > MOST_WALL_POLYNOMIALS ? Optional.empty() : Optional.of(out);
  }

  private long cost(Polynomial f, Polynomial g) {
    return (long) f.termCount() * g.termCount() * f.degree(plane.y) * g.degree(plane.y);
  }

  private boolean cut(Set<Polynomial> projection) {
    List<PlanePoint> at = new ArrayList<>();
    for (Polynomial p : projection) {
      at.addAll(PlanePoint.of(plane.constants).with(new Chain.Rule(plane.x, p)));
    }
    at.sort((a, b) -> a == b ? 0 : a.compareDifferent(plane.x, b));
    List<BigFraction> samples = PlaneFibre.between(plane.x, at);
    List<List<PlaneFibre.Node>> graphs = new ArrayList<>();
    for (BigFraction s : samples) {
      clock.run();
      graphs.add(
          PlaneFibre.nodes(
              PlanePoint.of(plane.constants).with(plane.x, s), plane.y, curves, List.of()));
    }
    List<List<Integer>> toLeft = new ArrayList<>();
    List<List<Integer>> toRight = new ArrayList<>();
    toLeft.add(List.of());
    for (int k = 0; k < at.size(); k++) {
      clock.run();
      List<PlaneFibre.Node> fibre = PlaneFibre.nodes(at.get(k), plane.y, curves, finite);
      List<BigFraction> gaps =
          PlaneFibre.between(plane.y, fibre.stream().map(PlaneFibre.Node::at).toList());
      Optional<Interval> strip = strip(at.get(k), samples.get(k), samples.get(k + 1), gaps);
      if (strip.isEmpty()) {
        return false;
      }
      toRight.add(ends(strip.get().lower(), gaps));
      toLeft.add(ends(strip.get().upper(), gaps));
      walls.add(
          wall(
              at.get(k),
              fibre,
              gaps,
              kinds(graphs.get(k)),
              toRight.get(k),
              kinds(graphs.get(k + 1)),
              toLeft.get(k + 1)));
    }
    toRight.add(List.of());
    for (int k = 0; k < samples.size(); k++) {
      columns.add(column(samples.get(k), graphs.get(k), toLeft.get(k), toRight.get(k)));
    }
    return true;
  }

  private static List<Integer> kinds(List<PlaneFibre.Node> graphs) {
    return graphs.stream().map(n -> n.curves().iterator().next()).toList();
  }

  /** An interval about a wall between whose ends no curve takes one of the heights. */
  private Optional<Interval> strip(
      PlanePoint wall, BigFraction before, BigFraction after, List<BigFraction> heights) {
    List<RealRoots> crossings = new ArrayList<>();
    for (Polynomial f : curves) {
      for (BigFraction h : heights) {
        if (f.contains(plane.y)) {
          Polynomial p = norm(at(f, plane.y, h));
          if (p.contains(plane.x)) {
            crossings.add(RealRoots.of(p));
          }
        }
      }
    }
    BigFraction width = BigFraction.ONE;
    for (int k = 0; k < MOST_NARROWINGS; k++) {
      Interval i = wall.within(plane.x, width);
      Interval strip = new Interval(i.lower().subtract(width), i.upper().add(width));
      if (Rationals.compare(before, strip.lower()) <= 0
          && Rationals.compare(strip.upper(), after) <= 0
          && crossings.stream().allMatch(r -> r.countIn(strip) == 0)) {
        return Optional.of(strip);
      }
      width = width.divide(4);
    }
    return Optional.empty();
  }

  private Polynomial at(Polynomial p, int variable, BigFraction value) {
    return PlanePoint.of(plane.constants).with(variable, value).placed(p);
  }

  /** A polynomial over the rationals that vanishes where p does. */
  private Polynomial norm(Polynomial p) {
    Polynomial n = p;
    List<Chain.Rule> tower = numbers().tower();
    for (int k = tower.size() - 1; k >= 0; k--) {
      Chain.Rule r = tower.get(k);
      n = n.contains(r.variable()) ? n.resultant(r.equation(), r.variable()) : n;
    }
    return n;
  }

  /** For each graph at an abscissa beside a wall, ascending, the stretch in which it lies. */
  private List<Integer> ends(BigFraction x, List<BigFraction> gaps) {
    List<Integer> out = new ArrayList<>();
    if (numbers().rules().isEmpty()) {
      for (Polynomial f : curves) {
        if (f.contains(plane.y)) {
          RealRoots r = RealRoots.of(at(f, plane.x, x));
          for (int k = 0; k < r.count(); k++) {
            int root = k;
            out.add((int) gaps.stream().filter(g -> r.compare(root, g) > 0).count() - 1);
          }
        }
      }
    } else {
      PlanePoint base = PlanePoint.of(plane.constants).with(plane.x, x);
      for (PlaneFibre.Node n : PlaneFibre.nodes(base, plane.y, curves, List.of())) {
        out.add((int) gaps.stream().filter(g -> n.at().compare(plane.y, g) > 0).count() - 1);
      }
    }
    out.sort(null);
    return out;
  }

  private Wall wall(
      PlanePoint at,
      List<PlaneFibre.Node> fibre,
      List<BigFraction> gaps,
      List<Integer> kindsBefore,
      List<Integer> endsBefore,
      List<Integer> kindsAfter,
      List<Integer> endsAfter) {
    boolean vertical = curves.stream().anyMatch(f -> !f.contains(plane.y) && at.sign(f) == 0);
    List<Integer> each = IntStream.range(0, fibre.size()).boxed().toList();
    boolean plain =
        !vertical
            && kindsBefore.equals(kindsAfter)
            && endsBefore.equals(each)
            && endsAfter.equals(each)
            && fibre.stream().noneMatch(PlaneFibre.Node::marked);
    return new Wall(
        at,
        vertical,
        plain,
        fibre.stream().map(n -> new Node(n.at(), n.curves())).toList(),
        gaps.stream().map(g -> at.with(plane.y, g)).toList());
  }

  private Column column(
      BigFraction sample,
      List<PlaneFibre.Node> graphs,
      List<Integer> toLeft,
      List<Integer> toRight) {
    int[] seen = new int[curves.size()];
    List<Branch> branches = new ArrayList<>();
    for (int k = 0; k < graphs.size(); k++) {
      int curve = graphs.get(k).curves().iterator().next();
      branches.add(
          new Branch(
              curve,
              seen[curve]++,
              graphs.get(k).at(),
              toLeft.isEmpty() ? 0 : toLeft.get(k),
              toRight.isEmpty() ? 0 : toRight.get(k)));
    }
    List<PlanePoint> cells =
        PlaneFibre.between(plane.y, graphs.stream().map(PlaneFibre.Node::at).toList()).stream()
            .map(h -> PlanePoint.of(plane.constants).with(plane.x, sample).with(plane.y, h))
            .toList();
    return new Column(sample, branches, cells);
  }

  /** {@return the plane} */
  public Plane plane() {
    return plane;
  }

  /** {@return the curves, irreducible; vertical lines among them} */
  public List<Polynomial> curves() {
    return curves;
  }

  /** {@return the walls from left to right} */
  public List<Wall> walls() {
    return List.copyOf(walls);
  }

  /** {@return the stretches between them, one more than walls} */
  public List<Column> columns() {
    return List.copyOf(columns);
  }
}
