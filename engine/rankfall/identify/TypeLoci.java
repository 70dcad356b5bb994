package rankfall.identify;

import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.locus.Meter;
import rankfall.locus.Profile;
import rankfall.locus.Strata;

/**
 * Where inside a stratum the name of the algebra may change.
 *
 * <p>A stratum is cut until everything on which a name depends, but signs and continuous
 * parameters, is constant: up to dimension 4 the class of {@link SmallAlgebra}, above that
 * dimensions of ideals ({@link LargeFacts}). The sets are canonical like strata: the irreducible
 * components of the closures of the sets where all of that is the same.
 *
 * @param loci the general one first; the others by text of their equations
 */
public record TypeLoci(List<Locus> loci) {
  /** Copies the list. */
  public TypeLoci {
    loci = List.copyOf(loci);
  }

  /** Why the name at one point of a connected set inside a locus is the name on all of it. */
  public enum Argument {
    /** The class is one of a list, which the data of the locus tell up to parameters and signs. */
    CLASSIFICATION,
    /**
     * The algebra is semisimple, or the sum of a semisimple one and its centre: isomorphism classes
     * of semisimple algebras are open (Nijenhuis and Richardson 1967), so constant on connected
     * sets.
     */
    RIGIDITY,
    /**
     * The radical is nilpotent with a derived algebra of dimension 0 or 1. Levi factors form a
     * continuous family up to conjugation (Nijenhuis and Richardson 1967), their modules are
     * discrete, and invariant alternating forms of constant rank on a module are open orbits of its
     * automorphisms: a form w(Y., .) near w with Y self-adjoint is the change of w by X = Y/2. So
     * the class is constant on connected sets.
     */
    MODULE,
    /**
     * The class may vary, but the names given say no more than the class of the Levi factor, its
     * modules and dimensions that are constant.
     */
    DIMENSIONS,
    /** None: a solvable summand of dimension 3 or 4 has parameters that were not followed. */
    NONE
  }

  /**
   * A set inside the stratum.
   *
   * @param chain its general point
   * @param equations what its points satisfy beyond the equations of the stratum; empty for the
   *     general one
   * @param exclusions sets that do not belong to it, beside those excluded from the stratum: the
   *     equations that each adds to those of this locus and of the stratum
   * @param walls irreducible polynomials whose signs decide the name, beside the signature;
   *     primitive. Where one vanishes inside the locus nothing is said; these points are of lower
   *     dimension
   * @param argument why one point speaks for a connected set
   * @param parameters how a name ends whose class has continuous parameters, by the text before the
   *     first comma, for example {@code h = a^2} by {@code Bianchi VII_h}; equal as rational
   *     functions on the locus; empty where the parameters are constant
   */
  public record Locus(
      Chain chain,
      List<Polynomial> equations,
      List<List<Polynomial>> exclusions,
      List<Polynomial> walls,
      Argument argument,
      SortedMap<String, String> parameters) {
    /** Copies the lists. */
    public Locus {
      equations = List.copyOf(equations);
      exclusions = exclusions.stream().map(List::copyOf).toList();
      walls = List.copyOf(walls);
      parameters = java.util.Collections.unmodifiableSortedMap(new TreeMap<>(parameters));
    }

    /** Whether the name at one point, up to parameters, is that on a connected set. */
    public boolean proved() {
      return argument != Argument.NONE;
    }

    /**
     * The name on a connected set inside the locus.
     *
     * @param atPoint the name at one of its points
     * @return with the parameters as expressions
     */
    public TypeName onCell(TypeName atPoint) {
      if (parameters.isEmpty()) {
        return atPoint;
      }
      return new TypeName(
          onCell(atPoint.name()), atPoint.otherNames().stream().map(this::onCell).toList());
    }

    private String onCell(String name) {
      int comma = name.indexOf(", ");
      if (comma < 0) {
        return name;
      }
      String head = name.substring(0, comma);
      String text = parameters.get(head);
      return text == null ? head : head + ", " + text;
    }
  }

  /**
   * The loci of a stratum.
   *
   * @param stratum with the leaves inside it
   * @param constants the chain of the algebraic numbers
   * @param meter ends the work early
   * @throws Meter.Exhausted if the time or the branches are used up
   */
  public static TypeLoci of(Strata.Stratum stratum, Chain constants, Meter meter) {
    Profile p = stratum.profile();
    boolean rigid = p.rank() == p.dimension() || p.derived() == 0;
    if (rigid) {
      Argument argument = p.derived() == 0 ? Argument.CLASSIFICATION : Argument.RIGIDITY;
      return new TypeLoci(
          List.of(
              new Locus(
                  stratum.closure(), List.of(), List.of(), List.of(), argument, new TreeMap<>())));
    }
    return new TypeLociSearch(stratum, constants, meter).loci();
  }
}
