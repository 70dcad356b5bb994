package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The identities against traces that are summed over the roots of the Cartan matrices (Humphreys,
 * Introduction to Lie Algebras, sections 11.4 and 8.4).
 */
class TraceIdentitiesTest {
  private static final PrimeField FIELD = new PrimeField((1L << 31) - 1);

  private static long[] traces(SimpleType type, int count, Random random) {
    long[] x = random.longs(type.rank(), 0, FIELD.prime()).toArray();
    long[] out = new long[count];
    for (List<Integer> root : Weights.of(type).positive()) {
      long value = 0;
      for (int i = 0; i < x.length; i++) {
        value = FIELD.plus(value, FIELD.times(FIELD.of(root.get(i)), x[i]));
      }
      for (int k = 0; k < count; k++) {
        out[k] = FIELD.plus(out[k], FIELD.times(2, FIELD.power(value, 2L * (k + 1))));
      }
    }
    return out;
  }

  /** In each dimension the identities of a type hold for it, and refute the others. */
  @ParameterizedTest
  @ValueSource(ints = {10, 21, 28, 36, 45, 55, 66, 78, 105, 136})
  void exactlyTheTypeIsLeft(int dimension) {
    List<SimpleType> all = SimpleType.ofDimension(dimension);
    for (SimpleType t : all) {
      long[] p = traces(t, 20, new Random(dimension));
      List<SimpleType> left =
          all.stream().filter(s -> !TraceIdentities.refute(s, p, FIELD)).toList();
      assertEquals(List.of(t), left);
    }
  }

  /** Okubo 1979: the quartic identity holds for A_1, A_2, D_4 too, but for no B_6. */
  @ParameterizedTest
  @ValueSource(strings = {"G2", "F4", "E6", "E7", "E8"})
  void exceptionalTypesSatisfyTheQuarticIdentity(String name) {
    SimpleType t =
        new SimpleType(SimpleType.Series.valueOf(name.substring(0, 1)), name.charAt(1) - '0');
    long[] p = traces(t, 2, new Random(1));
    assertEquals(
        FIELD.times(2L * (2 + t.dimension()), p[1]), FIELD.times(5, FIELD.times(p[0], p[0])));
    assertEquals(false, TraceIdentities.refute(t, p, FIELD));
  }
}
