package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.function.Function;
import rankfall.lie.AlgebraFacts;
import rankfall.lie.Ideals;
import rankfall.lie.LieBracket;
import rankfall.lie.StructureConstants;
import rankfall.lie.Subspace;

/**
 * The work of {@link LeviNames} over one ground.
 *
 * @param ground the field
 * @param solvable names solvable algebras that are not abelian, where it can
 */
record LeviName<E>(Ground<E> ground, Function<ExactAlgebra, Optional<TypeName>> solvable) {
  /** The remark on algebras of compact groups whose centre has positive dimension. */
  static final String COMPACT = "compact type + centre";

  /** The name of an algebra. */
  TypeName of(StructureConstants<E> constants) {
    LieBracket<E> bracket = LieBracket.of(constants);
    AlgebraFacts<E> facts = AlgebraFacts.of(bracket);
    if (facts.dimension() == 0) {
      return TypeName.of("0");
    }
    if (facts.semisimple()) {
      return semisimple(constants);
    }
    List<TypeName> summands = new ArrayList<>();
    Subspace<E> commuting = centraliser(bracket, facts.radical());
    Subspace<E> apart = Ideals.bracket(bracket, commuting, commuting);
    StructureConstants<E> rest = constants;
    if (apart.dimension() > 0) {
      summands.add(semisimple(Section.subalgebra(ground, bracket, apart.basis()).constants()));
      rest = subalgebra(bracket, centraliser(bracket, apart));
    }
    int abelian = 0;
    if (rest.dimension() > 0) {
      LieBracket<E> open = LieBracket.of(rest);
      List<SortedMap<Integer, E>> central = centralSummand(open);
      abelian = central.size();
      rest = Section.quotient(ground, open, central).constants();
    }
    if (rest.dimension() > 0) {
      summands.add(indecomposable(rest));
    }
    TypeName name = sum(summands, abelian);
    boolean compact = facts.reductive() && !facts.abelian() && isCompactTypeAndCentre(facts);
    return compact ? name.with(List.of(COMPACT)) : name;
  }

  /** The name of the algebra modulo its radical. */
  Optional<TypeName> factor(StructureConstants<E> constants) {
    LieBracket<E> bracket = LieBracket.of(constants);
    AlgebraFacts<E> facts = AlgebraFacts.of(bracket);
    return facts.solvable()
        ? Optional.empty()
        : Optional.of(
            semisimple(Section.quotient(ground, bracket, facts.radical().basis()).constants()));
  }

  /** Whether the Killing form is negative semidefinite with the centre as kernel. */
  boolean compactTypeAndCentre(StructureConstants<E> constants) {
    return isCompactTypeAndCentre(AlgebraFacts.of(constants));
  }

  private boolean isCompactTypeAndCentre(AlgebraFacts<E> facts) {
    return ground.signs().isPresent()
        && facts.killingKernel().dimension() == facts.centre().dimension()
        && ground.signature(facts.killing()).plus() == 0;
  }

  private TypeName semisimple(StructureConstants<E> constants) {
    return SumName.of(
        SimpleIdeals.parts(ground, constants).stream().flatMap(p -> p.ideals().stream()).toList());
  }

  private StructureConstants<E> subalgebra(LieBracket<E> bracket, Subspace<E> subspace) {
    return Section.subalgebra(ground, bracket, subspace.basis()).constants();
  }

  /** The elements that commute with a subspace. */
  private Subspace<E> centraliser(LieBracket<E> bracket, Subspace<E> of) {
    int n = bracket.dimension();
    List<SortedMap<Integer, E>> functions = new ArrayList<>();
    for (SortedMap<Integer, E> x : of.basis()) {
      functions.addAll(Action.transposed(bracket.adjoint(x), n));
    }
    return Subspace.kernel(ground.domain(), n, functions);
  }

  /** A complement, within the centre, of its part in the derived algebra. */
  private List<SortedMap<Integer, E>> centralSummand(LieBracket<E> bracket) {
    int n = bracket.dimension();
    List<SortedMap<Integer, E>> inside = new ArrayList<>(Ideals.derived(bracket).basis());
    List<SortedMap<Integer, E>> out = new ArrayList<>();
    for (SortedMap<Integer, E> z : Ideals.centre(bracket).basis()) {
      if (!Subspace.span(ground.domain(), n, inside).contains(z)) {
        inside.add(z);
        out.add(z);
      }
    }
    return out;
  }

