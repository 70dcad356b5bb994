package rankfall.spec;

import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** The value of an expression of numbers alone; empty where there is none, or where it is huge. */
final class RationalValue implements Expression.Cases<Optional<BigFraction>> {
  /** Numerators and denominators of more bits are not formed. */
  private static final int MAX_BITS = 200_000;

  private RationalValue() {}

  static Optional<BigFraction> of(Expression e) {
    return e.fold(new RationalValue());
  }

  @Override
  public Optional<BigFraction> number(Expression.Number e) {
    return Optional.of(e.value());
  }

  @Override
  public Optional<BigFraction> name(Expression.Name e) {
    return Optional.empty();
  }

  @Override
  public Optional<BigFraction> root(Expression.Root e) {
    return Optional.empty();
  }

  @Override
  public Optional<BigFraction> function(Expression.Function e) {
    return Optional.empty();
  }

  @Override
  public Optional<BigFraction> unit(Expression.MatrixUnit e) {
    return Optional.empty();
  }

  @Override
  public Optional<BigFraction> binary(Expression.Binary e) {
    Optional<BigFraction> left = e.left().fold(this);
    Optional<BigFraction> right = left.isPresent() ? e.right().fold(this) : Optional.empty();
    return right.flatMap(r -> apply(e.operator(), left.get(), r));
  }

  private static Optional<BigFraction> apply(
      Expression.Operator operator, BigFraction left, BigFraction right) {
    if (bits(left) + bits(right) > MAX_BITS
        || (operator == Expression.Operator.OVER && right.signum() == 0)) {
      return Optional.empty();
    }
    return Optional.of(
        switch (operator) {
          case PLUS -> left.add(right);
          case MINUS -> left.subtract(right);
          case TIMES -> left.multiply(right);
          case OVER -> left.divide(right);
        });
  }

  @Override
  public Optional<BigFraction> negation(Expression.Negation e) {
    return e.operand().fold(this).map(BigFraction::negate);
  }

  @Override
  public Optional<BigFraction> power(Expression.Power e) {
    return e.base()
        .fold(this)
        .filter(base -> e.exponent() > 0 || base.signum() != 0)
        .filter(base -> bits(base) * Math.abs(e.exponent()) <= MAX_BITS)
        .map(base -> base.pow(e.exponent()));
  }

  private static long bits(BigFraction value) {
    return (long) value.getNumerator().bitLength() + value.getDenominator().bitLength();
  }
}
