package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Determinant;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.AdjointTraces;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.FormCheck;
import rankfall.lie.KillingForm;
import rankfall.lie.LieBracket;
import rankfall.lie.Span;
import rankfall.lie.SpanInput;
import rankfall.lie.StructureConstants;

/**
 * The algebra and its Killing form at the general point of an irreducible set, with exact values in
 * the basis of the listed generators; checked before anybody sees it.
 *
 * @param chain the set
 * @param basis names of the basis
 * @param constants the brackets
 * @param solved the equations that are solved where constants are printed: those of the algebraic
 *     numbers alone where the spec lists the brackets, so that they print as listed
 * @param form the Killing form
 * @param nonVanishing what was assumed not to vanish
 */
public record ComponentForm(
    Chain chain,
    List<String> basis,
    StructureConstants<Polynomial> constants,
    Chain solved,
    KillingForm form,
    List<Polynomial> nonVanishing) {

  /** A self-check found that two ways to the same form differ. */
  public static final class Mismatch extends IllegalStateException {
    private static final long serialVersionUID = 1L;

    Mismatch(String what) {
      super("self-check failed: " + what);
    }
  }

  /**
   * The form at the general point of a piece.
   *
   * @param family the family
   * @param piece the span is closed at its general point
   * @param seed of the random elements and points of the checks
   * @throws Mismatch if a self-check fails
   */
  public static ComponentForm of(
      Family family, Piece piece, List<Polynomial> equations, long seed) {
    Chain chain = piece.chain();
    if (family.on(family.ring().constants()) instanceof FamilySite.Algebraic whole
        && whole.input() instanceof SpanInput.Table<Polynomial> table
        && !equations.isEmpty()) {
      return ofTable(family, piece, equations, table, seed);
    }
    if (!(family.on(chain) instanceof FamilySite.Algebraic at)
        || !(Span.of(at.input()) instanceof Span.Closed<Polynomial> closed)) {
      throw new IllegalArgumentException("no algebra at the general point of " + chain.rules());
    }
    StructureConstants<Polynomial> constants = closed.constants();
    List<List<Polynomial>> traces = new AdjointTraces(chain.variables()).of(constants);
    ComponentForm out =
        new ComponentForm(
            chain,
            closed.names(),
            constants,
            chain,
            KillingForm.of(chain, constants, traces),
            closed.nonVanishing());
    out.verify(family, piece, traces, seed);
    return out;
  }

  /**
   * Of brackets that the spec lists nothing is solved for: constants and form keep their
   * polynomials, in normal form modulo the equations of the set.
   */
  private static ComponentForm ofTable(
      Family family,
      Piece piece,
      List<Polynomial> equations,
      SpanInput.Table<Polynomial> table,
      long seed) {
    Chain numbers = family.ring().constants();
    StructureConstants<Polynomial> given = table.table();
    StructureConstants<Polynomial> constants =
        new StructureConstants<>(
            piece.chain(), given.dimension(), given.brackets(), given.denominator(), given.scale());
    List<List<Polynomial>> traces = new AdjointTraces(numbers.variables()).of(constants);
    GroebnerBasis bases = new GroebnerBasis(numbers);
    List<List<RationalFunction>> matrix = new ArrayList<>();
    for (List<RationalFunction> row : KillingForm.of(numbers, given, traces).matrix()) {
      matrix.add(
          row.stream()
              .map(
                  f ->
                      bases
                          .normalForm(equations, f.numerator())
                          .over(RationalFunction.of(f.denominator())))
              .toList());
    }
    ComponentForm out =
        new ComponentForm(
            piece.chain(),
            table.names(),
            constants,
            numbers,
            new KillingForm(piece.chain(), matrix),
            List.of());
    out.verify(family, piece, traces, seed);
    return out;
  }

  /** The laws of the form on random elements, and the plain recomputation at a random point. */
  private void verify(Family family, Piece piece, List<List<Polynomial>> traces, long seed) {
    Optional<FormCheck.Mismatch> law = new FormCheck<>(LieBracket.of(constants), traces).all(seed);
    if (law.isPresent()) {
      throw new Mismatch(law.get().law() + " does not hold");
    }
    Optional<String> difference =
        SecondPath.difference(family, piece, basis, form, nonVanishing, seed);
    if (difference.isPresent()) {
      throw new Mismatch(difference.get());
    }
  }

  /**
   * A structure constant of the basis.
   *
   * @return the coefficient of the k-th element in the bracket of the i-th with the j-th
   */
  public RationalFunction structure(int i, int j, int k) {
    Polynomial c = constants.bracket(i, j).getOrDefault(k, chain.zero());
    List<Polynomial> s = constants.scale();
    return ChainFractions.canonical(
        solved, c.times(s.get(k)), constants.denominator().times(s.get(i)).times(s.get(j)));
  }

  /**
   * Polynomials whose product is the determinant, up to a number.
   *
   * @return one a block; empty if an entry of the form has a denominator
   */
  public List<Polynomial> blockDeterminants() {
    List<Polynomial> out = new ArrayList<>();
    for (List<Integer> block : form.blocks()) {
      List<List<Polynomial>> rows = new ArrayList<>();
      for (int i : block) {
        List<Polynomial> row = new ArrayList<>();
        for (int j : block) {
          RationalFunction f = form.matrix().get(i).get(j);
          if (!f.denominator().isConstant()) {
            return List.of();
          }
          row.add(f.times(RationalFunction.of(common())).numerator());
        }
        rows.add(row);
      }
      out.add(Determinant.of(chain.variables(), rows));
    }
    return out;
  }

  /** The product of the integers that stand below the entries. */
  private Polynomial common() {
    Polynomial product = chain.one();
    for (List<RationalFunction> row : form.matrix()) {
      for (RationalFunction f : row) {
        Polynomial d = f.denominator();
        product = product.times(d.over(d.gcd(product)));
      }
    }
    return product;
  }

  /** The positions k at which {@link #structure} is not 0. */
  public List<Integer> targets(int i, int j) {
    return new ArrayList<>(constants.bracket(i, j).keySet());
  }
}