  private TypeName sum(List<TypeName> summands, int abelian) {
    Optional<String> power = abelian == 0 ? Optional.empty() : Optional.of(power(abelian));
    if (summands.isEmpty()) {
      return TypeName.of(power.orElse("0"));
    }
    if (summands.size() == 1 && power.isEmpty()) {
      return summands.get(0);
    }
    List<String> names = new ArrayList<>();
    for (List<String> choice : choices(summands)) {
      List<String> all = new ArrayList<>(choice.stream().map(LeviName::closed).toList());
      power.ifPresent(all::add);
      names.add(String.join(" + ", all));
    }
    if (abelian == 1 && summands.size() == 1) {
      for (String s : all(summands.get(0))) {
        if (s.matches("s[ul]\\([0-9RC,]+\\)")) {
          names.add(s.startsWith("su") ? s.substring(1) : "g" + s.substring(1));
        }
      }
    }
    return new TypeName(names.get(0), names.subList(1, names.size()));
  }

  private static List<String> all(TypeName name) {
    List<String> out = new ArrayList<>(List.of(name.name()));
    out.addAll(name.otherNames());
    return out;
  }

  /** The preferred names of all, then one other name of one after the other. */
  private static List<List<String>> choices(List<TypeName> summands) {
    List<String> preferred = summands.stream().map(TypeName::name).toList();
    List<List<String>> out = new ArrayList<>(List.of(preferred));
    for (int k = 0; k < summands.size(); k++) {
      for (String other : summands.get(k).otherNames()) {
        List<String> changed = new ArrayList<>(preferred);
        changed.set(k, other);
        out.add(changed);
      }
    }
    return out;
  }

  private static String closed(String name) {
    return name.contains("|x") || name.startsWith("solvable") || name.startsWith("nilpotent")
        ? "(" + name + ")"
        : name;
  }

  private String power(int k) {
    String field = ground.signs().isPresent() ? "R" : "C";
    return k == 1 ? field : field + "^" + k;
  }

  /** Neither a semisimple ideal nor a central subspace splits off; not semisimple. */
  private TypeName indecomposable(StructureConstants<E> constants) {
    LieBracket<E> bracket = LieBracket.of(constants);
    AlgebraFacts<E> facts = AlgebraFacts.of(bracket);
    if (facts.solvable()) {
      return solvable.apply(exact(constants)).orElseGet(() -> describedSolvable(bracket, facts));
    }
    Nilpotent nilradical = nilpotent(bracket, facts.nilradical());
    Optional<TypeName> name = Optional.empty();
    if (nilradical.classOf() == 1) {
      name = onAbelian(bracket, facts);
    } else if (nilradical.heisenberg()) {
      name = onHeisenberg(bracket, facts);
    }
    return name.orElseGet(() -> described(bracket, facts, nilradical));
  }

  private ExactAlgebra exact(StructureConstants<E> constants) {
    StructureConstants<rankfall.exact.Polynomial> lifted = ground.lifted(constants);
    return new ExactAlgebra(
        ground.chain(), lifted, ground.signs().map(s -> p -> s.signum(ground.lower().apply(p))));
  }

  /** A Levi factor of the algebra modulo its nilradical, with elements that represent it. */
  private record Levi<E>(
      StructureConstants<E> constants, E scale, List<SortedMap<Integer, E>> representatives) {}

  private Levi<E> levi(LieBracket<E> bracket, Subspace<E> nilradical) {
    Section<E> reductive = Section.quotient(ground, bracket, nilradical.basis());
    LieBracket<E> above = reductive.bracket();
    Section<E> levi = Section.subalgebra(ground, above, Ideals.derived(above).basis());
    return new Levi<>(
        levi.constants(),
        ground.domain().times(reductive.factor(), levi.factor()),
        levi.representatives().stream()
            .map(x -> ground.combination(x, reductive.representatives()))
            .toList());
  }

  /** Algebra and module by summands, where all of them have names. */
  private Optional<List<ModuleName>> modules(
      Levi<E> levi, LieBracket<E> bracket, Subspace<E> ideal) {
    Action<E> action = Action.of(ground, bracket, levi.representatives(), ideal.basis());
    return new LeviModule<>(ground, levi.constants(), levi.scale(), action).names();
  }

  private Optional<ModuleName> module(Levi<E> levi, LieBracket<E> bracket, Subspace<E> ideal) {
    return modules(levi, bracket, ideal).filter(m -> m.size() == 1).map(m -> m.get(0));
  }

