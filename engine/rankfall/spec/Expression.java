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
    /**
     * An exact rational number.
     *
     * @param e the node
     * @return the result for it
     */
    T number(Number e);

    /**
     * A parameter, constant, abbreviation, generator or matrix, or the imaginary unit {@code i}.
     *
     * @param e the node
     * @return the result for it
     */
    T name(Name e);

    /**
     * The positive square root of a non-negative rational number.
     *
     * @param e the node
     * @return the result for it
     */
    T root(Root e);

    /**
     * A function of an integer combination of parameters.
     *
     * @param e the node
     * @return the result for it
     */
    T function(Function e);

    /**
     * A matrix unit.
     *
     * @param e the node
     * @return the result for it
     */
    T unit(MatrixUnit e);

    /**
     * A sum, difference, product or quotient.
     *
     * @param e the node
     * @return the result for it
     */
    T binary(Binary e);

    /**
     * A negated expression.
     *
     * @param e the node
     * @return the result for it
     */
    T negation(Negation e);

    /**
     * An integer power.
     *
     * @param e the node
     * @return the result for it
     */
    T power(Power e);
  }

  /**
   * Exact rational number.
   *
   * @param value the number in lowest terms
   * @param place where it stands
   */
  record Number(BigFraction value, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.number(this);
    }
  }

  /**
   * Name of a parameter, constant, abbreviation, generator or matrix; {@code i} is the imaginary
   * unit.
   *
   * @param name the name as written
   * @param place where it stands
   */
  record Name(String name, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.name(this);
    }
  }

  /**
   * Square root that is not negative.
   *
   * @param radicand the number under the root, {@code >= 0}; it may be a square
   * @param place where it stands
   */
  record Root(BigFraction radicand, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.root(this);
    }
  }

  /**
   * A function of the combination {@code sum argument[p] * p} over parameters p.
   *
   * @param kind which function
   * @param argument coefficients by parameter, at least one, none 0
   * @param place where it stands
   */
  record Function(FunctionKind kind, SortedMap<String, BigInteger> argument, Place place)
      implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.function(this);
    }
  }

  /**
   * The matrix with a single 1 and zeros elsewhere.
   *
   * @param row the row of the 1, from 1
   * @param column the column of the 1, from 1
   * @param place where it stands
   */
  record MatrixUnit(int row, int column, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.unit(this);
    }
  }

  /**
   * {@code left operator right}.
   *
   * @param operator the operation
   * @param left the first operand
   * @param right the second operand; never a number expression of value 0 in a quotient
   * @param place where it stands
   */
  record Binary(Operator operator, Expression left, Expression right, Place place)
      implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.binary(this);
    }
  }

  /**
   * {@code -operand}.
   *
   * @param operand what is negated
   * @param place where it stands
   */
  record Negation(Expression operand, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.negation(this);
    }
  }

  /**
   * {@code base^exponent}.
   *
   * @param base what is raised
   * @param exponent the power, {@code -64 <= exponent <= 64}
   * @param place where it stands
   */
  record Power(Expression base, int exponent, Place place) implements Expression {
    @Override
    public <T> T fold(Cases<T> cases) {
      return cases.power(this);
    }
  }

  /** The four operations between two expressions. */
  enum Operator {
    /** {@code +}. */
    PLUS,
    /** {@code -}. */
    MINUS,
    /** {@code *}. */
    TIMES,
    /** {@code /}. */
    OVER
  }

  /** The functions of a parameter that the format knows. */
  enum FunctionKind {
    /** Cosine. */
    COS,
    /** Sine. */
    SIN,
    /** Tangent. */
    TAN,
    /** Exponential function. */
    EXP,
    /** Hyperbolic cosine. */
    COSH,
    /** Hyperbolic sine. */
    SINH,
    /** Hyperbolic tangent. */
    TANH
  }
}
