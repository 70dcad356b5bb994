package rankfall.locus;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;

/**
 * The parts of a stratum where real points may lie that its open cells do not reach.
 *
 * <p>Near a smooth real point the real points form a manifold of full dimension, on which no
 * polynomial vanishes that does not vanish on the whole closure. So every smooth real point inside
 * the domain lies in the closure of the cells above an open dense set of free variables; others are
 * singular (Bochnak, Coste, Roy 1998, Real Algebraic Geometry, prop. 3.3.10, place from memory), or
 * they lie where a condition of the domain allows equality.
 *
 * @param family gives the domain
 * @param stratum with the leaves inside it
 * @param meter ends the work early
 */
record HiddenPieces(Family family, Strata.Stratum stratum, Meter meter) {

  private static final int MOST_DIMENSIONS = 3;

  /**
   * A piece to look at.
   *
   * @param borders whether it lies where conditions of the domain are equalities
   */
  private record Task(Piece piece, boolean borders) {}

  /**
   * Whether the search is not too long: curved surfaces of many dimensions and high degree are not
   * searched.
   */
  boolean isFeasible() {
    Chain chain = stratum.closure();
    List<Chain.Rule> numbers = ChainFactoring.numbers(chain);
    int degree =
        chain.tower().stream()
            .filter(r -> !numbers.contains(r))
            .mapToInt(Chain.Rule::degree)
            .reduce(1, (a, b) -> a * b);
    return chain.dimension() <= MOST_DIMENSIONS || degree <= 2;
  }

  /** Pieces that cover those points; together with others, perhaps. */
  List<Piece> all() {
    List<Polynomial> borders =
        family.domain().stream().filter(c -> c.allows(0)).map(c -> c.polynomial()).toList();
    List<Piece> out = new ArrayList<>();
    if (new Chart(stratum.closure()).isSpace() && borders.isEmpty()) {
      return out;
    }
    Chain constants = family.ring().constants();
    Cutter cutter = new Cutter(constants, meter);
    Splitter splitter = new Splitter(constants, meter);
    Deque<Task> open = new ArrayDeque<>();
    stratum.leaves().forEach(l -> open.add(new Task(l.piece(), false)));
    while (!open.isEmpty()) {
      meter.branch();
      Task t = open.poll();
      Chain chain = t.piece.chain();
      List<Polynomial> watched = new ArrayList<>(new Chart(chain).separants());
      boolean general = chain.dimension() == stratum.closure().dimension();
      if (t.borders || (!general && !isSmooth(t.piece, watched))) {
        out.add(t.piece);
      }
      for (Polynomial q : borders) {
        if (!chain.vanishes(q)) {
          splitter.within(t.piece, List.of(q), List.of()).forEach(p -> open.add(new Task(p, true)));
        }
      }
      cutter.cut(t.piece, watched).cut().forEach(p -> open.add(new Task(p, t.borders)));
    }
    return out;
  }

  /** The Jacobian criterion at the general point of a piece; its pivots are added. */
  private boolean isSmooth(Piece piece, List<Polynomial> watched) {
    Chain chain = piece.chain();
    List<Integer> numbers =
        ChainFactoring.numbers(chain).stream().map(Chain.Rule::variable).toList();
    int count = chain.variables().count();
    List<SortedMap<Integer, Polynomial>> rows = new ArrayList<>();
    for (Polynomial p : stratum.equations()) {
      List<Polynomial> gradient = new ArrayList<>();
      for (int v = 0; v < count; v++) {
        gradient.add(numbers.contains(v) ? chain.zero() : p.derivative(v));
      }
      List<Polynomial> reduced = chain.reduced(gradient);
      SortedMap<Integer, Polynomial> row = new TreeMap<>();
      for (int v = 0; v < count; v++) {
        if (!reduced.get(v).isZero()) {
          row.put(v, reduced.get(v));
        }
      }
      rows.add(row);
    }
    Echelon<Polynomial> e = Elimination.of(KnownNonZero.on(piece), rows, count);
    watched.addAll(e.nonVanishing());
    return e.rank() == count - numbers.size() - stratum.closure().dimension();
  }
}
