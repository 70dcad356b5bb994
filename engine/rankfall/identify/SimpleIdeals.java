package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import java.util.SortedMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Rationals;
import rankfall.lie.InvariantForms;
import rankfall.lie.LieBracket;
import rankfall.lie.PlainKilling;
import rankfall.lie.StructureConstants;
import rankfall.lie.Subspace;

/**
 * The simple ideals of a semisimple algebra over the real or the complex numbers.
 *
 * <p>The centroid, the matrices that commute with ad, is over the complex numbers a sum of as many
 * fields as there are simple ideals (Jacobson, Lie Algebras, chapter X, theorem 1). If a residue
 * bounds its dimension by 1, the algebra is simple. Else a general element phi of it comes from an
 * invariant form, phi = kappa^-1 B. The irreducible factors f of its minimal polynomial over the
 * field of the constants give the simple ideals over that field, the kernels of f(phi). A real root
 * r of f gives a real simple ideal, a pair of complex ones a complex algebra taken over the real
 * numbers. The Killing form of the whole ideal, changed to kappa(h(phi) x, y), has on the real
 * ideal of r the signature of its Killing form times the sign of h(r), and character 0 on the
 * complex ones; h linear with its zero between two real roots tells the characters apart (Hermite
 * 1853).
 */
final class SimpleIdeals {
  private static final long SEED = 1867;

  private SimpleIdeals() {}

  /**
   * An ideal that is simple over the field of the constants.
   *
   * @param basis sparse vectors
   * @param ideals what it is over the real or complex numbers; all of one complex type
   * @param splitting an irreducible polynomial of degree 2 or more, the constant coefficient first,
   *     such that over the field with one of its roots, a real one over an ordered field, it is no
   *     longer simple; empty where there is one ideal, and where all of several are complex ones
   *     taken over the real numbers
   */
  record Part<E>(
      List<SortedMap<Integer, E>> basis, List<SimpleIdeal> ideals, Optional<List<E>> splitting) {
    Part {
      basis = List.copyOf(basis);
      ideals = List.copyOf(ideals);
      splitting = splitting.map(List::copyOf);
    }
  }

  /**
   * The simple ideals.
   *
   * @param algebra semisimple, or of dimension 0
   * @return in no particular order
   */
  static List<SimpleIdeal> of(ExactAlgebra algebra) {
    return Ground.over(
        algebra,
        new Ground.Question<List<SimpleIdeal>>() {
          @Override
          public <E> List<SimpleIdeal> ask(Ground<E> ground, StructureConstants<E> constants) {
            return parts(ground, constants).stream().flatMap(p -> p.ideals().stream()).toList();
          }
        });
  }

  /** The ideals that are simple over the field of the constants. */
  static <E> List<Part<E>> parts(Ground<E> ground, StructureConstants<E> constants) {
    int n = constants.dimension();
    if (n == 0) {
      return List.of();
    }
    List<List<E>> kappa = PlainKilling.of(constants);
    if (n == 3 || isSimpleByResidues(ground, constants)) {
      return List.of(whole(ground, constants, kappa));
    }
    InvariantForms<E> found = InvariantForms.of(LieBracket.of(constants));
    List<List<SortedMap<Integer, E>>> forms = shortened(ground, found).matrices();
    if (forms.size() == 1) {
      return List.of(whole(ground, constants, kappa));
    }
    Centroid<E> phi = Centroid.of(ground, kappa, forms, new Random(SEED));
    List<Part<E>> out = new ArrayList<>();
    for (List<E> factor : phi.factors()) {
      out.add(part(ground, constants, kappa, phi, factor));
    }
    return out;
  }

  /** The same forms by a reduced basis, whose numbers are shorter. */
  private static <E> InvariantForms<E> shortened(Ground<E> ground, InvariantForms<E> forms) {
    Subspace<E> all = forms.forms();
    List<SortedMap<Integer, E>> basis =
        ground.reduced(all.basis(), all.ambient(), all.ambient()).rows();
    return new InvariantForms<>(
        forms.dimension(), new Subspace<>(ground.domain(), all.ambient(), basis, List.of()));
  }

  private static <E> boolean isSimpleByResidues(Ground<E> ground, StructureConstants<E> constants) {
    Random random = new Random(SEED);
    return ResidueMap.of(ground.chain(), false)
        .limit(2)
        .map(map -> ModularAlgebra.of(ground.lifted(constants), map).centroidBound(random))
        .anyMatch(bound -> bound.equals(OptionalInt.of(1)));
  }

