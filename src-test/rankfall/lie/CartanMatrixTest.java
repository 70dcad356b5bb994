package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Cartan matrices as Humphreys, Introduction to Lie Algebras and Representation Theory, sec. 11.4,
 * table 1, prints them (from memory).
 */
class CartanMatrixTest {

  private static CartanMatrix matrix(String rows) {
    return new CartanMatrix(
        Arrays.stream(rows.split("/"))
            .map(r -> Arrays.stream(r.trim().split(" +")).map(Integer::valueOf).toList())
            .toList());
  }

  private static final String TABLE =
      """
      A1; 2
      A2; 2 -1 / -1 2
      A3; 2 -1 0 / -1 2 -1 / 0 -1 2
      B2; 2 -2 / -1 2
      B3; 2 -1 0 / -1 2 -2 / 0 -1 2
      C3; 2 -1 0 / -1 2 -1 / 0 -2 2
      C4; 2 -1 0 0 / -1 2 -1 0 / 0 -1 2 -1 / 0 0 -2 2
      D4; 2 -1 0 0 / -1 2 -1 -1 / 0 -1 2 0 / 0 -1 0 2
      D5; 2 -1 0 0 0 / -1 2 -1 0 0 / 0 -1 2 -1 -1 / 0 0 -1 2 0 / 0 0 -1 0 2
      F4; 2 -1 0 0 / -1 2 -2 0 / 0 -1 2 -1 / 0 0 -1 2
      G2; 2 -1 / -3 2
      E6; 2 0 -1 0 0 0/0 2 0 -1 0 0/-1 0 2 -1 0 0/0 -1 -1 2 -1 0/0 0 0 -1 2 -1/0 0 0 0 -1 2
      """;

  @Test
  void tableIsRecognisedInAnyOrder() {
    for (String line : TABLE.strip().split("\n")) {
      String name = line.substring(0, line.indexOf(';'));
      CartanMatrix m = matrix(line.substring(line.indexOf(';') + 1));
      int n = m.rows().size();
      List<Integer> order = new ArrayList<>(IntStream.range(0, n).boxed().toList());
      for (int t = 0; t < 10; t++) {
        Collections.shuffle(order, new Random(t));
        CartanMatrix mixed = m.in(order);
        List<CartanMatrix.Part> parts = mixed.parts().orElseThrow();
        assertEquals(name, parts.get(0).toString());
        assertEquals(m, mixed.in(parts.get(0).order()), name);
      }
    }
  }

  /** E7 and E8 go on from E6 along the long leg. */
  @ParameterizedTest
  @CsvSource({"7", "8"})
  void exceptionalTypes(int n) {
    List<List<Integer>> rows = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      rows.add(new ArrayList<>(Collections.nCopies(n, 0)));
      rows.get(i).set(i, 2);
    }
    int[][] edges = {{0, 2}, {1, 3}, {2, 3}, {3, 4}, {4, 5}, {5, 6}, {6, 7}};
    for (int[] e : Arrays.copyOf(edges, n - 1)) {
      rows.get(e[0]).set(e[1], -1);
      rows.get(e[1]).set(e[0], -1);
    }
    assertEquals("[E" + n + "]", new CartanMatrix(rows).parts().orElseThrow().toString());
  }

  /** Affine diagrams (Kac, Infinite dimensional Lie algebras, ch. 4) are no finite type. */
  @ParameterizedTest
  @CsvSource({
    "2 -2 / -2 2",
    "2 -1 -1 / -1 2 -1 / -1 -1 2",
    "2 -4 / -1 2",
    "2 -1 0 / -1 2 -3 / 0 -1 2",
    "2 -2 0 / -1 2 -2 / 0 -1 2"
  })
  void otherMatricesAreRefused(String rows) {
    assertTrue(matrix(rows).parts().isEmpty());
  }

  @Test
  void partsOfASum() {
    CartanMatrix m = matrix("2 0 -1 0 / 0 2 0 -2 / -1 0 2 0 / 0 -1 0 2");
    assertEquals("[A2, B2]", m.parts().orElseThrow().toString());
  }
}
