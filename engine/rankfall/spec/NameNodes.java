package rankfall.spec;

import java.util.List;
import java.util.stream.Stream;

/** All names in an expression; names inside a function's argument are not among them. */
final class NameNodes implements Expression.Cases<Stream<Expression.Name>> {
  private NameNodes() {}

  /** In the order of the text. */
  static List<Expression.Name> of(Expression e) {
    return e.fold(new NameNodes()).toList();
  }

  @Override
  public Stream<Expression.Name> number(Expression.Number e) {
    return Stream.empty();
  }

  @Override
  public Stream<Expression.Name> name(Expression.Name e) {
    return Stream.of(e);
  }

  @Override
  public Stream<Expression.Name> root(Expression.Root e) {
    return Stream.empty();
  }

  @Override
  public Stream<Expression.Name> function(Expression.Function e) {
    return Stream.empty();
  }

  @Override
  public Stream<Expression.Name> unit(Expression.MatrixUnit e) {
    return Stream.empty();
  }

  @Override
  public Stream<Expression.Name> binary(Expression.Binary e) {
    return Stream.concat(e.left().fold(this), e.right().fold(this));
  }

  @Override
  public Stream<Expression.Name> negation(Expression.Negation e) {
    return e.operand().fold(this);
  }

  @Override
  public Stream<Expression.Name> power(Expression.Power e) {
    return e.base().fold(this);
  }
}
