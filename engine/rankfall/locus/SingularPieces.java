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

/**
 * The parts of a stratum at whose points its closure is singular.
 *
 * <p>Near a smooth real point the real points form a manifold of full dimension, on which no
 * polynomial vanishes that does not vanish on the whole closure. So every smooth real point lies in
 * the closure of the cells above an open dense set of free variables; a real point that does not is
 * singular (Bochnak, Coste, Roy 1998, Real Algebraic Geometry, prop. 3.3.10, place from memory).
 */
record SingularPieces(Strata.Stratum stratum, Cutter cutter, Meter meter) {

  /** Pieces that cover the singular points; together with others, perhaps. */
  List<Piece> all() {
    Chart general = new Chart(stratum.closure());
    List<Piece> out = new ArrayList<>();
    if (general.isSpace()) {
      return out;
    }
    Deque<Piece> open = new ArrayDeque<>();
    stratum.leaves().forEach(l -> open.add(l.piece()));
    while (!open.isEmpty()) {
      meter.branch();
      Piece p = open.poll();
      List<Polynomial> watched = new ArrayList<>(new Chart(p.chain()).separants());
      if (p.chain().dimension() < stratum.closure().dimension() && !isSmooth(p, watched)) {
        out.add(p);
      }
      open.addAll(cutter.cut(p, watched).cut());
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
