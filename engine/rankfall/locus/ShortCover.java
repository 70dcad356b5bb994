package rankfall.locus;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A set of sign vectors as a disjoint union of few sets, each given by few sign conditions.
 *
 * <p>A condition asks one place of the vector, or the product of two, to be positive or negative. A
 * conjunction that holds for no vector outside the set is an implicant (Quine 1952, The Problem of
 * Simplifying Truth Functions); among its writings the shortest is kept, so no condition of it
 * follows from the others.
 */
final class ShortCover {
  private static final int MOST_SETS = 6000;
  private static final int MOST_NODES = 20_000;
  private static final int MOST_ROWS = 6;

  /** Two conditions on one polynomial each are shorter than one on a product. */
  private static final int SINGLE = 40;

  private static final int PRODUCT = 100;

  private final List<List<Integer>> vectors;
  private final List<Integer> costs;
  private final List<Atom> atoms = new ArrayList<>();
  private int nodes;

  /**
   * A condition.
   *
   * @param places one or two places of the vectors, ascending
   * @param sign of their product, 1 or -1
   */
  record Atom(List<Integer> places, int sign) {
    boolean holds(List<Integer> vector) {
      int product = 1;
      for (int p : places) {
        product *= vector.get(p);
      }
      return product == sign;
    }
  }

  /**
   * A conjunction.
   *
   * @param atoms none follows from the others
   * @param holds positions of the vectors for which all hold
   * @param cost smaller is shorter
   */
  record Row(List<Atom> atoms, BitSet holds, int cost) {}

  /**
   * Prepares a search.
   *
   * @param vectors different, of one length
   * @param costs of the places: how long a condition is
   */
  ShortCover(List<List<Integer>> vectors, List<Integer> costs) {
    this.vectors = List.copyOf(vectors);
    this.costs = List.copyOf(costs);
    for (int i = 0; i < costs.size(); i++) {
      for (int sign : new int[] {1, -1}) {
        atoms.add(new Atom(List.of(i), sign));
      }
    }
    for (int i = 0; i < costs.size(); i++) {
      for (int j = i + 1; j < costs.size(); j++) {
        for (int sign : new int[] {1, -1}) {
          atoms.add(new Atom(List.of(i, j), sign));
        }
      }
    }
  }

  private int cost(Atom a) {
    int base = a.places.size() == 1 ? SINGLE : PRODUCT;
    return base + a.places.stream().mapToInt(costs::get).sum();
  }

  private BitSet extent(Atom a) {
    BitSet out = new BitSet();
    for (int k = 0; k < vectors.size(); k++) {
      if (a.holds(vectors.get(k))) {
        out.set(k);
      }
    }
    return out;
  }

  /**
   * A cover of a set, by disjoint rows.
   *
   * @param target positions of vectors
   * @return few rows, short ones; they leave out what no conditions tell from other vectors
   */
  List<Row> of(BitSet target) {
    if (target.isEmpty()) {
      return List.of();
    }
    List<Row> implicants = implicants(target);
    for (int rows = 1; rows <= MOST_ROWS; rows++) {
      nodes = 0;
      Optional<List<Row>> best = search(implicants, target, rows, Integer.MAX_VALUE);
      if (best.isPresent()) {
        return best.get();
      }
    }
    return greedy(implicants, target);
  }

  /** All conjunctions within the target, the shortest for each set; by cost. */
  private List<Row> implicants(BitSet target) {
    BitSet all = new BitSet();
    all.set(0, vectors.size());
    List<BitSet> extents = atoms.stream().map(this::extent).toList();
    Map<BitSet, Row> seen = new LinkedHashMap<>();
    Map<BitSet, Row> found = new LinkedHashMap<>();
    List<Row> open = new ArrayList<>(List.of(new Row(List.of(), all, 0)));
    seen.put(all, open.get(0));
    while (!open.isEmpty()) {
      Map<BitSet, Row> next = new LinkedHashMap<>();
      for (Row r : open) {
        if (isInside(r.holds, target)) {
          found.put(r.holds, r);
        } else if (seen.size() < MOST_SETS) {
          extend(r, extents, target, seen, next);
        }
      }
      seen.putAll(next);
      open = new ArrayList<>(next.values());
    }
    for (int k = target.nextSetBit(0); k >= 0; k = target.nextSetBit(k + 1)) {
      Row own = single(k, extents);
      if (isInside(own.holds, target)) {
        found.putIfAbsent(own.holds, own);
      }
    }
    List<Row> out = new ArrayList<>(found.values());
    out.sort(Comparator.comparingInt(Row::cost).thenComparing(r -> r.atoms.toString()));
    return out;
  }

