package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Killing;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.Analysis.RealPoints;
import rankfall.exact.Factorization;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;

/** An analysis written down by hand is read as the published tables write it. */
class AnalysisReadingTest {
  private static final Variables T = new Variables(List.of("t"));
  private static final Polynomial VARIABLE = Polynomial.variable(T, 0);

  /** sl(2) with [e, f] = t*h: K(e, f) = 4 t, K(h, h) = 8 (entry sl2-scaled of the tables). */
  private static final Component SCALED =
      new Component(
          1,
          List.of(),
          1,
          List.of("e", "f", "h"),
          List.of(),
          new Killing(
              List.of(
                  new MatrixEntry(
                      0, 1, RationalFunction.of(VARIABLE.times(Polynomial.constant(T, 4)))),
                  new MatrixEntry(2, 2, RationalFunction.of(Polynomial.constant(T, 8)))),
              3,
              List.of(),
              List.of(List.of(0, 1), List.of(2)),
              Optional.of(
                  new Quotient(
                      new Factorization(
                          BigFraction.of(-128), List.of(new Factorization.Factor(VARIABLE, 2))),
                      new Factorization(BigFraction.ONE, List.of()))),
              Optional.empty()),
          Optional.of(
              List.of(
                  new MatrixEntry(
                      0,
                      1,
                      RationalFunction.of(
                          Polynomial.one(T), VARIABLE.times(Polynomial.constant(T, 4)))),
                  new MatrixEntry(2, 2, RationalFunction.of(T, BigFraction.of(1, 8))))),
          List.of(
              new Analysis.Condition(
                  List.of(VARIABLE),
                  Optional.of(2),
                  Optional.of(1),
                  Optional.of(2),
                  List.of("e", "f", "h"),
                  List.of(),
                  RealPoints.YES)),
          Optional.empty(),
          Optional.empty());

  @Test
  void aComponentIsReadAsTheTablesWriteIt() {
    ObservedFamily read = AnalysisReading.of(SCALED, List.of(2));
    assertEquals(Map.of(new Cell(1, 2), "4*t", new Cell(3, 3), "8"), read.killing());
    assertEquals("(-128*t^2)/(1)", read.determinant());
    assertEquals(List.of(new Condition("t", 2)), read.conditions());
    assertEquals(Map.of(new Cell(1, 1), "8"), read.restricted());
    assertEquals(Optional.of(new TreeMap<>(Map.of(new Cell(1, 1), "1/8"))), read.dual());
    PublishedEntry entry =
        PublishedTables.all().stream()
            .filter(e -> e.id().equals("sl2-scaled"))
            .findFirst()
            .orElseThrow();
    ObservedFamily whole = read.with(entry.strata().orElseThrow(), List.of("0"));
    assertEquals(List.of(), PublishedComparison.family(entry, whole));
  }

  /** K(e, f) is not 0, so the form on e alone has another inverse than the whole form shows. */
  @Test
  void aTorusThatIsNotOrthogonalToTheRestIsRefused() {
    assertThrows(IllegalStateException.class, () -> AnalysisReading.of(SCALED, List.of(0)));
  }
}
