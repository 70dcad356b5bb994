package rankfall.locus;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.stream.Collectors;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.Signature;

/**
 * The real regions of a stratum, as rows of a table.
 *
 * @param rows disjoint; by descending signature, then label, then text of the conditions
 * @param exact whether an exact decomposition established the rows
 * @param complete whether each cell lies in a row; else no signs were found that tell some apart
 */
public record Regions(List<Row> rows, boolean exact, boolean complete) {
  /** Copies the rows. */
  public Regions {
    rows = List.copyOf(rows);
  }

  /**
   * A polynomial compared with 0.
   *
   * @param polynomial primitive, leading coefficient positive
   * @param sign 1 or -1: whether it is positive or negative
   */
  public record Condition(Polynomial polynomial, int sign) {
    @Override
    public String toString() {
      return polynomial + (sign > 0 ? " > 0" : " < 0");
    }
  }

  /**
   * A row.
   *
   * @param conditions all hold; none follows from the others within the stratum and the domain
   * @param signature at all points of the stratum at which the conditions hold
   * @param label of all its cells
   * @param cells those in it
   * @param witness the one with the shortest coordinates
   */
  public record Row(
      List<Condition> conditions,
      Signature signature,
      String label,
      List<Cell> cells,
      Cell witness) {
    /** Copies the lists. */
    public Row {
      conditions = List.copyOf(conditions);
      cells = List.copyOf(cells);
    }

    private String text() {
      return conditions.stream().map(Condition::toString).collect(Collectors.joining("; "));
    }
  }

  /** What the cells of a row have in common. */
  private record Kind(Signature signature, String label) {}

  /**
   * Merges the cells of a stratum that have one signature and one label.
   *
   * @param family of a real ground
   * @param stratum with the leaves inside it
   * @param cells of the stratum
   * @param label names what lives in a cell; equal labels may share a row
   * @param meter ends the work early
   * @throws Meter.Exhausted if the budget is used up
   */
  public static Regions of(
      Family family,
      Strata.Stratum stratum,
      Cells cells,
      Function<Cell, String> label,
      Meter meter) {
    Map<Cell, Kind> kinds = new IdentityHashMap<>();
    cells.cells().forEach(c -> kinds.put(c, new Kind(c.signature(), label.apply(c))));
    SignTable table = SignTable.of(cells, kinds::get);
    List<List<Cell>> groups = new ArrayList<>(table.groups().values());
    Map<Kind, BitSet> targets =
        new TreeMap<>(
            Comparator.comparing((Kind k) -> -k.signature.plus())
                .thenComparing(k -> -k.signature.minus())
                .thenComparing(Kind::label));
    for (int k = 0; k < groups.size(); k++) {
      List<Kind> own = groups.get(k).stream().map(kinds::get).distinct().toList();
      if (own.size() == 1) {
        targets.computeIfAbsent(own.get(0), x -> new BitSet()).set(k);
      }
    }
    Merging merging =
        new Merging(new CellSearch(family, stratum, meter), label, table, cells.exact());
    List<Row> rows = new ArrayList<>();
    targets.forEach((kind, target) -> rows.addAll(merging.rows(kind, target)));
    int told = rows.stream().mapToInt(r -> r.cells.size()).sum();
    return new Regions(rows, cells.exact(), told >= cells.cells().size());
  }

  private record Merging(
      CellSearch search, Function<Cell, String> label, SignTable table, boolean exact) {
    private static final int MOST_PLACES = 10;

    List<Row> rows(Kind kind, BitSet target) {
      List<List<Integer>> vectors = new ArrayList<>(table.groups().keySet());
      List<Integer> costs = table.polynomials().stream().map(Merging::cost).toList();
      boolean closed = exact || costs.size() <= MOST_PLACES;
      if (!exact && closed) {
        addUnseen(vectors, costs.size());
      }
      ShortCover cover = new ShortCover(vectors, costs);
      List<Row> out = new ArrayList<>();
      for (ShortCover.Row r : closed ? cover.of(target) : cover.singles(target)) {
        out.add(row(kind, r));
      }
      out.sort(Comparator.comparing(Row::text));
      return out;
    }

    private static int cost(Polynomial p) {
      return Math.min(1000, 2 * p.totalDegree() + p.termCount());
    }

    /** Signs that no sample has may occur all the same: no row may hold for them. */
    private static void addUnseen(List<List<Integer>> vectors, int places) {
      List<List<Integer>> all = List.of(List.of());
      for (int p = 0; p < places; p++) {
        List<List<Integer>> longer = new ArrayList<>();
        for (List<Integer> v : all) {
          for (int sign : new int[] {1, -1}) {
            List<Integer> w = new ArrayList<>(v);
            w.add(sign);
            longer.add(w);
          }
        }
        all = longer;
      }
      all.stream().filter(v -> !vectors.contains(v)).forEach(vectors::add);
    }

    private Row row(Kind kind, ShortCover.Row r) {
      List<Condition> conditions = new ArrayList<>();
      for (ShortCover.Atom a : r.atoms()) {
        Polynomial product =
            a.places().stream()
                .map(table.polynomials()::get)
                .reduce(Polynomial::times)
                .orElseThrow();
        conditions.add(new Condition(product.primitive(), a.sign()));
      }
      conditions.sort(Comparator.comparing(Condition::polynomial, Chart.BY_SIZE));
      List<Cell> cells = new ArrayList<>();
      List<List<Cell>> groups = new ArrayList<>(table.groups().values());
      r.holds().stream().filter(k -> k < groups.size()).forEach(k -> cells.addAll(groups.get(k)));
      Cell witness = witness(kind, conditions, Witnesses.shortest(cells));
      if (!cells.contains(witness)) {
        cells.add(witness);
      }
      return new Row(conditions, kind.signature, kind.label, cells, witness);
    }

    /** A rational point in place of an irrational one, where one is found. */
    private Cell witness(Kind kind, List<Condition> conditions, Cell found) {
      if (found.point().rationalCoordinates().isPresent()) {
        return found;
      }
      return search
          .rational(p -> conditions.stream().allMatch(c -> p.sign(c.polynomial()) == c.sign))
          .map(p -> Cell.at(search.family(), search.stratum(), p))
          .filter(c -> new Kind(c.signature(), label.apply(c)).equals(kind))
          .orElse(found);
    }
  }
}