  private static boolean isInside(BitSet a, BitSet b) {
    BitSet rest = (BitSet) a.clone();
    rest.andNot(b);
    return rest.isEmpty();
  }

  private void extend(
      Row r, List<BitSet> extents, BitSet target, Map<BitSet, Row> seen, Map<BitSet, Row> next) {
    for (int k = 0; k < atoms.size(); k++) {
      BitSet set = (BitSet) r.holds.clone();
      set.and(extents.get(k));
      if (set.equals(r.holds) || !set.intersects(target) || seen.containsKey(set)) {
        continue;
      }
      int cost = r.cost + cost(atoms.get(k));
      Row before = next.get(set);
      if (before == null || cost < before.cost) {
        List<Atom> more = new ArrayList<>(r.atoms);
        more.add(atoms.get(k));
        next.put(set, new Row(List.copyOf(more), set, cost));
      }
    }
  }

  /** The vector, and all that differ from it at its zeros only: all its signs told. */
  private Row single(int k, List<BitSet> extents) {
    List<Atom> all = new ArrayList<>();
    BitSet holds = new BitSet();
    holds.set(0, vectors.size());
    int cost = 0;
    for (int at = 0; at < 2 * costs.size(); at++) {
      Atom a = atoms.get(at);
      if (a.holds(vectors.get(k))) {
        all.add(a);
        holds.and(extents.get(at));
        cost += cost(a);
      }
    }
    return new Row(List.copyOf(all), holds, cost);
  }

  /** Each vector of a set by all its signs, for a list of vectors that may not be complete. */
  List<Row> singles(BitSet target) {
    List<BitSet> extents = atoms.stream().map(this::extent).toList();
    return target.stream().mapToObj(k -> single(k, extents)).toList();
  }

  /** The cheapest cover of what is left by exactly some number of disjoint rows. */
  private Optional<List<Row>> search(List<Row> rows, BitSet left, int count, int limit) {
    if (left.isEmpty()) {
      return count == 0 ? Optional.of(List.of()) : Optional.empty();
    }
    if (count == 0 || ++nodes > MOST_NODES) {
      return Optional.empty();
    }
    int first = left.nextSetBit(0);
    Optional<List<Row>> best = Optional.empty();
    int least = limit;
    for (Row r : rows) {
      if (r.cost >= least) {
        break;
      }
      if (r.holds.get(first) && isInside(r.holds, left)) {
        BitSet rest = (BitSet) left.clone();
        rest.andNot(r.holds);
        Optional<List<Row>> more = search(rows, rest, count - 1, least - r.cost);
        if (more.isPresent()) {
          List<Row> all = new ArrayList<>(List.of(r));
          all.addAll(more.get());
          best = Optional.of(all);
          least = all.stream().mapToInt(Row::cost).sum();
        }
      }
    }
    return best;
  }

  /** The largest row that fits, again and again, as long as there is one. */
  private static List<Row> greedy(List<Row> rows, BitSet target) {
    BitSet left = (BitSet) target.clone();
    List<Row> out = new ArrayList<>();
    Row best = null;
    do {
      best = null;
      for (Row r : rows) {
        if (isInside(r.holds, left)
            && (best == null || r.holds.cardinality() > best.holds.cardinality())) {
          best = r;
        }
      }
      if (best != null) {
        out.add(best);
        left.andNot(best.holds);
      }
    } while (best != null && !left.isEmpty());
    return out;
  }
}
