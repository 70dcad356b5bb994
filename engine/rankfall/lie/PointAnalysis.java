package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.exact.Domain;

/** What is said about an algebra whose structure constants are exact numbers. */
public final class PointAnalysis {
  private static final long CHECK_SEED = 41;

  private PointAnalysis() {}

  /**
   * The facts of a real algebra.
   *
   * @param constants real numbers
   * @param generators the number of listed generators
   * @param signs the order of the numbers
   * @param text how numbers print
   */
  public static <E> PointFacts of(
      StructureConstants<E> constants, int generators, SignRule<E> signs, NumberText<E> text) {
    return facts(constants, generators, Optional.of(signs), text);
  }

  /**
   * The facts of a complex algebra; there is no signature, and it is not compact.
   *
   * @param constants complex numbers
   * @param generators the number of listed generators
   * @param text how numbers print
   */
  public static <E> PointFacts complex(
      StructureConstants<E> constants, int generators, NumberText<E> text) {
    return facts(constants, generators, Optional.empty(), text);
  }

  private static <E> PointFacts facts(
      StructureConstants<E> constants,
      int generators,
      Optional<SignRule<E>> signs,
      NumberText<E> text) {
    LieBracket<E> bracket = LieBracket.of(constants);
    AlgebraFacts<E> facts = AlgebraFacts.of(bracket);
    hold(new FormCheck<>(bracket, facts.killing()));
    InvariantForms<E> forms = InvariantForms.of(bracket);
    PointFacts.Killing killing = killing(constants, facts, signs, text);
    int n = facts.dimension();
    return new PointFacts(
        generators,
        n,
        killing,
        facts.derivedSeries().dimensions(),
        facts.lowerCentralSeries().dimensions(),
        facts.centre().dimension(),
        facts.radical().dimension(),
        facts.nilradical().dimension(),
        facts.unimodular(),
        new PointFacts.Forms(forms.count(), forms.maximalRank()),
        facts.abelian(),
        facts.nilpotent(),
        facts.solvable(),
        facts.semisimple(),
        facts.reductive(),
        n > 0 && killing.signature().map(s -> s.minus() == n).orElse(false));
  }

  private static <E> PointFacts.Killing killing(
      StructureConstants<E> constants,
      AlgebraFacts<E> facts,
      Optional<SignRule<E>> signs,
      NumberText<E> text) {
    Domain<E> domain = constants.domain();
    List<List<E>> blocks = CharacteristicPolynomial.byBlocks(domain, facts.killing());
    Optional<Signature> signature = signs.map(s -> Signature.of(blocks, s));
    signature.ifPresent(s -> agree(s, facts.killingRank()));
    E below = domain.one();
    for (int i = 0; i < constants.dimension(); i++) {
      E factor = domain.times(constants.denominator(), constants.scale().get(i));
      below = domain.times(below, domain.times(factor, factor));
    }
    String determinant = text.quotient(CharacteristicPolynomial.determinant(domain, blocks), below);
    return new PointFacts.Killing(
        facts.killingRank(), signature, determinant, matrix(constants, facts.killing(), text));
  }

  /** Entries in the basis e_i, where y_i = scale_i e_i. */
  private static <E> List<List<String>> matrix(
      StructureConstants<E> constants, List<List<E>> kappa, NumberText<E> text) {
    Domain<E> domain = constants.domain();
    E squared = domain.times(constants.denominator(), constants.denominator());
    List<List<String>> out = new ArrayList<>();
    for (int i = 0; i < constants.dimension(); i++) {
      List<String> row = new ArrayList<>();
      for (int j = 0; j < constants.dimension(); j++) {
        E scales = domain.times(constants.scale().get(i), constants.scale().get(j));
        row.add(text.quotient(kappa.get(i).get(j), domain.times(squared, scales)));
      }
      out.add(row);
    }
    return out;
  }

  /** The Killing matrix against the laws, on elements of the algebra. */
  private static void hold(FormCheck<?> check) {
    check
        .all(CHECK_SEED)
        .ifPresent(
            m -> {
              throw new IllegalStateException(
                  "the Killing form breaks " + m.law() + ": " + m.left() + " and " + m.right());
            });
  }

  private static void agree(Signature signature, int rank) {
    if (signature.rank() != rank) {
      throw new IllegalStateException(
          "the Killing form has rank " + rank + " by elimination, but signature " + signature);
    }
  }
}
