package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.identify.SimpleType.Series;

/** Dimensions and Casimir values of irreducible modules. */
class WeightsTest {
  private static List<Integer> weight(String text) {
    return Stream.of(text.split(" ")).map(Integer::parseInt).toList();
  }

  /**
   * Humphreys, Introduction to Lie Algebras, section 24.3: A_2 by (a+1)(b+1)(a+b+2)/2, G_2 by its
   * product of six factors; the least modules of the others (common practice, no source).
   */
  @ParameterizedTest
  @CsvSource({
    "A, 2, 1 0, 3",
    "A, 2, 2 1, 15",
    "A, 2, 1 1, 8",
    "A, 3, 0 1 0, 6",
    "B, 2, 1 0, 5",
    "B, 2, 0 1, 4",
    "B, 3, 0 0 1, 8",
    "C, 3, 1 0 0, 6",
    "C, 3, 0 0 1, 14",
    "D, 4, 0 0 1 0, 8",
    "G, 2, 1 0, 7",
    "G, 2, 0 1, 14",
    "F, 4, 0 0 0 1, 26",
    "E, 6, 1 0 0 0 0 0, 27",
    "E, 7, 0 0 0 0 0 0 1, 56",
    "E, 8, 0 0 0 0 0 0 0 1, 248"
  })
  void dimensions(Series series, int rank, String weight, int dimension) {
    assertEquals(dimension, Weights.of(new SimpleType(series, rank)).dimension(weight(weight)));
  }

  /**
   * In units of the adjoint module: (m^2 - 1)/8 on the module of dimension m of A_1, (N^2 - 1)/(2
   * N^2) on N-vectors of sl(N) (from memory: Humphreys, exercise 6.2 gives 3/8 and 4/9).
   */
  @ParameterizedTest
  @CsvSource({
    "A, 1, 1, 3, 8",
    "A, 1, 2, 1, 1",
    "A, 1, 4, 3, 1",
    "A, 2, 1 0, 4, 9",
    "A, 3, 1 0 0, 15, 32",
    "E, 8, 0 0 0 0 0 0 0 1, 1, 1",
    "G, 2, 0 1, 1, 1",
    "C, 3, 2 0 0, 1, 1"
  })
  void casimirValues(Series series, int rank, String weight, int above, int below) {
    BigFraction value = Weights.of(new SimpleType(series, rank)).casimir(weight(weight));
    assertEquals(BigFraction.of(above, below), value);
  }

  /** All modules of A_2 up to dimension 10 by the formula: 1, 3, 3, 6, 6, 8, 10, 10. */
  @Test
  void allModulesUpToADimension() {
    Weights w = Weights.of(new SimpleType(Series.A, 2));
    assertEquals(
        List.of(1, 3, 3, 6, 6, 8, 10, 10), w.upTo(10).stream().map(w::dimension).sorted().toList());
  }
}
