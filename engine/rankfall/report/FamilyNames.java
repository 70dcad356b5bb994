package rankfall.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Contracted;
import rankfall.Analysis.Contraction;
import rankfall.Analysis.StructureEntry;
import rankfall.exact.RationalFunction;

/** The names of a family and its brackets, for setting. */
final class FamilyNames {
  private FamilyNames() {}

  /** The notation of a family; names of parameters, constants and generators stay apart. */
  static Notation notation(Analysis a) {
    Set<String> names = new LinkedHashSet<>(a.spec().parameters());
    a.spec().constants().forEach(c -> names.add(c.name()));
    names.addAll(a.spec().presentation().generators());
    a.findings()
        .ifPresent(
            f -> {
              names.addAll(f.variables());
              f.components().forEach(c -> names.addAll(c.basis()));
            });
    return Notation.of(names);
  }

  /** The non-zero brackets, each with its whole right-hand side. */
  static List<Formula> brackets(Component c, Formulas formulas) {
    return brackets(c.basis(), c.structure(), formulas);
  }

  /**
   * The brackets of a limit; else the left-hand sides of those that have none or are in question.
   */
  static List<Formula> followed(Contraction c, Formulas formulas) {
    List<StructureEntry> structure = c.outcome().structure();
    return c.outcome() instanceof Contracted
        ? brackets(c.basis(), structure, formulas)
        : structure.stream()
            .map(s -> formulas.bracket(c.basis().get(s.left()), c.basis().get(s.right())))
            .distinct()
            .toList();
  }

  /** The non-zero brackets of structure constants in a basis. */
  static List<Formula> brackets(
      List<String> basis, List<StructureEntry> structure, Formulas formulas) {
    Map<List<Integer>, List<StructureEntry>> byPair = new LinkedHashMap<>();
    for (StructureEntry s : structure) {
      byPair.computeIfAbsent(List.of(s.left(), s.right()), k -> new ArrayList<>()).add(s);
    }
    List<Formula> out = new ArrayList<>();
    byPair.forEach(
        (pair, entries) -> {
          List<RationalFunction> coefficients =
              entries.stream().map(StructureEntry::coefficient).toList();
          List<String> targets = entries.stream().map(s -> basis.get(s.target())).toList();
          out.add(
              Formulas.equal(
                  formulas.bracket(basis.get(pair.get(0)), basis.get(pair.get(1))),
                  formulas.combination(coefficients, targets)));
        });
    return out;
  }
}
