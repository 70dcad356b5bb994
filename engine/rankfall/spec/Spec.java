package rankfall.spec;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/**
 * One family as its spec describes it: names are known, shapes agree, every number is exact;
 * nothing is evaluated yet.
 *
 * @param family the name of the family and of its report folder
 * @param title one line, where given
 * @param notes plain text, where given
 * @param ground the field over which the span is taken
 * @param convention how the listed elements relate to the algebra
 * @param parameters the parameters, in the order of variables and columns
 * @param where what the parameters satisfy, in the order of the text
 * @param constants the algebraic numbers given by a minimal polynomial
 * @param abbreviations names for longer expressions; each uses earlier ones at most
 * @param presentation matrices or brackets
 * @param torus names of commuting generators; may be empty
 * @param covectors by name: components by generator of the torus
 * @param scan the default grid: values by parameter, in the order of the parameters; may be empty
 * @param source the file and the text it came from
 */
public record Spec(
    String family,
    Optional<String> title,
    Optional<String> notes,
    Ground ground,
    Convention convention,
    List<String> parameters,
    List<Condition> where,
    List<Constant> constants,
    List<Abbreviation> abbreviations,
    Presentation presentation,
    List<String> torus,
    Map<String, Map<String, Expression>> covectors,
    Map<String, List<BigFraction>> scan,
    Source source) {

  /** The field over which the span is taken. */
  public enum Ground {
    /** The span over the real numbers. */
    REAL,
    /** The span over the complex numbers. */
    COMPLEX
  }

  /** {@code HERMITIAN}: the algebra is spanned by -i T for the listed T. */
  public enum Convention {
    /** The algebra is spanned by the listed elements. */
    DIRECT,
    /** The algebra is spanned by -i T for the listed T. */
    HERMITIAN
  }

  /** {@code GENERATE}: brackets are added as new generators until the span is closed. */
  public enum Closure {
    /** The conditions for a closed span join the relations. */
    REQUIRE,
    /** Brackets join the generators. */
    GENERATE
  }

  /** Order relations that a condition may state. */
  public enum Relation {
    /** {@code =}. */
    EQUAL,
    /** {@code !=}. */
    UNEQUAL,
    /** {@code <}. */
    LESS,
    /** {@code <=}. */
    LESS_OR_EQUAL,
    /** {@code >}. */
    GREATER,
    /** {@code >=}. */
    GREATER_OR_EQUAL
  }

  /**
   * {@code left relation right}.
   *
   * @param left its left side, without generators
   * @param relation the sign between the sides
   * @param right its right side, without generators
   * @param text the condition as written
   * @param place where it stands
   */
  public record Condition(
      Expression left, Relation relation, Expression right, String text, Place place) {}

  /**
   * An algebraic number: the real root of {@code minimal} nearest to {@code near}.
   *
   * @param name its name
   * @param coefficients of the polynomial, constant term first, last one not 0; the degree is 1 to
   *     64. Whether it is irreducible, or has a real root, is not looked at here
   * @param near a number near the root that is meant
   * @param place where its name stands
   */
  public record Constant(
      String name, List<BigFraction> coefficients, BigFraction near, Place place) {}

  /**
   * A name for a longer expression.
   *
   * @param name the name
   * @param value what it stands for; it uses earlier abbreviations at most
   * @param place where its name stands
   */
  public record Abbreviation(String name, Expression value, Place place) {}

  /** Matrices or brackets. */
  public sealed interface Presentation {
    /**
     * The listed generators in order.
     *
     * @return their names
     */
    List<String> generators();
  }

  /**
   * Matrices of one order.
   *
   * @param order number of rows and of columns
   * @param closure what is done where the span is not closed
   * @param matrices in the order of the text
   */
  public record Matrices(int order, Closure closure, List<NamedMatrix> matrices)
      implements Presentation {
    @Override
    public List<String> generators() {
      return matrices.stream().map(NamedMatrix::name).toList();
    }
  }

  /**
   * A matrix with its name.
   *
   * @param name the name of the generator
   * @param body its entries
   * @param place where its name stands
   */
  public record NamedMatrix(String name, MatrixBody body, Place place) {}

  /** A matrix by rows, or a combination of matrix units and earlier matrices. */
  public sealed interface MatrixBody {}

  /**
   * Rows of entries, square.
   *
   * @param entries row by row
   */
  public record Rows(List<List<Expression>> entries) implements MatrixBody {}

  /**
   * A combination of matrix units and of earlier matrices.
   *
   * @param value linear in them by its form, or a number expression of value 0
   */
  public record Combination(Expression value) implements MatrixBody {}

  /**
   * Brackets of named generators; what is not listed is 0.
   *
   * @param generators their order
   * @param equations as listed; a pair may stand twice (equality of both is checked later)
   */
  public record Brackets(List<String> generators, List<BracketEquation> equations)
      implements Presentation {}

  /**
   * {@code [left, right] = value}.
   *
   * @param left the first generator
   * @param right the second generator, another one
   * @param value a combination of generators by its form, or a number expression of value 0
   * @param place where the equation stands
   */
  public record BracketEquation(String left, String right, Expression value, Place place) {}

  /**
   * Where a spec came from.
   *
   * @param file the file as the user named it
   * @param lines all lines of the file, for messages
   * @param sha256 hexadecimal SHA-256 of the bytes of the whole file
   * @param familyPlace where the value of {@code family} stands
   * @param torusPlaces where the elements of {@code torus} stand, in order
   */
  public record Source(
      String file, List<String> lines, String sha256, Place familyPlace, List<Place> torusPlaces) {
    /** Copies the list. */
    public Source {
      torusPlaces = List.copyOf(torusPlaces);
    }

    /**
     * A fault at a place of this file.
     *
     * @param place the stretch of text at fault
     * @param cause what is wrong
     * @param advice what would be right, where that can be said
     * @return the diagnostic with the line shown
     */
    public Diagnostic fault(Place place, String cause, Optional<String> advice) {
      return new Diagnostic(place, lines.get(place.line() - 1), cause, advice);
    }
  }
}
