package rankfall;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/** What is said of one family at one exact point. */
public sealed interface PointResult {
  /** The name of the family. */
  String family();

  /**
   * The point.
   *
   * @return values by name as exact fractions, in the order of the family; of a point that could
   *     not be read the texts as given
   */
  Map<String, String> parameters();

  /**
   * The algebra at the point.
   *
   * @param family the name of the family
   * @param parameters values by name
   * @param generators the number of listed generators
   * @param dimension the dimension of the algebra
   * @param killing the Killing form in the basis of the first independent generators
   * @param derivedSeries dimensions as long as they fall, each once
   * @param lowerCentralSeries dimensions as long as they fall, each once
   * @param centre dimension of the centre
   * @param radical dimension of the radical
   * @param nilradical dimension of the nilradical
   * @param unimodular whether tr ad x = 0 for all x
   * @param invariantForms the invariant symmetric forms
   * @param abelian whether all brackets are 0
   * @param nilpotent whether the lower central series ends in 0
   * @param solvable whether the derived series ends in 0
   * @param semisimple whether the dimension is positive and the Killing form non-degenerate
   * @param reductive whether the radical is the centre
   * @param compact whether the Killing form is negative definite; false over complex ground
   * @param stratum the name of its stratum, where the strata are known
   * @param type what it is called
   */
  record Facts(
      String family,
      Map<String, String> parameters,
      int generators,
      int dimension,
      Killing killing,
      List<Integer> derivedSeries,
      List<Integer> lowerCentralSeries,
      int centre,
      int radical,
      int nilradical,
      boolean unimodular,
      InvariantForms invariantForms,
      boolean abelian,
      boolean nilpotent,
      boolean solvable,
      boolean semisimple,
      boolean reductive,
      boolean compact,
      Optional<String> stratum,
      Optional<AlgebraType> type)
      implements PointResult {
    /** Copies the lists and the map. */
    public Facts {
      parameters = Collections.unmodifiableMap(new LinkedHashMap<>(parameters));
      derivedSeries = List.copyOf(derivedSeries);
      lowerCentralSeries = List.copyOf(lowerCentralSeries);
    }
  }

  /**
   * The Killing form at a point.
   *
   * @param rank the rank
   * @param signature empty over complex ground
   * @param determinant exact text; {@code 1} in dimension 0
   * @param matrix n rows of n exact texts
   */
  record Killing(
      int rank,
      Optional<Analysis.Signature> signature,
      String determinant,
      List<List<String>> matrix) {
    /** Copies the matrix. */
    public Killing {
      matrix = matrix.stream().map(List::copyOf).toList();
    }
  }

  /**
   * The invariant symmetric bilinear forms at a point.
   *
   * @param dimension the number of independent ones
   * @param rank a rank that one of them has
   * @param maximal whether it is proved that none has a greater rank
   */
  record InvariantForms(int dimension, int rank, boolean maximal) {}

  /**
   * No algebra at this point, or no point of the family.
   *
   * @param family the name of the family
   * @param parameters values by name, or texts that are no values
   * @param generators the number of listed generators
   * @param dimension of the span, where it is no algebra; empty where there is no span
   * @param error why, one line
   */
  record Failure(
      String family,
      Map<String, String> parameters,
      int generators,
      OptionalInt dimension,
      String error)
      implements PointResult {
    /** Copies the map. */
    public Failure {
      parameters = Collections.unmodifiableMap(new LinkedHashMap<>(parameters));
    }

    /** Whether the generators have a span at the point, and it is no algebra. */
    public boolean open() {
      return dimension.isPresent();
    }
  }
}
