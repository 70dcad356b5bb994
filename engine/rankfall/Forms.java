package rankfall;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/** What is known of forms beside the Killing form itself; part of an {@link Analysis}. */
public final class Forms {
  private Forms() {}

  /**
   * The Killing form on the torus of the spec, at the general point of a component.
   *
   * @param elements names of the commuting elements t
   * @param imaginary whether the form is the one on the real span of the elements i t (of a
   *     Hermitian spec: of the listed elements), so the negative of the one on the algebra; else on
   *     the real span of the elements of the algebra
   * @param form its matrix K, upper triangle: squared lengths on the diagonal
   * @param positive where K is positive definite; empty for a complex ground, or where it was not
   *     decided
   * @param orthonormal an orthonormal basis, where K is positive definite; empty if it is so
   *     nowhere
   * @param angles between the elements
   * @param dual the inverse of K; empty if K is degenerate throughout
   * @param dualAngles between the elements of the dual basis
   * @param covectors those of the spec; empty without dual
   * @param roots with respect to the torus
   */
  public record TorusForm(
      List<String> elements,
      boolean imaginary,
      List<MatrixEntry> form,
      Optional<Positivity> positive,
      List<UnitVector> orthonormal,
      List<Angle> angles,
      Optional<List<MatrixEntry>> dual,
      List<Angle> dualAngles,
      List<Covector> covectors,
      RootOutcome roots) {
    /** Copies the lists. */
    public TorusForm {
      elements = List.copyOf(elements);
      form = List.copyOf(form);
      orthonormal = List.copyOf(orthonormal);
      angles = List.copyOf(angles);
      dual = dual.map(List::copyOf);
      dualAngles = List.copyOf(dualAngles);
      covectors = List.copyOf(covectors);
    }
  }

  /**
   * Where a form is positive definite.
   *
   * @param somewhere false if it is so at no real point
   * @param conditions all hold exactly where it is so; empty if everywhere, or nowhere
   */
  public record Positivity(boolean somewhere, List<SignCondition> conditions) {
    /** Copies the list. */
    public Positivity {
      conditions = List.copyOf(conditions);
    }
  }

  /**
   * A vector of length 1: the combination divided by the root of its squared length.
   *
   * @param coefficients by element of the torus
   * @param squaredLength of the combination
   */
  public record UnitVector(List<Polynomial> coefficients, RationalFunction squaredLength) {
    /** Copies the list. */
    public UnitVector {
      coefficients = List.copyOf(coefficients);
    }

    /**
     * The length of the combination where it is rational.
     *
     * @return a positive rational number
     */
    public Optional<RationalFunction> rationalLength() {
      if (!squaredLength.isConstant() || squaredLength.numerator().isZero()) {
        return Optional.empty();
      }
      BigInteger above = squaredLength.numerator().constantValue();
      BigInteger below = squaredLength.denominator().constantValue();
      if (above.signum() < 0
          || !above.sqrt().pow(2).equals(above)
          || !below.sqrt().pow(2).equals(below)) {
        return Optional.empty();
      }
      return Optional.of(
          RationalFunction.of(
              Polynomial.constant(squaredLength.numerator().variables(), above.sqrt()),
              Polynomial.constant(squaredLength.numerator().variables(), below.sqrt())));
    }
  }

  /**
   * The angle between two vectors, where the form is positive definite.
   *
   * @param first position from 0
   * @param second position from 0
   * @param product of the two; its sign is that of the cosine
   * @param squaredCosine its square over the product of the squared lengths; empty if a squared
   *     length is 0
   * @param degrees where it is one and the same multiple of 30 or 45 degrees
   */
  public record Angle(
      int first,
      int second,
      RationalFunction product,
      Optional<RationalFunction> squaredCosine,
      Optional<Integer> degrees) {}

  /**
   * A covector of the spec.
   *
   * @param name as in the spec
   * @param components its values on the elements
   * @param sharp the element that the form assigns to it, by element of the torus
   * @param squaredLength of both
   */
  public record Covector(
      String name,
      List<RationalFunction> components,
      List<RationalFunction> sharp,
      RationalFunction squaredLength) {
    /** Copies the lists. */
    public Covector {
      components = List.copyOf(components);
      sharp = List.copyOf(sharp);
    }
  }

