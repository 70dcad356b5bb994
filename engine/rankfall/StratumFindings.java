package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Coordinate;
import rankfall.Analysis.Stratum;
import rankfall.exact.ComplexNumber;
import rankfall.exact.RealZeros;
import rankfall.lie.Family;
import rankfall.locus.ComplexPoint;
import rankfall.locus.IdealDimensions;
import rankfall.locus.IdealDimensions.Dimensions;
import rankfall.locus.Leaf;
import rankfall.locus.Meter;
import rankfall.locus.Profile;
import rankfall.locus.RealPoints;
import rankfall.locus.Strata;

/** What is known of each stratum of a family. */
record StratumFindings(Family family, Strata.Result strata, Meter meter) {

  List<Stratum> all() {
    List<Stratum> out = new ArrayList<>();
    for (Strata.Stratum s : strata.strata()) {
      out.add(stratum(FamilyFindings.name(out.size()), s));
    }
    return out;
  }

  private Stratum stratum(String name, Strata.Stratum s) {
    Profile p = s.profile();
    IdealDimensions ideals = IdealDimensions.of(s, family.ring().constants(), meter);
    RealZeros.Answer real = new RealPoints(family).on(s);
    Witness witness = witness(s, real);
    int parameters = family.ring().variables().indeterminates();
    return new Stratum(
        name,
        s.equations(),
        s.exclusions(),
        parameters - s.closure().dimension(),
        p.dimension(),
        p.rank(),
        p.derived(),
        p.centre(),
        ideals.general().radical(),
        ideals.general().nilradical(),
        kind(p, ideals.general()),
        Optional.empty(),
        witness.isReal() ? Analysis.RealPoints.YES : verdict(real),
        witness.coordinates(),
        s.leaves().get(0).algebra().basis(),
        s.leaves().get(0).algebra().kernel().stream().map(Combination::new).toList(),
        remarks(p, ideals),
        invariantForms(s, real));
  }

  private Optional<Forms.InvariantForms> invariantForms(Strata.Stratum s, RealZeros.Answer real) {
    try {
      return Optional.of(new InvariantFormFindings(family, meter).of(s, real.point()));
    } catch (Meter.Exhausted e) {
      return Optional.empty();
    }
  }

  static Analysis.RealPoints verdict(RealZeros.Answer answer) {
    return switch (answer.verdict()) {
      case YES -> Analysis.RealPoints.YES;
      case NO -> Analysis.RealPoints.NO;
      case UNKNOWN -> Analysis.RealPoints.UNKNOWN;
    };
  }

  /** What follows from the dimensions: the class holds wherever they do. */
  private static String kind(Profile p, Dimensions d) {
    if (p.derived() == 0) {
      return "abelian";
    }
    if (d.nilradical() == p.dimension()) {
      return "nilpotent";
    }
    if (d.radical() == p.dimension()) {
      return "solvable";
    }
    if (p.rank() == p.dimension()) {
      return "semisimple";
    }
    return d.radical() == p.centre() ? "reductive" : "Levi";
  }

  private static List<String> remarks(Profile p, IdealDimensions ideals) {
    return ideals.deviations().stream()
        .map(
            x ->
                "Where also "
                    + x.equations().stream().map(q -> q + " = 0").collect(Collectors.joining(", "))
                    + ": radical of dimension "
                    + x.dimensions().radical()
                    + ", nilradical of dimension "
                    + x.dimensions().nilradical()
                    + ", "
                    + kind(p, x.dimensions())
                    + ".")
        .toList();
  }

  /**
   * A point of a stratum.
   *
   * @param isReal whether it is a real point within the domain
   */
  private record Witness(List<Coordinate> coordinates, boolean isReal) {}

  /** The real point that was found; else a real one of higher degree; else a complex one. */
  private Witness witness(Strata.Stratum s, RealZeros.Answer real) {
    if (!real.point().isEmpty()) {
      return new Witness(coordinates(real.point()), true);
    }
    if (real.verdict() != RealZeros.Verdict.NO) {
      for (Leaf.Defined leaf : s.leaves()) {
        Optional<List<ComplexNumber>> point = ComplexPoint.realOn(family, leaf.piece());
        if (point.isPresent()) {
          return new Witness(coordinates(point.get()), true);
        }
      }
    }
    for (Leaf.Defined leaf : s.leaves()) {
      Optional<List<ComplexNumber>> point = ComplexPoint.on(family, leaf.piece());
      if (point.isPresent()) {
        return new Witness(coordinates(point.get()), false);
      }
    }
    return new Witness(List.of(), false);
  }

  private List<Coordinate> coordinates(List<?> point) {
    List<Coordinate> out = new ArrayList<>();
    int parameters = family.ring().variables().indeterminates();
    for (int v = 0; v < Math.min(parameters, point.size()); v++) {
      out.add(new Coordinate(family.ring().variables().names().get(v), point.get(v).toString()));
    }
    return out;
  }
}