  private static <E> Part<E> whole(
      Ground<E> ground, StructureConstants<E> constants, List<List<E>> kappa) {
    int n = constants.dimension();
    OptionalInt character =
        ground.signs().isPresent() ? character(ground, kappa) : OptionalInt.empty();
    SimpleIdeal.Kind kind =
        ground.signs().isPresent() ? SimpleIdeal.Kind.REAL : SimpleIdeal.Kind.COMPLEX;
    Optional<SimpleType> type =
        TypeByTraces.of(
            n,
            ResidueMap.of(ground.chain(), false)
                .map(map -> ModularAlgebra.of(ground.lifted(constants), map))
                .map(m -> new TypeByTraces.Sample(m, random -> Optional.of(m.element(random)))));
    return new Part<>(
        Subspace.whole(ground.domain(), n).basis(),
        List.of(new SimpleIdeal(kind, n, type, character)),
        Optional.empty());
  }

  private static <E> OptionalInt character(Ground<E> ground, List<List<E>> form) {
    var s = ground.signature(form);
    return OptionalInt.of(s.plus() - s.minus());
  }

  private static <E> Part<E> part(
      Ground<E> ground,
      StructureConstants<E> constants,
      List<List<E>> kappa,
      Centroid<E> phi,
      List<E> factor) {
    List<SortedMap<Integer, E>> basis = phi.ideal(factor);
    int degree = factor.size() - 1;
    int dimension = basis.size() / degree;
    Optional<SimpleType> type =
        TypeByTraces.of(
            dimension,
            ResidueMap.of(ground.chain(), true)
                .map(
                    map ->
                        new TypeByTraces.Sample(
                            ModularAlgebra.of(ground.lifted(constants), map),
                            random -> phi.elementOfIdeal(factor, map, random))));
    List<SimpleIdeal> out = new ArrayList<>();
    if (ground.signs().isEmpty()) {
      for (int k = 0; k < degree; k++) {
        out.add(new SimpleIdeal(SimpleIdeal.Kind.COMPLEX, dimension, type, OptionalInt.empty()));
      }
      return new Part<>(basis, out, Optional.of(factor).filter(f -> degree > 1));
    }
    List<Integer> characters = characters(ground, kappa, phi, factor, basis);
    for (int c : characters) {
      out.add(new SimpleIdeal(SimpleIdeal.Kind.REAL, dimension, type, OptionalInt.of(c)));
    }
    for (int k = characters.size(); k < degree; k += 2) {
      out.add(
          new SimpleIdeal(
              SimpleIdeal.Kind.COMPLEX_AS_REAL, 2 * dimension, type, OptionalInt.of(0)));
    }
    boolean split = degree > 1 && !characters.isEmpty();
    return new Part<>(basis, out, Optional.of(factor).filter(f -> split));
  }

  /** The characters of the real ideals, in the order of the real roots of the factor. */
  private static <E> List<Integer> characters(
      Ground<E> ground,
      List<List<E>> kappa,
      Centroid<E> phi,
      List<E> factor,
      List<SortedMap<Integer, E>> basis) {
    List<SortedMap<Integer, E>> rows = kappa.stream().map(ground::sparse).toList();
    int all = character(ground, gram(ground, rows, basis, basis)).getAsInt();
    if (factor.size() == 2) {
      return List.of(all);
    }
    SturmSequence<E> roots = SturmSequence.of(ground, factor);
    List<Integer> out = new ArrayList<>();
    if (roots.count() == 0) {
      return out;
    }
    int above = all;
    for (BigFraction between : roots.separators()) {
      E slope = ground.integer(Rationals.denominator(between));
      E shift = ground.integer(Rationals.numerator(between).negate());
      List<SortedMap<Integer, E>> images =
          basis.stream().map(x -> phi.linear(x, slope, shift)).toList();
      int next = character(ground, gram(ground, rows, images, basis)).getAsInt();
      out.add((above - next) / 2);
      above = next;
    }
    int others = out.stream().mapToInt(Integer::intValue).sum();
    out.add(all - others);
    return out;
  }

  private static <E> List<List<E>> gram(
      Ground<E> ground,
      List<SortedMap<Integer, E>> kappa,
      List<SortedMap<Integer, E>> left,
      List<SortedMap<Integer, E>> right) {
    List<List<E>> out = new ArrayList<>();
    for (SortedMap<Integer, E> x : left) {
      SortedMap<Integer, E> function = ground.combination(x, kappa);
      out.add(right.stream().map(y -> ground.pair(function, y)).toList());
    }
    return out;
  }
}