  /** The roots, or why there are none. */
  public sealed interface RootOutcome {}

  /**
   * The torus is a Cartan subalgebra and its roots are told. Values are those on the elements of
   * which the form is the Gram matrix.
   *
   * @param type such as {@code A2}
   * @param simple simple roots, in the order of the Cartan matrix, by their values on the elements
   * @param squaredLengths of the simple roots
   * @param cartan the Cartan matrix, entries 2(a_i, a_j)/(a_j, a_j)
   * @param positive the positive roots as sums of simple ones, by height
   */
  public record Roots(
      String type,
      List<List<RationalFunction>> simple,
      List<RationalFunction> squaredLengths,
      List<List<Integer>> cartan,
      List<List<Integer>> positive)
      implements RootOutcome {
    /** Copies the lists. */
    public Roots {
      simple = simple.stream().map(List::copyOf).toList();
      squaredLengths = List.copyOf(squaredLengths);
      cartan = cartan.stream().map(List::copyOf).toList();
      positive = positive.stream().map(List::copyOf).toList();
    }
  }

  /**
   * There are none, or they are not told.
   *
   * @param reason a sentence
   */
  public record WithoutRoots(String reason) implements RootOutcome {}

  /**
   * The quadratic Casimir element, the sum of D^ij e_i e_j; it commutes with every generator.
   *
   * @param entries D, upper triangle: an entry off the diagonal stands before e_i e_j + e_j e_i
   */
  public record Casimir(List<MatrixEntry> entries) {
    /** Copies the list. */
    public Casimir {
      entries = List.copyOf(entries);
    }
  }

  /** Why the invariant forms of a stratum need not, or can not, be written out. */
  public enum Extent {
    /** Each is given. */
    LISTED,
    /** The algebra is semisimple: the Killing form is a non-degenerate one. */
    SEMISIMPLE,
    /** The algebra is abelian: every symmetric form is invariant. */
    ABELIAN,
    /** They are too long to be listed. */
    LONG,
    /** Not decided, dimension included: the computation would be too long. */
    UNDECIDED
  }

  /** An answer that may be missing. */
  public enum Existence {
    YES,
    NO,
    UNKNOWN
  }

  /**
   * The invariant symmetric forms B, B([x,y],z) + B(y,[x,z]) = 0, on a stratum.
   *
   * @param dimension of their space at the general point; 0 if {@code extent} is undecided
   * @param nonDegenerate whether there is a non-degenerate one at the general point
   * @param extent what is listed
   * @param coefficients names c of the coefficients of the general member sum c_k B_k
   * @param basis the B_k in the basis of the stratum, upper triangles, where listed
   * @param determinant of the general member, factored in the c and the parameters; empty if it is
   *     0, or was not written out
   * @param inverse of a member
   * @param deviations where inside the stratum dimension or existence are otherwise
   * @param settled whether these are all such points; else it was not decided
   */
  public record InvariantForms(
      int dimension,
      Existence nonDegenerate,
      Extent extent,
      List<String> coefficients,
      List<List<MatrixEntry>> basis,
      Optional<Quotient> determinant,
      Optional<InverseMember> inverse,
      List<FormDeviation> deviations,
      boolean settled) {
    /** Copies the lists. */
    public InvariantForms {
      coefficients = List.copyOf(coefficients);
      basis = basis.stream().map(List::copyOf).toList();
      deviations = List.copyOf(deviations);
    }
  }

  /**
   * The inverse of a member.
   *
   * @param weights the values of the c; empty for the general member
   * @param entries of the inverse matrix, upper triangle
   */
  public record InverseMember(List<Integer> weights, List<MatrixEntry> entries) {
    /** Copies the lists. */
    public InverseMember {
      weights = List.copyOf(weights);
      entries = List.copyOf(entries);
    }
  }

  /**
   * Points of a stratum at which its invariant forms are otherwise.
   *
   * @param equations what they satisfy beyond the equations of the stratum
   * @param dimension of the space of forms there
   * @param nonDegenerate whether there is a non-degenerate one
   */
  public record FormDeviation(List<Polynomial> equations, int dimension, Existence nonDegenerate) {
    /** Copies the list. */
    public FormDeviation {
      equations = List.copyOf(equations);
    }
  }
}
