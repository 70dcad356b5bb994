package rankfall;

import java.util.List;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Coordinate;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * A picture of the parameters: which stratum and which real region lies where. What lies where was
 * decided by exact signs; positions are rounded, for drawing only.
 */
public sealed interface RegionMap permits RegionMap.Line, RegionMap.Plane, RegionMap.Missing {

  /** What a point of a picture can be. */
  enum Kind {
    /** A point of a stratum. */
    STRATUM,
    /** The conditions of the spec do not hold. */
    OUTSIDE,
    /** In no stratum: a pole, a span that is not closed, or Jacobi's identity fails. */
    NOWHERE
  }

  /**
   * Where a point belongs.
   *
   * @param kind whether it belongs to a stratum
   * @param stratum its name; empty unless it belongs to one
   * @param region name of its region; empty where regions are not known, or on a boundary of lower
   *     dimension
   */
  record Place(Kind kind, Optional<String> stratum, Optional<String> region) {
    /** A point of a stratum. */
    public static Place in(String stratum, Optional<String> region) {
      return new Place(Kind.STRATUM, Optional.of(stratum), region);
    }

    /** A point of no stratum. */
    public static Place of(Kind kind) {
      return new Place(kind, Optional.empty(), Optional.empty());
    }
  }

  /** A position, rounded; in the units of the axes. */
  record Spot(double x, double y) {}

  /**
   * An axis.
   *
   * @param variable its coordinate
   * @param from the left or lower end of the picture
   * @param to the right or upper end
   */
  record Axis(String variable, BigFraction from, BigFraction to) {}

  /**
   * A coordinate that follows from the others.
   *
   * @param variable the coordinate
   * @param value in the coordinates of the axes
   */
  record Dependent(String variable, RationalFunction value) {}

  /**
   * Which part of the parameters a picture shows.
   *
   * @param component number of the component of the parameter variety
   * @param held coordinates that have one value
   * @param dependent coordinates that follow from those of the axes
   */
  record Slice(int component, List<Coordinate> held, List<Dependent> dependent) {
    /** Copies the lists. */
    public Slice {
      held = List.copyOf(held);
      dependent = List.copyOf(dependent);
    }
  }

  /**
   * An open piece of the plane.
   *
   * @param place where its points belong
   * @param outline a polygon
   */
  record Area(Place place, List<Spot> outline) {
    /** Copies the outline. */
    public Area {
      outline = List.copyOf(outline);
    }
  }

  /**
   * A piece of a curve.
   *
   * @param place where its points belong
   * @param equation of the whole curve, in the coordinates of the axes; irreducible
   * @param line a polygonal line
   */
  record Arc(Place place, Polynomial equation, List<Spot> line) {
    /** Copies the line. */
    public Arc {
      line = List.copyOf(line);
    }
  }

  /**
   * A point that belongs to another place than what is around it.
   *
   * @param place where it belongs
   * @param spot its position; 0 for the second coordinate on a line
   * @param exact its coordinates, if they are rational; else empty
   */
  record Mark(Place place, Spot spot, List<BigFraction> exact) {
    /** Copies the coordinates. */
    public Mark {
      exact = List.copyOf(exact);
    }
  }

  /**
   * An open piece of a line.
   *
   * @param place where its points belong
   * @param from its left end
   * @param to its right end
   */
  record Stretch(Place place, double from, double to) {}

  /**
   * A line of one parameter.
   *
   * @param slice what is shown
   * @param across the axis
   * @param stretches from left to right
   * @param marks from left to right
   */
  record Line(Slice slice, Axis across, List<Stretch> stretches, List<Mark> marks)
      implements RegionMap {
    /** Copies the lists. */
    public Line {
      stretches = List.copyOf(stretches);
      marks = List.copyOf(marks);
    }
  }

  /**
   * A plane of two parameters.
   *
   * @param slice what is shown
   * @param across the horizontal axis
   * @param up the vertical axis
   * @param areas fill the window
   * @param arcs that differ from the areas beside them
   * @param marks points that differ from all around them
   */
  record Plane(
      Slice slice, Axis across, Axis up, List<Area> areas, List<Arc> arcs, List<Mark> marks)
      implements RegionMap {
    /** Copies the lists. */
    public Plane {
      areas = List.copyOf(areas);
      arcs = List.copyOf(arcs);
      marks = List.copyOf(marks);
    }
  }

  /**
   * No picture.
   *
   * @param reason a sentence
   */
  record Missing(String reason) implements RegionMap {}
}
