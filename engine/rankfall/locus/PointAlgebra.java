package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.Domain;
import rankfall.exact.Polynomial;
import rankfall.exact.RealSample;
import rankfall.lie.CharacteristicPolynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.PlainKilling;
import rankfall.lie.RationalNumbers;
import rankfall.lie.SignRule;
import rankfall.lie.Signature;
import rankfall.lie.Span;
import rankfall.lie.SpanInput;
import rankfall.lie.StructureConstants;

/**
 * The algebra of a family at one exact real point.
 *
 * @param constants real numbers; an isomorphic algebra is as good
 * @param signs their order
 * @param <E> the numbers
 */
public record PointAlgebra<E>(StructureConstants<E> constants, SignRule<E> signs) {

  /**
   * The algebra at a point of a stratum.
   *
   * @param family of a real ground
   * @param point a point of the family
   * @throws IllegalStateException if there is no algebra at the point
   */
  public static PointAlgebra<?> at(Family family, RealSample point) {
    Optional<List<BigFraction>> rational = point.rationalCoordinates();
    FamilySite site =
        rational.isPresent() ? family.at(values(family, rational.get())) : family.on(point.chain());
    if (site instanceof FamilySite.Rational r) {
      return of(r.input(), new RationalNumbers());
    }
    if (site instanceof FamilySite.Algebraic a) {
      return rational.isPresent()
          ? of(a.input(), family.ring().tower()::sign)
          : of(a.input(), point::sign);
    }
    throw new IllegalStateException(((FamilySite.Outside) site).reason() + " at " + point);
  }

  private static Map<String, BigFraction> values(Family family, List<BigFraction> point) {
    Map<String, BigFraction> out = new TreeMap<>();
    for (int v = 0; v < point.size(); v++) {
      out.put(family.ring().variables().names().get(v), point.get(v));
    }
    return out;
  }

  private static <E> PointAlgebra<E> of(SpanInput<E> input, SignRule<E> signs) {
    if (Span.of(input) instanceof Span.Closed<E> closed) {
      return new PointAlgebra<>(closed.constants(), signs);
    }
    throw new IllegalStateException("the span is not closed at a point of a stratum");
  }

  /** The signature of the Killing form. */
  public Signature signature() {
    return Signature.of(
        CharacteristicPolynomial.byBlocks(constants.domain(), killing(constants)), signs);
  }

  /** The Killing matrix, times a positive number. */
  private List<List<E>> killing(StructureConstants<E> c) {
    List<List<E>> traces = PlainKilling.of(c);
    if (!(c.domain() instanceof Chain)) {
      return traces;
    }
    List<E> all = new ArrayList<>();
    traces.forEach(all::addAll);
    all.add(c.domain().one());
    List<E> normal = reduced(c.domain(), all);
    boolean negative = signs.signum(normal.get(all.size() - 1)) < 0;
    int n = c.dimension();
    List<List<E>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      List<E> row = normal.subList(i * n, (i + 1) * n);
      out.add(negative ? row.stream().map(c.domain()::negate).toList() : List.copyOf(row));
    }
    return out;
  }

  @SuppressWarnings("unchecked")
  private static <E> List<E> reduced(Domain<E> domain, List<E> elements) {
    return (List<E>) ((Chain) domain).reduced((List<Polynomial>) elements);
  }
}