  /**
   * The nilradical n is abelian. Modulo n the algebra is a Levi factor s and a centre a. If s has
   * no invariants in n, then g = (s + a) |x n: the invariants of s in the radical are a complement
   * of n, and their brackets lie in the invariants in n.
   */
  private Optional<TypeName> onAbelian(LieBracket<E> bracket, AlgebraFacts<E> facts) {
    int outside = facts.radical().dimension() - facts.nilradical().dimension();
    Levi<E> levi = levi(bracket, facts.nilradical());
    Action<E> action =
        Action.of(ground, bracket, levi.representatives(), facts.nilradical().basis());
    if (outside > 1 || hasInvariants(action)) {
      return Optional.empty();
    }
    if (outside == 0) {
      return modules(levi, bracket, facts.nilradical())
          .map(all -> sum(all.stream().map(ModuleName::semidirect).toList(), 0));
    }
    return module(levi, bracket, facts.nilradical())
        .flatMap(m -> m.withCentre(facts.unimodular(), power(1)));
  }

  private boolean hasInvariants(Action<E> action) {
    List<SortedMap<Integer, E>> rows = new ArrayList<>();
    for (List<SortedMap<Integer, E>> columns : action.matrices()) {
      rows.addAll(Action.transposed(columns, action.dimension()));
    }
    return Subspace.kernel(ground.domain(), action.dimension(), rows).dimension() > 0;
  }

  /** The nilradical is a Heisenberg algebra, and the symplectic algebra of its size acts. */
  private Optional<TypeName> onHeisenberg(LieBracket<E> bracket, AlgebraFacts<E> facts) {
    if (facts.radical().dimension() > facts.nilradical().dimension()) {
      return Optional.empty();
    }
    Subspace<E> n = facts.nilradical();
    Subspace<E> centre = Ideals.bracket(bracket, n, n);
    Section<E> above = Section.quotient(ground, bracket, centre.basis());
    List<SortedMap<Integer, E>> images =
        n.basis().stream().map(above.coordinates()).filter(x -> !x.isEmpty()).toList();
    Subspace<E> plane = Subspace.span(ground.domain(), above.dimension(), images);
    Levi<E> levi = levi(above.bracket(), plane);
    String heisenberg = "h" + n.dimension();
    return module(levi, above.bracket(), plane)
        .filter(
            m -> m.kind() != ModuleName.Shape.SUM && m.isDefiningOfSymplectic(plane.dimension()))
        .map(
            m ->
                new TypeName(
                    m.algebra().get(0) + " |x " + heisenberg,
                    m.algebra().stream().skip(1).map(a -> a + " |x " + heisenberg).toList()));
  }

  /**
   * What is said of a nilpotent ideal.
   *
   * @param dimension of the ideal
   * @param classOf the number of steps of the lower central series to 0
   * @param heisenberg whether the derived algebra is the centre and has dimension 1
   */
  private record Nilpotent(int dimension, int classOf, boolean heisenberg) {}

  private Nilpotent nilpotent(LieBracket<E> bracket, Subspace<E> ideal) {
    if (ideal.dimension() == 0) {
      return new Nilpotent(0, 0, false);
    }
    LieBracket<E> own = LieBracket.of(subalgebra(bracket, ideal));
    AlgebraFacts<E> facts = AlgebraFacts.of(own);
    return new Nilpotent(
        ideal.dimension(),
        facts.lowerCentralSeries().terms().size() - 1,
        facts.derived().dimension() == 1 && facts.centre().dimension() == 1);
  }

  private String kind(Nilpotent n) {
    return n.classOf == 1
        ? "abelian"
        : n.heisenberg ? "Heisenberg h" + n.dimension : "class " + n.classOf;
  }

  private TypeName describedSolvable(LieBracket<E> bracket, AlgebraFacts<E> facts) {
    Nilpotent n = nilpotent(bracket, facts.nilradical());
    if (facts.nilpotent()) {
      return n.heisenberg
          ? TypeName.of("h" + n.dimension)
          : TypeName.of("nilpotent of dimension " + n.dimension + ", class " + n.classOf);
    }
    return TypeName.of(
        "solvable of dimension "
            + facts.dimension()
            + ", nilradical of dimension "
            + n.dimension
            + " ("
            + kind(n)
            + ")");
  }

  private TypeName described(LieBracket<E> bracket, AlgebraFacts<E> facts, Nilpotent n) {
    StructureConstants<E> levi =
        Section.quotient(ground, bracket, facts.radical().basis()).constants();
    int radical = facts.radical().dimension();
    String text =
        radical == n.dimension
            ? " |x (nilpotent radical of dimension " + radical + ", " + kind(n) + ")"
            : " |x (radical of dimension "
                + radical
                + ", nilradical of dimension "
                + n.dimension
                + ", "
                + kind(n)
                + ")";
    TypeName s = semisimple(levi);
    String closed = s.name().contains(" ") ? "(" + s.name() + ")" : s.name();
    return TypeName.of(closed + text);
  }
}
