package rankfall;

import java.util.List;
import java.util.Optional;
import rankfall.exact.Factorization;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.spec.Spec;

/**
 * Everything that is known of one family; the writers only render it.
 *
 * @param spec the spec it answers
 * @param version the program's version
 * @param status whether everything was decided
 * @param message for a failed or incomplete family the first thing to read, one line; else empty
 * @param remarks what a reader must know, a sentence each
 * @param undecided what was left undecided and why, a sentence each; empty if complete
 * @param findings absent where the family failed
 */
public record Analysis(
    Spec spec,
    String version,
    Status status,
    String message,
    List<String> remarks,
    List<String> undecided,
    Optional<Findings> findings) {
  /** Copies the lists. */
  public Analysis {
    remarks = List.copyOf(remarks);
    undecided = List.copyOf(undecided);
  }

  /** How far the analysis came. */
  public enum Status {
    COMPLETE,
    INCOMPLETE,
    FAILED
  }

  /** Whether a set has real points (within the domain of the spec). */
  public enum RealPoints {
    YES,
    NO,
    UNKNOWN
  }

  /** What makes a relation hold. */
  public enum Origin {
    SPEC,
    CLOSURE,
    JACOBI,
    FUNCTION,
    CONSTANT
  }

  /**
   * What was found of a family that did not fail.
   *
   * @param listed names of the generators that the spec lists (closure adds none here)
   * @param variables names of the coordinates in which polynomials are written: parameters,
   *     functions of parameters, algebraic numbers
   * @param relations polynomials that vanish on the parameter variety, with the reason
   * @param poles polynomials at whose zeros an entry is undefined
   * @param components the irreducible components, the generic point of each
   * @param strata all strata, in their order; empty where they were not computed
   * @param coverings which stratum lies directly in the closure of which
   * @param regions the real regions of all strata; empty where they were not computed
   * @param contractions of a family of matrices: for each stratum where the span is smaller than at
   *     the general point of a component around it, what the brackets of that point become
   * @param maps pictures of the parameters, or why there is none; empty without parameters or
   *     strata
   * @param scan the default grid, where the spec has one that was counted
   */
  public record Findings(
      List<String> listed,
      List<String> variables,
      List<Relation> relations,
      List<Polynomial> poles,
      List<Component> components,
      List<Stratum> strata,
      List<Covering> coverings,
      List<Region> regions,
      List<Contraction> contractions,
      List<RegionMap> maps,
      Optional<ScanCounts> scan) {
    /** Copies the lists. */
    public Findings {
      listed = List.copyOf(listed);
      variables = List.copyOf(variables);
      relations = List.copyOf(relations);
      poles = List.copyOf(poles);
      components = List.copyOf(components);
      strata = List.copyOf(strata);
      coverings = List.copyOf(coverings);
      regions = List.copyOf(regions);
      contractions = List.copyOf(contractions);
      maps = List.copyOf(maps);
    }

    /** What was found before a grid is counted. */
    public Findings(
        List<String> listed,
        List<String> variables,
        List<Relation> relations,
        List<Polynomial> poles,
        List<Component> components,
        List<Stratum> strata,
        List<Covering> coverings,
        List<Region> regions,
        List<Contraction> contractions,
        List<RegionMap> maps) {
      this(
          listed,
          variables,
          relations,
          poles,
          components,
          strata,
          coverings,
          regions,
          contractions,
          maps,
          Optional.empty());
    }

    /** The same with a grid that was counted. */
    public Findings with(ScanCounts counts) {
      return new Findings(
          listed,
          variables,
          relations,
          poles,
          components,
          strata,
          coverings,
          regions,
          contractions,
          maps,
          Optional.of(counts));
    }
  }

  /**
   * A polynomial that vanishes on the parameter variety.
   *
   * @param polynomial primitive and square-free
   * @param factors its irreducible factors
   * @param origin why it vanishes
   */
  public record Relation(Polynomial polynomial, List<Polynomial> factors, Origin origin) {}

  /**
   * An irreducible component of the parameter variety, asked at its general point.
   *
   * @param number from 1
   * @param equations that cut it out; empty for the whole space
   * @param parameterDimension its dimension
   * @param basis names of the basis of the algebra, in order
   * @param structure the non-zero structure constants, left before right
   * @param killing the Killing form
   * @param dual the non-zero entries of the inverse of the Killing matrix, upper triangle, where it
   *     exists
   * @param conditions where the form degenerates (further)
   * @param torus the form on the torus of the spec, if it names one
   * @param casimir the quadratic Casimir element, where the dual exists
   */
  public record Component(
      int number,
      List<Polynomial> equations,
      int parameterDimension,
      List<String> basis,
      List<StructureEntry> structure,
      Killing killing,
      Optional<List<MatrixEntry>> dual,
      List<Condition> conditions,
      Optional<Forms.TorusForm> torus,
      Optional<Forms.Casimir> casimir) {}

  /**
   * A structure constant: the coefficient of {@code target} in {@code [left, right]}; indices from
   * 0 into the basis.
   */
  public record StructureEntry(int left, int right, int target, RationalFunction coefficient) {}

  /** An entry of a symmetric matrix, {@code row <= column}, indices from 0. */
  public record MatrixEntry(int row, int column, RationalFunction value) {}

  /**
   * The Killing form in a basis.
   *
   * @param entries the non-zero entries, upper triangle
   * @param rank at the general point
   * @param kernel a basis of the kernel at the general point
   * @param blocks index sets, from 0, between which all entries are 0; ascending
   * @param determinant absent where the form is degenerate throughout
   * @param signature where it is the same at all real points at which the form has its general rank
   */
  public record Killing(
      List<MatrixEntry> entries,
      int rank,
      List<Combination> kernel,
      List<List<Integer>> blocks,
      Optional<Quotient> determinant,
      Optional<Signature> signature) {}

  /**
   * Numbers of positive, negative and zero squares.
   *
   * @param plus number of positive squares
   * @param minus number of negative squares
   * @param zero dimension of the kernel
   */
  public record Signature(int plus, int minus, int zero) {}

  /** A quotient of factored polynomials in lowest terms. */
  public record Quotient(Factorization numerator, Factorization denominator) {}

  /** A combination of basis elements: one coefficient each, 0 included. */
  public record Combination(List<Polynomial> coefficients) {}

  /**
   * A locus on which the Killing form degenerates, or falls further in rank.
   *
   * @param equations one irreducible polynomial, or more where the component has equations
   * @param multiplicity of the locus in the determinant; empty where there is no determinant, or
   *     where it was not determined
   * @param rank of the form at the general point of the locus; empty where there is no algebra, the
   *     span not being closed
   * @param kernelDimension of the form there
   * @param basis names of the basis of the algebra there
   * @param kernel a basis of the kernel there
   * @param realPoints of the closed locus
   */
  public record Condition(
      List<Polynomial> equations,
      Optional<Integer> multiplicity,
      Optional<Integer> rank,
      Optional<Integer> kernelDimension,
      List<String> basis,
      List<Combination> kernel,
      RealPoints realPoints) {}

  /**
   * A stratum: points with one profile.
   *
   * @param name {@code S1}, {@code S2} and so on
   * @param equations reduced Groebner basis (graded reverse lexicographic) of its closure; empty
   *     for the whole space
   * @param exclusions closed sets that do not belong to it, each by its equations
   * @param codimension of the closure in the space of the parameters
   * @param dimension of the algebra
   * @param rank of the Killing form
   * @param derived dimension of the derived algebra
   * @param centre dimension of the centre
   * @param radical dimension of the radical (general point)
   * @param nilradical dimension of the nilradical (general point)
   * @param kind abelian, nilpotent, solvable, semisimple, reductive or Levi, in words
   * @param type the name of the algebra, where known
   * @param realPoints of the stratum itself
   * @param witness coordinates of a point of it, by variable, as text; empty where none was found
   * @param basis names of a basis of the algebra at the general point
   * @param kernel a basis of the kernel of the Killing form at the general point
   * @param remarks where a stated fact changes inside the stratum, a sentence each
   * @param invariantForms its invariant forms; empty where they were not decided
   */
  public record Stratum(
      String name,
      List<Polynomial> equations,
      List<List<Polynomial>> exclusions,
      int codimension,
      int dimension,
      int rank,
      int derived,
      int centre,
      int radical,
      int nilradical,
      String kind,
      Optional<String> type,
      RealPoints realPoints,
      List<Coordinate> witness,
      List<String> basis,
      List<Combination> kernel,
      List<String> remarks,
      Optional<Forms.InvariantForms> invariantForms) {
    /** The same with the name of the algebra. */
    public Stratum withType(String name) {
      return new Stratum(
          this.name,
          equations,
          exclusions,
          codimension,
          dimension,
          rank,
          derived,
          centre,
          radical,
          nilradical,
          kind,
          Optional.of(name),
          realPoints,
          witness,
          basis,
          kernel,
          remarks,
          invariantForms);
    }

    /** The dimension of the kernel of the Killing form. */
    public int kernelDimension() {
      return dimension - rank;
    }
  }

  /** A coordinate of a point: {@code value} is a fraction, or a root as the contract writes it. */
  public record Coordinate(String variable, String value) {}

  /** {@code lower} lies in the closure of {@code upper}, and nothing lies between. */
  public record Covering(String lower, String upper) {}

  /**
   * A real region of a stratum.
   *
   * @param stratum name of the stratum
   * @param name {@code R1} and so on within the stratum
   * @param conditions all hold; none follows from the others and the stratum
   * @param signature of the Killing form
   * @param type the real algebra, where its name is known
   * @param exact whether an exact decomposition established the list
   * @param witness a point of it
   */
  public record Region(
      String stratum,
      String name,
      List<SignCondition> conditions,
      Signature signature,
      Optional<AlgebraType> type,
      boolean exact,
      List<Coordinate> witness) {
    /** Copies the lists. */
    public Region {
      conditions = List.copyOf(conditions);
      witness = List.copyOf(witness);
    }
  }

  /**
   * The brackets at the general point of a component, followed to the general point of a stratum.
   *
   * @param stratum name of the stratum, inside the component
   * @param component number of the component
   * @param basis names of the basis at the general point of the component
   * @param outcome what they become
   */
  public record Contraction(
      String stratum, int component, List<String> basis, ContractionOutcome outcome) {
    /** Copies the list. */
    public Contraction {
      basis = List.copyOf(basis);
    }
  }

  /** What the brackets become. */
  public sealed interface ContractionOutcome permits Contracted, WithoutLimit, Unfollowed {
    /** Structure constants: all of the limit, or those that stand in its way. */
    List<StructureEntry> structure();
  }

  /**
   * They have a limit: the contracted algebra, in general another algebra than the span.
   *
   * @param structure its non-zero structure constants at the general point of the stratum
   * @param rank of its Killing form
   * @param derived dimension of its derived algebra
   * @param centre dimension of its centre
   * @param type its name, where it was looked for; at the witness of the stratum unless the
   *     structure constants are numbers
   */
  public record Contracted(
      List<StructureEntry> structure, int rank, int derived, int centre, Optional<AlgebraType> type)
      implements ContractionOutcome {}

  /**
   * They have no limit.
   *
   * @param structure the constants that have none, as at the general point of the component
   */
  public record WithoutLimit(List<StructureEntry> structure) implements ContractionOutcome {}

  /**
   * It was not decided.
   *
   * @param structure the constants in question, as at the general point of the component
   * @param reason a clause
   */
  public record Unfollowed(List<StructureEntry> structure, String reason)
      implements ContractionOutcome {}
}
