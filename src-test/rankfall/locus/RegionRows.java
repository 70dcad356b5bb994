package rankfall.locus;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis;
import rankfall.PointResult;
import rankfall.Points;
import rankfall.SignCondition;
import rankfall.exact.Polynomial;
import rankfall.spec.SpecException;

/** The rows of regions of a family, for tests. */
record RegionRows(Analysed family) {

  static RegionRows of(String yaml) {
    return new RegionRows(Analysed.text(yaml));
  }

  List<Analysis.Region> all() {
    return family.analysis().findings().orElseThrow().regions();
  }

  List<Analysis.Region> of(Analysis.Stratum s) {
    return all().stream().filter(r -> r.stratum().equals(s.name())).toList();
  }

  /** Rows of one stratum: conditions and signature, a line each. */
  List<String> texts(String stratum) {
    return all().stream()
        .filter(r -> r.stratum().equals(stratum))
        .map(r -> conditions(r) + ": " + signature(r.signature()))
        .toList();
  }

  static String conditions(Analysis.Region r) {
    return r.conditions().stream().map(SignCondition::toString).collect(Collectors.joining("; "));
  }

  static String signature(Analysis.Signature s) {
    return s.plus() + "," + s.minus() + "," + s.zero();
  }

  /** The strata in which a rational point lies. */
  List<Analysis.Stratum> strataAt(List<BigFraction> point) {
    return family.strata().stream()
        .filter(
            s ->
                s.equations().stream().allMatch(e -> e.at(point).signum() == 0)
                    && s.exclusions().stream()
                        .noneMatch(x -> x.stream().allMatch(e -> e.at(point).signum() == 0)))
        .toList();
  }

  /** Whether all conditions of a row hold at a rational point. */
  static boolean holds(Analysis.Region r, List<BigFraction> point) {
    return r.conditions().stream()
        .allMatch(c -> c.comparison().holds(c.polynomial().at(point).signum()));
  }

  /** Whether some polynomial of a row vanishes at a rational point. */
  static boolean isOnBorder(Analysis.Region r, List<BigFraction> point) {
    return r.conditions().stream()
        .map(SignCondition::polynomial)
        .map((Polynomial p) -> p.at(point).signum())
        .anyMatch(s -> s == 0);
  }

  /** What the program for single points says there. */
  PointResult at(List<BigFraction> point) {
    Map<String, BigFraction> values = new LinkedHashMap<>();
    List<String> names = family.analysis().findings().orElseThrow().variables();
    for (int k = 0; k < point.size(); k++) {
      values.put(names.get(k), point.get(k));
    }
    try {
      return Points.of(family.spec()).at(values);
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }
}
