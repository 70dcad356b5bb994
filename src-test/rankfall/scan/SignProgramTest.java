package rankfall.scan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.Set;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.exact.NumberFieldTower;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;

/** Signs against identities: the sign of a product is the product of the signs. */
final class SignProgramTest {
  private static final Variables RING = new Variables(List.of("x", "y"));
  private static final Frame FRAME =
      new Frame(List.of("x", "y"), Set.of(), Set.of(), HandMade.RATIONAL);

  /** A product of linear forms, expanded, with its factors. */
  private record Product(List<long[]> factors, Polynomial expanded) {
    static Product random(Random random, int degree) {
      List<long[]> factors = new ArrayList<>();
      Polynomial p = Polynomial.one(RING);
      for (int k = 0; k < degree; k++) {
        long[] f = {random.nextInt(7) - 3, random.nextInt(7) - 3, random.nextInt(9) - 4};
        factors.add(f);
        p = p.times(linear(f));
      }
      return new Product(factors, p);
    }

    private static Polynomial linear(long[] f) {
      return Polynomial.variable(RING, 0)
          .times(BigInteger.valueOf(f[0]))
          .plus(Polynomial.variable(RING, 1).times(BigInteger.valueOf(f[1])))
          .plus(Polynomial.constant(RING, f[2]));
    }

    /** At (x / d, y / d). */
    int sign(long x, long y, long d) {
      int sign = 1;
      for (long[] f : factors) {
        sign *= Long.signum(f[0] * x + f[1] * y + f[2] * d);
      }
      return sign;
    }
  }

  @ParameterizedTest
  @CsvSource({
    "3, 10, 61", // longs
    "8, 1000, 61", // longs in part
    "8, 1000000000000, 401", // steps of 1e-12: doubles, and big integers next to the lines
  })
  void linesOfAGridHaveTheSignsOfTheFactors(int degree, long denominator, int points) {
    Random random = new Random(degree * 31L + points);
    List<Product> products = new ArrayList<>();
    for (int k = 0; k < 12; k++) {
      products.add(Product.random(random, degree));
    }
    Grid grid =
        new Grid(List.of(near("x", 1, denominator, points), near("y", -2, denominator, points)));
    SignProgram program =
        SignProgram.along(FRAME, products.stream().map(Product::expanded).toList(), grid);
    long[] at = new long[2];
    int zeros = 0;
    for (long n = 0; n < grid.size(); n++) {
      grid.put(n, at);
      if (n % points == 0) {
        program.enter(at);
      }
      program.move(at[1]);
      for (int k = 0; k < products.size(); k++) {
        int sign = products.get(k).sign(at[0], at[1], denominator);
        assertEquals(sign, program.sign(k));
        zeros += sign == 0 ? 1 : 0;
      }
    }
    assertTrue(zeros > 50, "the grid meets lines");
  }

  /** Points around a value, as close as the denominator lets them be. */
  private static Axis near(String name, long centre, long denominator, int points) {
    BigFraction half =
        BigFraction.of(BigInteger.valueOf(points / 2), BigInteger.valueOf(denominator));
    BigFraction c = BigFraction.of(BigInteger.valueOf(centre));
    Axis axis = Axis.steps(name, c.subtract(half), c.add(half), points);
    return axis.denominator() == denominator ? axis : over(axis, denominator);
  }

  private static Axis over(Axis a, long denominator) {
    Axis.Steps s = (Axis.Steps) a;
    long f = denominator / s.denominator();
    return new Axis.Steps(
        s.name(), s.first() * f, s.step() * f, s.size(), denominator, s.reach() * f);
  }

  @Test
  void singlePointsHaveTheSignsOfTheFactors() {
    Random random = new Random(5);
    for (int round = 0; round < 200; round++) {
      Product p = Product.random(random, 8);
      SignProgram program = SignProgram.anywhere(FRAME, List.of(p.expanded));
      for (int k = 0; k < 50; k++) {
        long d = 1 + random.nextInt(1000);
        long x = random.nextInt(6000) - 3000;
        long y = random.nextInt(6000) - 3000;
        program.enter(List.of(fraction(x, d), fraction(y, d)));
        assertEquals(p.sign(x, y, d), program.sign(0));
      }
    }
  }

