package rankfall.published;

import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Polynomial;
import rankfall.identify.ExactAlgebra;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.Span;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** The algebra that a spec has at a point. */
public final class ExactPoint {
  private ExactPoint() {}

  /**
   * The algebra.
   *
   * @param spec the text of the spec
   * @param at exact values by name
   * @return empty where the span is not closed or the family has no point
   */
  public static Optional<ExactAlgebra> of(String spec, SortedMap<String, String> at) {
    Family family = family(spec);
    SortedMap<String, BigFraction> values = new TreeMap<>();
    at.forEach((name, value) -> values.put(name, BigFraction.parse(value)));
    FamilySite site = family.at(values);
    boolean complex = family.ring().complex();
    if (site instanceof FamilySite.Rational rational
        && Span.of(rational.input()) instanceof Span.Closed<BigInteger> closed) {
      return Optional.of(
          complex
              ? ExactAlgebra.complex(closed.constants())
              : ExactAlgebra.real(closed.constants()));
    }
    if (site instanceof FamilySite.Algebraic algebraic
        && Span.of(algebraic.input()) instanceof Span.Closed<Polynomial> closed) {
      return Optional.of(
          complex
              ? ExactAlgebra.complex(algebraic.chain(), closed.constants())
              : ExactAlgebra.real(
                  algebraic.chain(), closed.constants(), family.ring().tower()::sign));
    }
    return Optional.empty();
  }

  private static Family family(String spec) {
    try {
      byte[] bytes = spec.getBytes(StandardCharsets.UTF_8);
      return Family.of(SpecReader.read("published.yaml", bytes).get(0).orThrow());
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }
}
