package rankfall.locus;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import rankfall.exact.ChainFactoring;
import rankfall.exact.Polynomial;
import rankfall.exact.RealSample;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;

/**
 * The real points of a stratum, cut into cells.
 *
 * <p>Every real point of the stratum within the domain lies in a cell, or in the closure of one
 * within the stratum: the cells are those above the open cells of the free variables (open
 * cylindrical decomposition), and those of the pieces at whose points the closure of the stratum is
 * singular or on the border of the domain. On the connected pieces of the stratum the signature is
 * constant, because the rank is.
 *
 * @param cells with a point each; none where the stratum has no real point in the domain
 * @param printed irreducible polynomials that bound the stratum or are walls given: their signs
 *     separate pieces
 * @param others more polynomials that keep their signs on the cells, shorter ones first, those of
 *     the exclusions before all
 * @param exact whether an exact decomposition gave all cells, else there were only sample points
 */
public record Cells(
    List<Cell> cells, List<Polynomial> printed, List<Polynomial> others, boolean exact) {
  /** Copies the lists. */
  public Cells {
    cells = List.copyOf(cells);
    printed = List.copyOf(printed);
    others = List.copyOf(others);
  }

  /**
   * The cells of a stratum.
   *
   * @param family of a real ground
   * @param stratum with the leaves inside it
   * @param walls polynomials that are to keep their signs on the cells besides what bounds the
   *     stratum and the domain
   * @param meter ends the work early
   * @throws Meter.Exhausted if the budget is used up
   */
  public static Cells of(
      Family family, Strata.Stratum stratum, List<Polynomial> walls, Meter meter) {
    Build build = new Build(family, stratum, new CellSearch(family, stratum, meter));
    List<Polynomial> printed = build.printed(walls);
    Cells plain = build.cells(printed, List.of(), meter);
    if (plain.exact() && SignTable.tells(plain, Cell::signature)) {
      return plain;
    }
    List<Polynomial> minors = KillingMinors.of(stratum.leaves().get(0));
    if (plain.exact()) {
      Cells finer = build.cells(printed, minors, meter);
      if (finer.exact()) {
        return finer;
      }
    }
    return build.cells(build.deciding(printed, minors), List.of(), meter);
  }

  private record Build(Family family, Strata.Stratum stratum, CellSearch search) {

    private List<Polynomial> factors(Polynomial p) {
      return stratum.closure().vanishes(p)
          ? List.of()
          : ChainFactoring.irreducible(family.ring().constants(), p);
    }

    List<Polynomial> printed(List<Polynomial> walls) {
      Set<Polynomial> out = new TreeSet<>(Chart.BY_SIZE);
      for (List<Polynomial> e : stratum.exclusions()) {
        if (e.size() == 1) {
          out.addAll(factors(e.get(0)));
        }
      }
      walls.forEach(w -> out.addAll(factors(w)));
      return List.copyOf(out);
    }

    /** With these the signature is known wherever none vanishes. */
    List<Polynomial> deciding(List<Polynomial> printed, List<Polynomial> minors) {
      Set<Polynomial> out = new TreeSet<>(Chart.BY_SIZE);
      out.addAll(printed);
      out.addAll(minors);
      stratum.closure().initials().forEach(p -> out.addAll(factors(p)));
      return List.copyOf(out);
    }

    Cells cells(List<Polynomial> printed, List<Polynomial> more, Meter meter) {
      Set<Polynomial> invariant = new LinkedHashSet<>(printed);
      invariant.addAll(more);
      CellSearch.Found found = search.in(stratum.closure(), invariant);
      List<Polynomial> others = others(found, more);
      others.removeAll(printed);
      boolean exact = found.exact();
      List<Cell> cells = new ArrayList<>();
      found.points().forEach(p -> cells.add(cell(p)));
      invariant.addAll(others);
      HiddenPieces hidden = new HiddenPieces(family, stratum, meter);
      exact &= hidden.isFeasible();
      for (Piece p : hidden.isFeasible() ? hidden.all() : List.<Piece>of()) {
        CellSearch.Found f = search.in(p.chain(), invariant);
        exact &= f.exact();
        f.points().forEach(x -> cells.add(cell(x)));
      }
      return new Cells(cells, printed, others, exact);
    }

    /** What else keeps its sign: factors of exclusions and of the domain, then walls by size. */
    private List<Polynomial> others(CellSearch.Found found, List<Polynomial> more) {
      Chart chart = new Chart(stratum.closure());
      Set<Polynomial> first = new TreeSet<>(Chart.BY_SIZE);
      for (List<Polynomial> e : stratum.exclusions()) {
        e.forEach(p -> first.addAll(factors(p)));
      }
      for (FamilyCondition c : family.domain()) {
        first.addAll(factors(c.polynomial()));
      }
      first.removeIf(p -> !found.keepsSign(chart, p));
      Set<Polynomial> out = new LinkedHashSet<>(first);
      Set<Polynomial> rest = new TreeSet<>(Chart.BY_SIZE);
      rest.addAll(more);
      stratum.closure().initials().forEach(p -> rest.addAll(factors(p)));
      rest.addAll(found.walls());
      rest.removeIf(p -> stratum.closure().vanishes(p) || !found.keepsSign(chart, p));
      out.addAll(rest);
      return new ArrayList<>(out);
    }

    private Cell cell(RealSample point) {
      return Cell.at(family, stratum, point);
    }
  }
}