  /** Powers beyond all doubles: x^60 - y^60 with x and y of forty digits that differ by one. */
  @Test
  void anOverflowIsAnsweredExactly() {
    Polynomial p = Polynomial.variable(RING, 0).pow(60).minus(Polynomial.variable(RING, 1).pow(60));
    SignProgram program = SignProgram.anywhere(FRAME, List.of(p));
    BigInteger big = BigInteger.TEN.pow(40);
    program.enter(List.of(BigFraction.of(big.add(BigInteger.ONE)), BigFraction.of(big)));
    assertEquals(1, program.sign(0));
    program.enter(List.of(BigFraction.of(big), BigFraction.of(big.add(BigInteger.ONE))));
    assertEquals(-1, program.sign(0));
    program.enter(List.of(BigFraction.of(big), BigFraction.of(big)));
    assertEquals(0, program.sign(0));
    program.enter(List.of(BigFraction.of(BigInteger.ONE, big), BigFraction.ZERO));
    assertEquals(1, program.sign(0));
  }

  @Test
  void smallGridsAreEvaluatedInLongs() {
    Polynomial p = Polynomial.variable(RING, 0).pow(3).minus(Polynomial.variable(RING, 1));
    Grid small = new Grid(List.of(near("x", 0, 100, 401), near("y", 0, 100, 401)));
    Grid fine =
        new Grid(List.of(near("x", 1, 1_000_000_000L, 401), near("y", 1, 1_000_000_000L, 401)));
    assertEquals(1, SignProgram.along(FRAME, List.of(p), small).inLongs());
    assertEquals(0, SignProgram.along(FRAME, List.of(p), fine).inLongs());
  }

  /**
   * Numbers of Q(sqrt(2)): x - r*y has the sign of x^2 - 2*y^2 for positive x and y, so that
   * convergents of the continued fraction 1, 3/2, 7/5, 17/12 ... lie on either side in turn (Hardy
   * and Wright, An Introduction to the Theory of Numbers, ch. X; place from memory).
   */
  @Test
  void algebraicNumbersAreDecidedExactly() {
    Variables ring = new Variables(List.of("x", "y", "r"), 1);
    NumberFieldTower field =
        NumberFieldTower.rational()
            .with("r", List.of(fraction(-2, 1), fraction(0, 1), fraction(1, 1)), fraction(7, 5))
            .tower();
    Frame frame = new Frame(List.of("x", "y"), Set.of(), Set.of(), new Field(field));
    Polynomial p =
        Polynomial.variable(ring, 0)
            .minus(Polynomial.variable(ring, 1).times(Polynomial.variable(ring, 2)));
    SignProgram single = SignProgram.anywhere(frame, List.of(p));
    BigInteger x = BigInteger.ONE;
    BigInteger y = BigInteger.ONE;
    for (int k = 0; k < 200; k++) {
      single.enter(List.of(BigFraction.of(x), BigFraction.of(y)));
      assertEquals(k % 2 == 0 ? -1 : 1, single.sign(0));
      BigInteger next = x.add(y.shiftLeft(1));
      y = x.add(y);
      x = next;
    }
    single.enter(List.of(BigFraction.ZERO, BigFraction.ZERO));
    assertEquals(0, single.sign(0));
    Grid grid = new Grid(List.copyOf(GridText.grid("x=-20:20:41,y=-15:15:31").values()));
    SignProgram line = SignProgram.along(frame, List.of(p), grid);
    long[] at = new long[2];
    for (long n = 0; n < grid.size(); n++) {
      grid.put(n, at);
      line.enter(at);
      line.move(at[1]);
      long squares = at[0] * at[0] - 2 * at[1] * at[1];
      boolean opposite = Long.signum(at[0]) != Long.signum(at[1]);
      int sign = opposite ? Long.signum(at[0] - at[1]) : Long.signum(squares) * Long.signum(at[0]);
      assertEquals(sign, line.sign(0), at[0] + " - r*" + at[1]);
    }
  }

  /** The numbers of a field. */
  private record Field(NumberFieldTower tower) implements NumberSigns {
    @Override
    public int sign(Polynomial number) {
      return tower.sign(number);
    }

    @Override
    public OptionalDouble near(Polynomial number) {
      return OptionalDouble.of(tower.near(number, 60).middle().doubleValue());
    }
  }

  private static BigFraction fraction(long n, long d) {
    return BigFraction.of(BigInteger.valueOf(n), BigInteger.valueOf(d));
  }
}
