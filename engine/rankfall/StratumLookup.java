package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Stratum;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/** Finds the stratum of a point by its equations and exclusions. */
public final class StratumLookup implements StratumNames {
  private final Family family;
  private final List<Stratum> strata;

  private StratumLookup(Family family, List<Stratum> strata) {
    this.family = family;
    this.strata = List.copyOf(strata);
  }

  /**
   * The strata of an analysis.
   *
   * @param spec the spec that was analysed
   * @param analysis its analysis; one that is not complete names no stratum
   * @return names the strata
   * @throws SpecException if the spec describes no family
   */
  public static StratumNames of(Spec spec, Analysis analysis) throws SpecException {
    if (analysis.status() != Analysis.Status.COMPLETE) {
      return NONE;
    }
    return new StratumLookup(
        Family.of(spec), analysis.findings().map(Analysis.Findings::strata).orElse(List.of()));
  }

  @Override
  public Optional<String> of(Map<String, BigFraction> point) {
    List<Optional<BigFraction>> values = values(point);
    for (Stratum s : strata) {
      if (vanish(s.equations(), values)
          && s.exclusions().stream().noneMatch(e -> vanish(e, values))) {
        return Optional.of(s.name());
      }
    }
    return Optional.empty();
  }

  private List<Optional<BigFraction>> values(Map<String, BigFraction> point) {
    List<Optional<BigFraction>> out = new ArrayList<>();
    int parameters = family.ring().variables().indeterminates();
    for (int v = 0; v < family.ring().variables().count(); v++) {
      String name = family.ring().variables().names().get(v);
      out.add(v < parameters ? value(name, point) : Optional.empty());
    }
    return out;
  }

  /** A function whose parameter is given has it at 0: 1 for cos, exp and cosh, 0 for the others. */
  private static Optional<BigFraction> value(String name, Map<String, BigFraction> point) {
    BigFraction given = point.get(name);
    if (given != null) {
      return Optional.of(given);
    }
    boolean one = name.startsWith("cos") || name.startsWith("exp");
    return Optional.of(one ? BigFraction.ONE : BigFraction.ZERO);
  }

  private boolean vanish(List<Polynomial> equations, List<Optional<BigFraction>> values) {
    Chain constants = family.ring().constants();
    return equations.stream().allMatch(p -> constants.vanishes(p.partlyAt(values).numerator()));
  }
}
