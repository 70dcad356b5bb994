package rankfall.locus;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.stream.Collectors;
import rankfall.exact.Polynomial;
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
   * Merges cells of one signature and one label.
   *
   * @param cells of a stratum
   * @param label names what lives in a cell; equal labels may share a row
   */
  public static Regions of(Cells cells, Function<Cell, String> label) {
    Map<Cell, Kind> kinds =
        cells.cells().stream()
            .distinct()
            .collect(Collectors.toMap(c -> c, c -> new Kind(c.signature(), label.apply(c))));
    SignTable table = SignTable.of(cells, kinds::get);
    List<List<Integer>> vectors = new ArrayList<>(table.groups().keySet());
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
    ShortCover cover =
        new ShortCover(vectors, table.polynomials().stream().map(Regions::cost).toList());
    List<Row> rows = new ArrayList<>();
    targets.forEach(
        (kind, target) -> {
          List<Row> own = new ArrayList<>();
          for (ShortCover.Row r : cover.of(target)) {
            own.add(row(kind, r, table.polynomials(), groups));
          }
          own.sort(Comparator.comparing(Row::text));
          rows.addAll(own);
        });
    return new Regions(rows, cells.exact(), table.pure());
  }

  private static int cost(Polynomial p) {
    return Math.min(1000, 2 * p.totalDegree() + p.termCount());
  }

  private static Row row(
      Kind kind, ShortCover.Row r, List<Polynomial> polynomials, List<List<Cell>> groups) {
    List<Condition> conditions = new ArrayList<>();
    for (ShortCover.Atom a : r.atoms()) {
      Polynomial product =
          a.places().stream().map(polynomials::get).reduce(Polynomial::times).orElseThrow();
      conditions.add(new Condition(product.primitive(), a.sign()));
    }
    conditions.sort(Comparator.comparing(Condition::polynomial, Chart.BY_SIZE));
    List<Cell> cells = new ArrayList<>();
    r.holds().stream().forEach(k -> cells.addAll(groups.get(k)));
    return new Row(conditions, kind.signature, kind.label, cells, Witnesses.shortest(cells));
  }
}
