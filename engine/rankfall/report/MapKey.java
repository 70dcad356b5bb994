package rankfall.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import rankfall.AlgebraType;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Region;
import rankfall.Analysis.Stratum;
import rankfall.RegionMap;
import rankfall.RegionMap.Kind;
import rankfall.RegionMap.Place;

/**
 * What the places of all pictures of one page look like and are called: an area keeps its fill, a
 * curve its dashes in every picture.
 */
final class MapKey {
  /** Kinds of lines before they come back. */
  static final int LINES = 6;

  private final Findings findings;
  private final List<Place> filled;
  private final List<Place> drawn;
  private final List<Place> onLines;

  /** The key to the pictures of these findings. */
  MapKey(Findings findings) {
    this.findings = findings;
    this.filled =
        sorted(
            findings.maps().stream().flatMap(MapKey::areas).filter(p -> p.kind() == Kind.STRATUM));
    this.drawn =
        sorted(
            findings.maps().stream()
                .flatMap(m -> Stream.concat(lines(m), marks(m)))
                .filter(p -> p.kind() == Kind.STRATUM));
    this.onLines = findings.maps().stream().flatMap(MapKey::lines).distinct().toList();
  }

  private List<Place> sorted(Stream<Place> places) {
    return places.distinct().sorted(order()).toList();
  }

  /** As in the tables: strata, and regions in them; then what belongs to no stratum. */
  Comparator<Place> order() {
    List<String> strata = findings.strata().stream().map(Stratum::name).toList();
    List<String> regions = findings.regions().stream().map(r -> r.stratum() + r.name()).toList();
    return Comparator.comparing(Place::kind)
        .thenComparing(p -> strata.indexOf(p.stratum().orElse("")))
        .thenComparing(
            p -> p.region().map(r -> regions.indexOf(p.stratum().orElse("") + r)).orElse(-1));
  }

  /** Places of areas or stretches. */
  static Stream<Place> areas(RegionMap m) {
    if (m instanceof RegionMap.Plane p) {
      return p.areas().stream().map(RegionMap.Area::place);
    }
    return m instanceof RegionMap.Line l
        ? l.stretches().stream().map(RegionMap.Stretch::place)
        : Stream.empty();
  }

  /** Places of curves. */
  static Stream<Place> lines(RegionMap m) {
    return m instanceof RegionMap.Plane p
        ? p.arcs().stream().map(RegionMap.Arc::place)
        : Stream.empty();
  }

  /** Places of points. */
  static Stream<Place> marks(RegionMap m) {
    if (m instanceof RegionMap.Plane p) {
      return p.marks().stream().map(RegionMap.Mark::place);
    }
    return m instanceof RegionMap.Line l
        ? l.marks().stream().map(RegionMap.Mark::place)
        : Stream.empty();
  }

  /** The class of an area. */
  String fill(Place p) {
    int k = filled.indexOf(p);
    return k < 0 ? p.kind() == Kind.OUTSIDE ? "fill-outside" : "fill-none" : Palette.fill(k);
  }

  /** The class of a curve. */
  String line(Place p) {
    if (p.kind() != Kind.STRATUM) {
      return "line-none";
    }
    boolean border =
        p.region().isEmpty() && filled.stream().anyMatch(f -> f.stratum().equals(p.stratum()));
    return border ? "line-border" : "line-" + drawn.indexOf(p) % LINES;
  }

  /** How many places are areas in some picture. */
  int fills() {
    return filled.size();
  }

  /** Whether a place is an area in some picture. */
  boolean isFilled(Place p) {
    return filled.contains(p);
  }

  /** The short name that stands in a picture. */
  String name(Place p) {
    return switch (p.kind()) {
      case STRATUM ->
          p.stratum().orElseThrow()
              + p.region().filter(r -> isOneOfMany(p)).map(r -> " " + r).orElse("");
      case OUTSIDE -> "outside";
      case NOWHERE -> "no stratum";
    };
  }

  private boolean isOneOfMany(Place p) {
    return findings.regions().stream()
            .filter(r -> p.stratum().equals(Optional.of(r.stratum())))
            .count()
        > 1;
  }

  /** The row of a table that tells of a place; empty where there is none. */
  String target(Place p) {
    return p.stratum()
        .map(s -> p.region().map(r -> "region-" + s + "-" + r).orElse("stratum-" + s))
        .orElse("");
  }

  /**
   * How the place of a region is drawn: {@code area}, {@code curve} or {@code point}; may be none.
   */
  List<String> sorts(Place p) {
    List<String> out = new ArrayList<>();
    if (filled.contains(p)) {
      out.add("area");
    }
    if (onLines.contains(p)) {
      out.add("curve");
    }
    if (drawn.contains(p) && !onLines.contains(p)) {
      out.add("point");
    }
    return out;
  }

  Optional<Region> region(Place p) {
    return findings.regions().stream()
        .filter(r -> p.equals(Place.in(r.stratum(), Optional.of(r.name()))))
        .findFirst();
  }

  Optional<Stratum> stratum(Place p) {
    return findings.strata().stream()
        .filter(s -> p.stratum().equals(Optional.of(s.name())))
        .findFirst();
  }

  /**
   * What a place is, in words: signature and type of a region, else rank and class; names of
   * algebras as they travel.
   */
  String words(Place p) {
    if (p.kind() == Kind.OUTSIDE) {
      return "outside the conditions of the spec";
    }
    if (p.kind() == Kind.NOWHERE) {
      return "in no stratum: an entry has a pole, or there is no algebra";
    }
    List<String> out = new ArrayList<>();
    Optional<Region> region = region(p);
    region.ifPresent(r -> out.add("signature " + Words.signature(r.signature())));
    region.flatMap(Region::type).map(AlgebraType::text).ifPresent(out::add);
    if (region.isEmpty()) {
      stratum(p)
          .ifPresent(
              s -> {
                out.add("rank " + s.rank() + " of " + s.dimension());
                out.add(s.type().orElse(s.kind()));
              });
    }
    return String.join(", ", out);
  }
}
