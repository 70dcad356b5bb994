package rankfall;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.RegionMap.Axis;
import rankfall.RegionMap.Mark;
import rankfall.RegionMap.Place;
import rankfall.RegionMap.Spot;
import rankfall.RegionMap.Stretch;
import rankfall.exact.LineCells;
import rankfall.exact.PlanePoint;

/** Draws the cells of a line. */
final class MapLine {
  private static final BigFraction FINE = BigFraction.of(1, 1 << 16);

  private MapLine() {}

  /**
   * The picture of a line.
   *
   * @param slice what it shows
   * @param variable position of its coordinate
   * @param name name of its coordinate
   * @param places tells what lies where
   * @param cells the line, cut by the sets of the places
   * @param point a value that the picture must show
   */
  static RegionMap.Line of(
      RegionMap.Slice slice,
      int variable,
      String name,
      MapPlaces places,
      LineCells cells,
      BigFraction point) {
    List<BigFraction> shown = new ArrayList<>(List.of(BigFraction.ZERO, point));
    cells.points().forEach(p -> shown.add(about(p, variable)));
    Axis axis = MapWindow.axis(name, shown);
    List<Stretch> stretches = new ArrayList<>();
    List<Mark> marks = new ArrayList<>();
    double from = axis.from().doubleValue();
    Place before = places.of(cells.gaps().get(0));
    for (int k = 0; k < cells.points().size(); k++) {
      PlanePoint p = cells.points().get(k);
      Place here = places.of(p);
      Place after = places.of(cells.gaps().get(k + 1));
      double at = about(p, variable).doubleValue();
      if (!here.equals(before) || !here.equals(after)) {
        stretches.add(new Stretch(before, from, at));
        from = at;
        if (!here.equals(before) && !here.equals(after)) {
          marks.add(
              new Mark(
                  here, new Spot(at, 0), p.rational(variable).map(List::of).orElse(List.of())));
        }
      }
      before = after;
    }
    stretches.add(new Stretch(before, from, axis.to().doubleValue()));
    return new RegionMap.Line(slice, axis, stretches, marks);
  }

  private static BigFraction about(PlanePoint p, int variable) {
    return p.rational(variable).orElseGet(() -> p.within(variable, FINE).middle());
  }
}
