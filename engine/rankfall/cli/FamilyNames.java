package rankfall.cli;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import rankfall.spec.Place;
import rankfall.spec.Spec;
import rankfall.spec.SpecResult;

/**
 * Sees to it that no two families of a batch share a name, since the name is that of the folder.
 */
final class FamilyNames {
  private FamilyNames() {}

  /**
   * Turns each spec whose family an earlier one has already described into a faulty one.
   *
   * @param results the documents of a batch in order
   * @return as many, in the same order; the fault of a second one names both places
   */
  static List<SpecResult> distinct(List<SpecResult> results) {
    Map<String, Place> seen = new HashMap<>();
    List<SpecResult> checked = new ArrayList<>();
    for (SpecResult result : results) {
      if (result instanceof SpecResult.Read read) {
        Spec spec = read.spec();
        Place first = seen.putIfAbsent(spec.family(), spec.source().familyPlace());
        checked.add(first == null ? result : secondTime(spec, first));
      } else {
        checked.add(result);
      }
    }
    return List.copyOf(checked);
  }

  private static SpecResult secondTime(Spec spec, Place first) {
    String place = first.file() + ":" + first.line() + ":" + first.column();
    return new SpecResult.Faulty(
        Optional.of(spec.family()),
        List.of(
            spec.source()
                .fault(
                    spec.source().familyPlace(),
                    "the family '" + spec.family() + "' is described at " + place + " already",
                    Optional.of("give one of them another name"))));
  }
}
