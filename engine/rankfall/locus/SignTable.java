package rankfall.locus;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import rankfall.exact.Polynomial;

/**
 * Cells by the signs of some polynomials.
 *
 * @param polynomials enough to tell the classes of the cells apart, if any are
 * @param groups the cells by their signs, one sign a polynomial: -1, 0 or 1
 * @param pure whether all cells of a group are of one class
 */
record SignTable(
    List<Polynomial> polynomials, Map<List<Integer>, List<Cell>> groups, boolean pure) {

  /** Whether polynomials that keep their signs on the cells tell the classes apart. */
  static boolean tells(Cells cells, Function<Cell, ?> classOf) {
    return of(cells, classOf).pure;
  }

  /**
   * Groups cells: by all polynomials that bound the stratum and are not of one sign, then by as few
   * others as are needed to tell the classes apart. Of cells that are samples only, signs that
   * agree prove nothing: these are grouped by all polynomials that bound the stratum.
   */
  static SignTable of(Cells cells, Function<Cell, ?> classOf) {
    if (!cells.exact()) {
      List<Object> kinds = new ArrayList<>();
      cells.cells().forEach(c -> kinds.add(classOf.apply(c)));
      List<Column> all = cells.printed().stream().map(p -> column(p, cells)).toList();
      return table(all, cells, impure(all, kinds) == 0);
    }
    List<Column> printed = columns(cells.printed(), cells, Set.of());
    Set<List<Integer>> known = new HashSet<>();
    printed.forEach(c -> known.add(c.signs));
    List<Column> chosen = new ArrayList<>(printed);
    List<Column> others = columns(cells.others(), cells, known);
    List<Object> classes = new ArrayList<>();
    cells.cells().forEach(c -> classes.add(classOf.apply(c)));
    while (impure(chosen, classes) > 0) {
      Column best = null;
      int least = Integer.MAX_VALUE;
      for (Column c : others) {
        List<Column> with = new ArrayList<>(chosen);
        with.add(c);
        int left = impure(with, classes);
        if (left < least && splits(chosen, c, classes)) {
          best = c;
          least = left;
        }
      }
      if (best == null) {
        break;
      }
      chosen.add(best);
      others.remove(best);
    }
    return table(chosen, cells, impure(chosen, classes) == 0);
  }

  /** A polynomial and its signs at the cells, the first of which is not negative. */
  private record Column(Polynomial polynomial, List<Integer> signs) {}

  private static Column column(Polynomial p, Cells cells) {
    return new Column(p, cells.cells().stream().map(c -> c.point().sign(p)).toList());
  }

  private static List<Column> columns(
      List<Polynomial> polynomials, Cells cells, Set<List<Integer>> known) {
    List<Column> out = new ArrayList<>();
    Set<List<Integer>> seen = new HashSet<>(known);
    for (Polynomial p : polynomials) {
      List<Integer> signs = column(p, cells).signs;
      List<Integer> negative = signs.stream().map(s -> -s).toList();
      boolean one = signs.stream().distinct().count() < 2;
      if (!one && !seen.contains(negative) && seen.add(signs)) {
        out.add(new Column(p, signs));
      }
    }
    return out;
  }

  private static Map<List<Integer>, List<Integer>> grouped(List<Column> columns, int cells) {
    Map<List<Integer>, List<Integer>> out = new LinkedHashMap<>();
    for (int k = 0; k < cells; k++) {
      int at = k;
      List<Integer> key = columns.stream().map(c -> c.signs.get(at)).toList();
      out.computeIfAbsent(key, x -> new ArrayList<>()).add(k);
    }
    return out;
  }

  private static boolean isPure(List<Integer> group, List<Object> classes) {
    return group.stream().map(classes::get).distinct().count() < 2;
  }

  /** The number of cells in groups of several classes. */
  private static int impure(List<Column> columns, List<Object> classes) {
    return grouped(columns, classes.size()).values().stream()
        .filter(g -> !isPure(g, classes))
        .mapToInt(List::size)
        .sum();
  }

  private static boolean splits(List<Column> columns, Column c, List<Object> classes) {
    return grouped(columns, classes.size()).values().stream()
        .filter(g -> !isPure(g, classes))
        .anyMatch(g -> g.stream().map(c.signs::get).distinct().count() > 1);
  }

  private static SignTable table(List<Column> columns, Cells cells, boolean pure) {
    Map<List<Integer>, List<Cell>> out = new LinkedHashMap<>();
    grouped(columns, cells.cells().size())
        .forEach((key, g) -> out.put(key, g.stream().map(cells.cells()::get).toList()));
    return new SignTable(columns.stream().map(Column::polynomial).toList(), out, pure);
  }
}
