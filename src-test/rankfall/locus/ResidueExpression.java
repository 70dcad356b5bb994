package rankfall.locus;

import java.util.Map;
import rankfall.spec.Expression;

/**
 * Values of expressions modulo a prime: a number at position 0, then the coordinates of a vector.
 *
 * @param field the integers modulo a prime
 * @param names values of the names that may occur
 * @param order of the matrices; 0 where no matrix unit may occur
 * @param width number of coordinates and 1
 */
record ResidueExpression(Residues field, Map<String, long[]> names, int order, int width)
    implements Expression.Cases<long[]> {

  /** A divisor is 0. */
  static final class Pole extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }

  /** The expression holds something that these residues do not know. */
  static final class NotRational extends RuntimeException {
    private static final long serialVersionUID = 1L;

    NotRational(String what) {
      super(what);
    }
  }

  long[] of(Expression e) {
    return e.fold(this);
  }

  long[] scalar(long value) {
    long[] out = new long[width];
    out[0] = value;
    return out;
  }

  @Override
  public long[] number(Expression.Number e) {
    return scalar(field.of(e.value()));
  }

  @Override
  public long[] name(Expression.Name e) {
    if (!names.containsKey(e.name())) {
      throw new NotRational(e.name());
    }
    return names.get(e.name());
  }

  @Override
  public long[] root(Expression.Root e) {
    throw new NotRational("a root of " + e.radicand());
  }

  @Override
  public long[] function(Expression.Function e) {
    throw new NotRational(e.kind() + " of " + e.argument());
  }

  @Override
  public long[] unit(Expression.MatrixUnit e) {
    long[] out = new long[width];
    out[1 + (e.row() - 1) * order + e.column() - 1] = 1;
    return out;
  }

  @Override
  public long[] binary(Expression.Binary e) {
    long[] a = of(e.left());
    long[] b = of(e.right());
    return switch (e.operator()) {
      case PLUS -> sum(a, b, 1);
      case MINUS -> sum(a, b, field.prime() - 1);
      case TIMES -> product(a, b);
      case OVER -> over(a, b[0]);
    };
  }

  @Override
  public long[] negation(Expression.Negation e) {
    return product(of(e.operand()), scalar(field.prime() - 1));
  }

  @Override
  public long[] power(Expression.Power e) {
    long[] base = of(e.base());
    long[] out = scalar(1);
    for (int k = 0; k < Math.abs(e.exponent()); k++) {
      out = product(out, base);
    }
    return e.exponent() < 0 ? over(scalar(1), out[0]) : out;
  }

  private long[] over(long[] a, long divisor) {
    if (divisor == 0) {
      throw new Pole();
    }
    return product(a, scalar(field.inverse(divisor)));
  }

  private long[] sum(long[] a, long[] b, long factor) {
    long[] out = a.clone();
    for (int i = 0; i < width; i++) {
      out[i] = (out[i] + factor * b[i]) % field.prime();
    }
    return out;
  }

  /** One of the two has no vector part. */
  private long[] product(long[] a, long[] b) {
    long[] out = new long[width];
    out[0] = a[0] * b[0] % field.prime();
    for (int i = 1; i < width; i++) {
      out[i] = (a[0] * b[i] % field.prime() + a[i] * b[0] % field.prime()) % field.prime();
    }
    return out;
  }
}
