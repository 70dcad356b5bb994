package rankfall.identify;

import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.Span;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** The algebra of a spec at an exact point. */
final class PointAlgebra {
  private PointAlgebra() {}

  static Family family(String yaml) {
    try {
      return Family.of(
          SpecReader.read("test.yaml", yaml.getBytes(StandardCharsets.UTF_8)).get(0).orThrow());
    } catch (SpecException e) {
      throw new IllegalArgumentException(e.diagnostics().toString(), e);
    }
  }

  /** With fractions as texts by parameter. */
  static ExactAlgebra of(String yaml, Map<String, String> at) {
    return of(family(yaml), at);
  }

  /** With fractions as texts by parameter. */
  static ExactAlgebra of(Family family, Map<String, String> at) {
    SortedMap<String, BigFraction> values = new TreeMap<>();
    at.forEach((name, value) -> values.put(name, BigFraction.parse(value)));
    FamilySite site = family.at(values);
    if (site instanceof FamilySite.Rational rational) {
      Span.Closed<BigInteger> closed = (Span.Closed<BigInteger>) Span.of(rational.input());
      return family.ring().complex()
          ? ExactAlgebra.complex(closed.constants())
          : ExactAlgebra.real(closed.constants());
    }
    FamilySite.Algebraic algebraic = (FamilySite.Algebraic) site;
    Span.Closed<Polynomial> closed = (Span.Closed<Polynomial>) Span.of(algebraic.input());
    return family.ring().complex()
        ? ExactAlgebra.complex(algebraic.chain(), closed.constants())
        : ExactAlgebra.real(algebraic.chain(), closed.constants(), family.ring().tower()::sign);
  }
}
