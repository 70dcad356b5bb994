package rankfall.spec;

import java.math.BigInteger;
import java.util.SortedMap;
import org.apache.commons.numbers.fraction.BigFraction;

/** What an entry, a condition side or a bracket side says, as read; every number is exact. */
public sealed interface Expression {

  /**
   * Where the expression stands in the file.
   *
   * @return its first to last character
   */
  Place place();

  /**
   * Chooses the case of this node.
   *
   * @param cases what to do in each case
   * @param <T> the result
   * @return the result of the case of this node
   */
  <T> T fold(Cases<T> cases);

  /**
   * One method a kind of node.
   *
   * @param <T> the result
   */
  interface Cases<T> {
    /** An exact rational number. */
    T number(Number e);

    /** A parameter, constant, abbreviation, generator or matrix, or the imaginary unit {@code i}. */
    T name(Name e);

    /** The positive square root of a non-negative rational number. */
    T root(Root e);

    /** A function of an integer combination of parameters. */
    T function(Function e);

    /** A matrix unit. */
    T unit(MatrixUnit e);

    /** A sum, difference, product or quotient. */
    T binary(Binary e);

    /** A negated expression. */
    T negation(Negation e);

    /** An integer power. */
    T power(Power e);
  }

  /** Exact rational number. */
  record Number(BigFraction value, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.number(this);
    }
  }

  /** Name of a parameter, constant, abbreviation, generator or matrix; {@code i} is the unit. */
  record Name(String name, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.name(this);
    }
  }

  /** Positive square root of {@code radicand >= 0}. */
  record Root(BigFraction radicand, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.root(this);
    }
  }

  /** {@code kind} of the combination {@code sum argument[p] * p}; the map holds no zero. */
  record Function(FunctionKind kind, SortedMap<String, BigInteger> argument, Place place)
      implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.function(this);
    }
  }

  /** The matrix with a single 1 at {@code row}, {@code column}, both from 1. */
  record MatrixUnit(int row, int column, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.unit(this);
    }
  }

  /** {@code left operator right}. */
  record Binary(Operator operator, Expression left, Expression right, Place place)
      implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.binary(this);
    }
  }

  /** {@code -operand}. */
  record Negation(Expression operand, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.negation(this);
    }
  }

  /** {@code base^exponent}, {@code |exponent| <= 64}. */
  record Power(Expression base, int exponent, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.power(this);
    }
  }

  /** The four operations between two expressions. */
  enum Operator {
    PLUS,
    MINUS,
    TIMES,
    OVER
  }

  /** The functions of a parameter that the format knows. */
  enum FunctionKind {
    COS,
    SIN,
    TAN,
    EXP,
    COSH,
    SINH,
    TANH
  }
}
