package rankfall.spec;

/**
 * Checks by its form that an expression is a combination of generators or matrices with scalar
 * coefficients.
 */
final class Linearity implements Expression.Cases<Linearity.Kind> {
  /** ZERO is a number that is 0 and fits everywhere. */
  enum Kind {
    ZERO,
    SCALAR,
    VECTOR
  }

  private final Scope scope;
  private final String vectors;

  private Linearity(Scope scope, String vectors) {
    this.scope = scope;
    this.vectors = vectors;
  }

  /**
   * Checks an expression.
   *
   * @param vectors what the vectors are, as in "generators"
   * @return VECTOR or ZERO
   * @throws SpecFault if it is no combination of vectors
   */
  static Kind check(Expression e, Scope scope, String vectors) {
    Kind kind = e.fold(new Linearity(scope, vectors));
    if (kind == Kind.SCALAR) {
      throw SpecFault.of(
          e.place(),
          scope.setting() + " is a number, not a combination of " + vectors,
          "write a combination of " + vectors + ", or 0");
    }
    return kind;
  }

  @Override
  public Kind number(Expression.Number e) {
    return e.value().signum() == 0 ? Kind.ZERO : Kind.SCALAR;
  }

  @Override
  public Kind name(Expression.Name e) {
    return scope.isVector(e.name()) ? Kind.VECTOR : Kind.SCALAR;
  }

  @Override
  public Kind root(Expression.Root e) {
    return Kind.SCALAR;
  }

  @Override
  public Kind function(Expression.Function e) {
    return Kind.SCALAR;
  }

  @Override
  public Kind unit(Expression.MatrixUnit e) {
    return Kind.VECTOR;
  }

  @Override
  public Kind binary(Expression.Binary e) {
    Kind left = e.left().fold(this);
    Kind right = e.right().fold(this);
    return switch (e.operator()) {
      case PLUS, MINUS -> added(e, left, right);
      case TIMES -> multiplied(e, left, right);
      case OVER -> {
        if (right == Kind.VECTOR) {
          throw SpecFault.of(e.right().place(), "a division by " + vectors + " has no meaning");
        }
        yield left;
      }
    };
  }

  private Kind added(Expression.Binary e, Kind left, Kind right) {
    if (left == Kind.ZERO) {
      return right;
    }
    if (right == Kind.ZERO || left == right) {
      return left;
    }
    throw SpecFault.of(
        (left == Kind.SCALAR ? e.left() : e.right()).place(),
        "a number is added to " + vectors + " in " + scope.setting(),
        "every term is a multiple of one of the " + vectors);
  }

  private Kind multiplied(Expression.Binary e, Kind left, Kind right) {
    if (left == Kind.VECTOR && right == Kind.VECTOR) {
      throw SpecFault.of(
          e.place(),
          "a product of two " + vectors + " in " + scope.setting(),
          "every term is a number times one of the " + vectors);
    }
    if (left == Kind.ZERO || right == Kind.ZERO) {
      return Kind.ZERO;
    }
    return left == Kind.VECTOR ? left : right;
  }

  @Override
  public Kind negation(Expression.Negation e) {
    return e.operand().fold(this);
  }

  @Override
  public Kind power(Expression.Power e) {
    Kind base = e.base().fold(this);
    if (base == Kind.VECTOR && e.exponent() != 1) {
      throw SpecFault.of(
          e.place(), "a power of " + vectors + " has no meaning in " + scope.setting());
    }
    return base == Kind.ZERO && e.exponent() == 0 ? Kind.SCALAR : base;
  }
}
