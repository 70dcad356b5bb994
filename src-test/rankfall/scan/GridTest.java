package rankfall.scan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Grids, samples and parts as they are written and numbered. */
final class GridTest {
  @Test
  void axesAreReadExactly() {
    Map<String, Axis> axes = GridText.grid("a=-2:2:401,b=1/2, c=0;0.25;-1");
    Axis a = axes.get("a");
    assertEquals(401, a.size());
    assertEquals(100, a.denominator());
    assertEquals(-200, a.numerator(0));
    assertEquals(200, a.numerator(400));
    assertEquals(200, a.reach());
    assertEquals("a=-2:2:401", a.text());
    assertEquals(1, axes.get("b").size());
    assertEquals("b=1/2", axes.get("b").text());
    assertEquals("c=0;1/4;-1", axes.get("c").text());
    assertEquals(4, axes.get("c").denominator());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "a",
        "=1",
        "a=",
        "a=x",
        "a=1/0",
        "a=1:2",
        "a=1:2:3:4",
        "a=1:1:5",
        "a=2:1:5",
        "a=1:2:0",
        "a=1:2:1",
        "a=1:2:-3",
        "a=1:2:1/2",
        "a=1;1",
        "a=1,a=2",
        "a=1,",
        "a=1/100000000000000000000000003"
      })
  void whatIsNoGridIsRefused(String text) {
    String message =
        assertThrows(IllegalArgumentException.class, () -> GridText.grid(text)).getMessage();
    assertTrue(message.length() > 10, message);
    assertTrue(message.lines().count() == 1, message);
  }

  @ParameterizedTest
  @CsvSource({
    "a=1:1:5, a step of 0",
    "a=2:1:5, reversed",
    "a=1:2, wants bounds and a number of points",
    "a=x, is no rational number"
  })
  void theMessageSaysWhatIsWrong(String text, String part) {
    String message =
        assertThrows(IllegalArgumentException.class, () -> GridText.grid(text)).getMessage();
    assertTrue(message.contains(part), message);
  }

  @Test
  void theLastAxisChangesFastest() {
    Grid grid = new Grid(List.copyOf(GridText.grid("a=0;1,b=0:2:3,c=7").values()));
    List<List<Long>> points = new ArrayList<>();
    long[] at = new long[3];
    for (long n = 0; n < grid.size(); n++) {
      grid.put(n, at);
      assertEquals(at[grid.inner()], grid.innerAt(n));
      points.add(List.of(at[0], at[1], at[2]));
    }
    assertEquals(1, grid.inner());
    assertEquals(3, grid.lineLength());
    assertEquals(
        List.of(
            List.of(0L, 0L, 7L),
            List.of(0L, 1L, 7L),
            List.of(0L, 2L, 7L),
            List.of(1L, 0L, 7L),
            List.of(1L, 1L, 7L),
            List.of(1L, 2L, 7L)),
        points);
  }

  @Test
  void aGridMayNotHaveMorePointsThanCanBeCounted() {
    Map<String, Axis> axes = GridText.grid("a=0:1:4000000000,b=0:1:4000000000");
    assertThrows(IllegalArgumentException.class, () -> new Grid(List.copyOf(axes.values())));
  }

  /**
   * The output of the published generator for the seed 0 (Steele, Lea and Flood 2014; from memory).
   */
  @Test
  void aSampleIsDrawnByThePublishedGenerator() {
    Axis whole = new Axis.Steps("a", 0, 1, Long.MAX_VALUE, 1, Long.MAX_VALUE);
    Sample sample = new Sample(List.of(whole), 3, 0);
    long[] at = new long[1];
    long[] published = {0xE220A8397B1DCDAFL, 0x6E789E6AA1B965F4L, 0x06C45D188009454FL};
    for (int k = 0; k < published.length; k++) {
      sample.put(k, at);
      assertEquals(published[k] >>> 1, at[0], 1);
    }
  }

  @Test
  void aSampleStaysInItsRangesAndDependsOnItsSeed() {
    List<Axis> ranges = List.copyOf(GridText.ranges("a=-1/3:2,b=5").values());
    Sample one = new Sample(ranges, 1000, 1);
    Sample two = new Sample(ranges, 1000, 2);
    HashSet<Long> values = new HashSet<>();
    long[] at = new long[2];
    long[] other = new long[2];
    int equal = 0;
    double sum = 0;
    for (long n = 0; n < 1000; n++) {
      one.put(n, at);
      two.put(n, other);
      double a = (double) at[0] / one.denominators().get(0);
      assertTrue(a >= -0.34 && a <= 2 && at[1] == 5);
      sum += a;
      values.add(at[0]);
      equal += at[0] == other[0] ? 1 : 0;
    }
    assertTrue(values.size() > 950 && equal < 10);
    // The mean of 1000 uniform values of width 7/3 lies within 0.1 of 5/6: over four deviations.
    assertEquals(5.0 / 6, sum / 1000, 0.1);
  }

  @ParameterizedTest
  @CsvSource({"10, 3", "7, 64", "1000003, 7", "64, 64"})
  void partsOneAfterTheOtherAreTheWhole(long size, int parts) {
    long next = 0;
    for (int k = 1; k <= parts; k++) {
      Shard shard = Shard.of(k + "/" + parts);
      assertEquals(next, shard.from(size));
      assertTrue(shard.to(size) - next <= size / parts + 1);
      next = shard.to(size);
    }
    assertEquals(size, next);
  }
}
