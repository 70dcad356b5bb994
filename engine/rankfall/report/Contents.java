package rankfall.report;

import rankfall.Analysis;

/**
 * What an analysis holds, and so which files and chapters it gets. A list that was not computed is
 * left out everywhere: an empty table would read as the statement that there is nothing.
 *
 * @param hasComponents whether brackets, Killing form and conditions are known
 * @param hasStrata whether the strata were computed; a variety with points has at least one
 * @param hasRegions whether the real regions were computed
 */
record Contents(boolean hasComponents, boolean hasStrata, boolean hasRegions) {

  /** The contents of an analysis of any status. */
  static Contents of(Analysis analysis) {
    return analysis
        .findings()
        .map(
            f ->
                new Contents(
                    !f.components().isEmpty(), !f.strata().isEmpty(), !f.regions().isEmpty()))
        .orElse(new Contents(false, false, false));
  }
}
