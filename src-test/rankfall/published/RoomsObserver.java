package rankfall.published;

import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.util.SortedMap;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Budget;
import rankfall.Engine;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.NumberText;
import rankfall.lie.PointAnalysis;
import rankfall.lie.PointFacts;
import rankfall.lie.RationalNumbers;
import rankfall.lie.Span;
import rankfall.lie.StructureConstants;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;
import rankfall.spec.SpecReader;

/** Asks the rooms of the program themselves. */
final class RoomsObserver implements FamilyObserver {
  private static final String OPEN = "not closed";

  @Override
  public ObservedPoint point(String spec, SortedMap<String, String> at) {
    Family family = family(read(spec));
    SortedMap<String, BigFraction> values = new TreeMap<>();
    at.forEach((name, value) -> values.put(name, BigFraction.parse(value)));
    FamilySite site = family.at(values);
    int listed = family.names().size();
    if (site instanceof FamilySite.Rational rational) {
      Span<BigInteger> span = Span.of(rational.input());
      RationalNumbers numbers = new RationalNumbers();
      return span instanceof Span.Closed<BigInteger> closed
          ? PointReading.of(PointAnalysis.of(closed.constants(), listed, numbers, numbers))
          : PointReading.outside(OPEN);
    }
    if (site instanceof FamilySite.Algebraic algebraic) {
      Span<Polynomial> span = Span.of(algebraic.input());
      return span instanceof Span.Closed<Polynomial> closed
          ? PointReading.of(algebraic(family, closed.constants()))
          : PointReading.outside(OPEN);
    }
    return PointReading.outside(((FamilySite.Outside) site).reason());
  }

  private static PointFacts algebraic(Family family, StructureConstants<Polynomial> constants) {
    int listed = family.names().size();
    NumberText<Polynomial> text = (a, b) -> "(" + a + ")/(" + b + ")";
    return family.ring().complex()
        ? PointAnalysis.complex(constants, listed, text)
        : PointAnalysis.of(constants, listed, family.ring().tower()::sign, text);
  }

  @Override
  public ObservedFamily family(String spec) {
    try {
      return AnalysisReading.of(Engine.analyse(read(spec), Budget.DEFAULT));
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }

  private static Spec read(String text) {
    try {
      byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
      return SpecReader.read("published.yaml", bytes).get(0).orThrow();
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }

  private static Family family(Spec spec) {
    try {
      return Family.of(spec);
    } catch (SpecException e) {
      throw new IllegalStateException(e);
    }
  }
}
