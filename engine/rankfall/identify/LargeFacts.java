package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Domain;
import rankfall.exact.Elimination;
import rankfall.lie.AlgebraFacts;
import rankfall.lie.Ideals;
import rankfall.lie.LieBracket;
import rankfall.lie.Series;
import rankfall.lie.Subspace;

/**
 * The dimensions on which the name of an algebra of dimension 5 or more depends, beside the class
 * of its Levi factor and of the modules of that.
 *
 * @param text all of them, equal for equal dimensions
 * @param argument why the name is the same on connected sets where all of them are constant
 * @param walls numbers that decide by their sign
 * @param assumed elements such that all of this is so wherever none of them vanishes
 * @param <E> the numbers
 */
record LargeFacts<E>(String text, TypeLoci.Argument argument, List<E> walls, List<E> assumed) {
  LargeFacts {
    walls = List.copyOf(walls);
    assumed = List.copyOf(assumed);
  }

  /** The facts of an algebra over a ring of characteristic 0. */
  static <E> LargeFacts<E> of(LieBracket<E> bracket) {
    return new Finder<>(bracket).find();
  }

  private static final class Finder<E> {
    private final LieBracket<E> bracket;
    private final Domain<E> domain;
    private final int n;
    private final List<E> assumed = new ArrayList<>();
    private final StringBuilder text = new StringBuilder();

    Finder(LieBracket<E> bracket) {
      this.bracket = bracket;
      this.domain = bracket.domain();
      this.n = bracket.dimension();
    }

    LargeFacts<E> find() {
      AlgebraFacts<E> f = AlgebraFacts.of(bracket);
      note("radical", dimension(f.radical()));
      note("nilradical", dimension(f.nilradical()));
      note("derived", series(f.derivedSeries()));
      note("central", series(f.lowerCentralSeries()));
      note("centre", dimension(f.centre()));
      note("unimodular", f.unimodular());
      Subspace<E> beside = centraliser(f.radical());
      Subspace<E> apart = Ideals.bracket(bracket, beside, beside);
      note("semisimple summand", dimension(beside) + " " + dimension(apart));
      int line = f.centre().dimension() - shared(f.centre(), f.derived());
      note("abelian summand", line);
      Subspace<E> square = Ideals.bracket(bracket, f.nilradical(), f.nilradical());
      note("nilradical series", steps(f.nilradical(), square));
      note("its centre", shared(f.nilradical(), centraliser(f.nilradical())));
      Optional<Kinematical.Structure<E>> motion = Kinematical.structure(bracket);
      note("kinematical", motion.map(m -> m.kind().toString()).orElse("no"));
      List<E> walls = new ArrayList<>();
      motion.ifPresent(
          m -> {
            assumed.addAll(m.assumed());
            if (m.kind() == Kinematical.Kind.NEWTON_HOOKE) {
              walls.add(m.square());
            }
          });
      int rest = n - apart.dimension() - line;
      return new LargeFacts<>(
          text.toString(),
          motion.isPresent() ? TypeLoci.Argument.CLASSIFICATION : argument(f, square, rest),
          walls,
          assumed.stream().distinct().toList());
    }

    private TypeLoci.Argument argument(AlgebraFacts<E> f, Subspace<E> square, int rest) {
      if (f.radical().dimension() == f.centre().dimension()) {
        return TypeLoci.Argument.RIGIDITY;
      }
      boolean nilpotent = f.radical().dimension() == f.nilradical().dimension();
      if (nilpotent && square.dimension() < 2) {
        return f.solvable() ? TypeLoci.Argument.CLASSIFICATION : TypeLoci.Argument.MODULE;
      }
      boolean small = rest < 5 && !nilpotent;
      return small ? TypeLoci.Argument.NONE : TypeLoci.Argument.DIMENSIONS;
    }

    private void note(String what, Object value) {
      text.append(what).append(' ').append(value).append("; ");
    }

    private int dimension(Subspace<E> s) {
      assumed.addAll(s.nonVanishing());
      return s.dimension();
    }

    private String series(Series<E> s) {
      s.terms().forEach(this::dimension);
      dimension(s.next());
      return s.dimensions().toString();
    }

    /** The lower central series of an ideal, from its square. */
    private String steps(Subspace<E> ideal, Subspace<E> square) {
      StringBuilder out = new StringBuilder();
      Subspace<E> term = square;
      int last = ideal.dimension();
      while (dimension(term) < last) {
        out.append(term.dimension()).append(' ');
        last = term.dimension();
        term = Ideals.bracket(bracket, ideal, term);
      }
      return out.toString();
    }

    /** The elements that commute with a subspace. */
    private Subspace<E> centraliser(Subspace<E> of) {
      List<SortedMap<Integer, E>> functions = new ArrayList<>();
      for (SortedMap<Integer, E> x : of.basis()) {
        SortedMap<Integer, SortedMap<Integer, E>> byTarget = new TreeMap<>();
        List<SortedMap<Integer, E>> ad = bracket.adjoint(x);
        for (int j = 0; j < n; j++) {
          int source = j;
          ad.get(j)
              .forEach((k, v) -> byTarget.computeIfAbsent(k, t -> new TreeMap<>()).put(source, v));
        }
        functions.addAll(byTarget.values());
      }
      Subspace<E> out = Subspace.kernel(domain, n, functions);
      dimension(out);
      return out;
    }

    /** The dimension of what two subspaces share. */
    private int shared(Subspace<E> a, Subspace<E> b) {
      List<SortedMap<Integer, E>> all = new ArrayList<>(a.basis());
      all.addAll(b.basis());
      var echelon = Elimination.of(domain, all, n);
      assumed.addAll(echelon.nonVanishing());
      return a.dimension() + b.dimension() - echelon.rank();
    }
  }
}
