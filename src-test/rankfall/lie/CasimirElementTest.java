package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.Variables;
import rankfall.lie.StructureConstants.Pair;

/** The check that a Casimir element commutes can fail. */
class CasimirElementTest {
  private static final Chain NUMBERS = Chain.free(new Variables(List.of()));

  private static Polynomial number(long k) {
    return Polynomial.constant(NUMBERS.variables(), k);
  }

  /** so(3) in a basis stretched by the scale: y_i = scale_i e_i, [y1, y2] = y3 and so on. */
  private static StructureConstants<Polynomial> so3(List<Polynomial> scale) {
    SortedMap<Pair, SortedMap<Integer, Polynomial>> table = new TreeMap<>();
    table.put(new Pair(0, 1), new TreeMap<>(java.util.Map.of(2, number(1))));
    table.put(new Pair(1, 2), new TreeMap<>(java.util.Map.of(0, number(1))));
    table.put(new Pair(0, 2), new TreeMap<>(java.util.Map.of(1, number(-1))));
    return new StructureConstants<>(NUMBERS, 3, table, number(1), scale);
  }

  private static DualForm diagonal(long a, long b, long c) {
    List<List<RationalFunction>> out = new ArrayList<>();
    for (int k = 0; k < 3; k++) {
      List<RationalFunction> row =
          new ArrayList<>(Collections.nCopies(3, RationalFunction.of(number(0))));
      row.set(k, RationalFunction.of(number(List.of(a, b, c).get(k)), number(-2)));
      out.add(row);
    }
    return new DualForm(out);
  }

  /** The sum of the squares of the rotations commutes, another combination does not. */
  @ParameterizedTest
  @CsvSource({"1, 1, 2", "1, 2, 1", "2, 1, 1", "1, 0, 0", "1, 1, -1"})
  void elementThatDoesNotCommuteIsRefused(long a, long b, long c) {
    StructureConstants<Polynomial> so3 = so3(Collections.nCopies(3, number(1)));
    assertThrows(
        IllegalStateException.class, () -> CasimirElement.of(NUMBERS, so3, diagonal(a, b, c)));
    assertEquals(
        diagonal(1, 1, 1).matrix(),
        CasimirElement.of(NUMBERS, so3, diagonal(1, 1, 1)).coefficients());
  }

  /** With y3 = 2 e3 the sum y1^2 + y2^2 + y3^2 is e1^2 + e2^2 + 4 e3^2. */
  @Test
  void scalesOfTheBasisCount() {
    StructureConstants<Polynomial> so3 = so3(List.of(number(1), number(1), number(2)));
    CasimirElement.of(NUMBERS, so3, diagonal(1, 1, 4));
    assertThrows(
        IllegalStateException.class, () -> CasimirElement.of(NUMBERS, so3, diagonal(1, 1, 1)));
  }
}
