package rankfall.lie;

import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.RationalFunction;
import rankfall.lie.StructureConstants.Pair;

/** What the generators of a family are, over its ring. */
public sealed interface FamilyBody {
  /**
   * Matrices.
   *
   * @param order number of rows and of columns
   * @param generate whether brackets outside the span join it
   * @param matrices one a generator
   */
  record Matrices(int order, boolean generate, List<Entries> matrices) implements FamilyBody {
    /** Copies the list. */
    public Matrices {
      matrices = List.copyOf(matrices);
    }
  }

  /**
   * A matrix {@code re + i*im}.
   *
   * @param re non-zero entries by position, row * order + column, both from 0
   * @param im the same; empty over a complex ground, where i is a variable
   */
  record Entries(SortedMap<Integer, RationalFunction> re, SortedMap<Integer, RationalFunction> im) {
    /** Copies the maps. */
    public Entries {
      re = Collections.unmodifiableSortedMap(new TreeMap<>(re));
      im = Collections.unmodifiableSortedMap(new TreeMap<>(im));
    }
  }

  /**
   * Brackets.
   *
   * @param table non-zero structure constants by target, for pairs with left before right
   */
  record Brackets(SortedMap<Pair, SortedMap<Integer, RationalFunction>> table)
      implements FamilyBody {
    /** Copies the map. */
    public Brackets {
      table = Collections.unmodifiableSortedMap(new TreeMap<>(table));
    }
  }
}
