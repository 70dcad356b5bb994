package rankfall.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;
import rankfall.published.PublishedEntry.Fault;
import rankfall.published.PublishedEntry.Point;
import rankfall.published.PublishedEntry.Stratum;

/** The comparison accepts what is due and notices every single change of it. */
class PublishedComparisonTest {

  static Stream<PublishedEntry> entries() {
    return PublishedTables.all().stream();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("entries")
  void everyChangedFactIsNoticed(PublishedEntry entry) {
    for (Point point : entry.points()) {
      ObservedPoint right = mirror(point);
      assertEquals(List.of(), PublishedComparison.point(point, right));
      for (Map.Entry<String, String> fact : right.facts().entrySet()) {
        SortedMap<String, String> facts = new TreeMap<>(right.facts());
        facts.put(fact.getKey(), wrong(fact.getValue()));
        noticed(PublishedComparison.point(point, new ObservedPoint(facts, Optional.empty())));
        facts.remove(fact.getKey());
        noticed(PublishedComparison.point(point, new ObservedPoint(facts, Optional.empty())));
      }
      for (Fault fault : Fault.values()) {
        if (!point.fault().equals(Optional.of(fault))) {
          ObservedPoint other = new ObservedPoint(new TreeMap<>(), Optional.of(fault));
          noticed(PublishedComparison.point(point, other));
        }
      }
      if (point.fault().isPresent()) {
        ObservedPoint sound = new ObservedPoint(new TreeMap<>(), Optional.empty());
        noticed(PublishedComparison.point(point, sound));
      }
    }
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("entries")
  void everyChangedFormulaIsNoticed(PublishedEntry entry) {
    ObservedFamily right = mirror(entry);
    assertEquals(List.of(), PublishedComparison.family(entry, right));
    for (ObservedFamily changed : changes(entry, right)) {
      noticed(PublishedComparison.family(entry, changed));
    }
  }

  @Test
  void anotherWayToWriteAFormulaIsNoDifference() {
    PublishedEntry entry = entry("wall-irrational");
    SortedMap<Cell, String> killing = new TreeMap<>();
    killing.put(new Cell(1, 1), "-2");
    killing.put(new Cell(2, 2), "-6*b^2 + 2");
    killing.put(new Cell(3, 3), "2 - 6*b*b");
    ObservedFamily found =
        new ObservedFamily(
            killing,
            "-72*b^4 + 48*b^2 - 8",
            List.of(new Condition("3*b^2 - 1", 2)),
            new TreeMap<>(),
            Optional.empty(),
            List.of(
                new Stratum("-6*b^2 + 2", List.of(3, 1, 2, 0)),
                new Stratum("b - b", List.of(3, 3, 3, 0))),
            List.of("0"));
    assertEquals(List.of(), PublishedComparison.family(entry, found));
  }

  /** On the circle c^2 + s^2 = 1 a factor c^2 + s^2 does not count; elsewhere it would. */
  @Test
  void formulasAreComparedOnTheRelations() {
    PublishedEntry entry = entry("electroweak-mixing");
    ObservedFamily right = mirror(entry);
    SortedMap<Cell, String> killing = new TreeMap<>(right.killing());
    killing.put(new Cell(1, 1), "-2*g^2*(c^2 + s^2)");
    assertEquals(List.of(), PublishedComparison.family(entry, with(right, killing)));
    killing.put(new Cell(1, 1), "-2*g^2*(c^2 + s^2 + c)");
    noticed(PublishedComparison.family(entry, with(right, killing)));
  }

  @Test
  void theConjugateOfAnAlgebraicNumberIsAnotherNumber() {
    PublishedEntry entry = entry("sqrt-difference");
    ObservedFamily right = mirror(entry);
    noticed(PublishedComparison.family(entry, withDeterminant(right, "-8*(t + sqrt(2))^2")));
    String expanded = "-8*t^2 + 16*sqrt(2)*t - 16";
    assertEquals(List.of(), PublishedComparison.family(entry, withDeterminant(right, expanded)));
  }

  private static List<ObservedFamily> changes(PublishedEntry entry, ObservedFamily right) {
    List<ObservedFamily> changed = new ArrayList<>();
    entry
        .killing()
        .ifPresent(
            m -> {
              changedCells(m).forEach(k -> changed.add(with(right, k)));
              SortedMap<Cell, String> more = new TreeMap<>(m);
              more.put(new Cell(1, 1000), "1");
              changed.add(with(right, more));
            });
    entry
        .restricted()
        .ifPresent(
            m ->
                changedCells(m)
                    .forEach(
                        k ->
                            changed.add(
                                new ObservedFamily(
                                    right.killing(),
                                    right.determinant(),
                                    right.conditions(),
                                    k,
                                    right.dual(),
                                    right.strata(),
                                    right.components()))));
    entry.dual().ifPresent(m -> changedCells(m).forEach(k -> changed.add(withDual(right, k))));
    entry
        .determinant()
        .ifPresent(
            d -> {
              changed.add(withDeterminant(right, "-(" + d + ") + 1"));
              changed.add(withDeterminant(right, "2*(" + d + ") - 1/1000000007"));
            });
    entry
        .conditions()
        .ifPresent(
            list -> {
              List<Condition> more = new ArrayList<>(list);
              more.add(new Condition("b + 7", 1));
              changed.add(withConditions(right, more));
              for (int k = 0; k < list.size(); k++) {
                List<Condition> other = new ArrayList<>(list);
                Condition c = other.remove(k);
                changed.add(withConditions(right, other));
                other.add(new Condition(c.polynomial(), c.multiplicity() + 1));
                changed.add(withConditions(right, other));
              }
            });
    entry.strata().ifPresent(list -> changedStrata(list).forEach(x -> changed.add(with(right, x))));
    if (!entry.loci().isEmpty()) {
      changed.add(right.with(right.strata(), List.of("0")));
      changed.add(right.with(right.strata(), List.of(right.components().get(0) + "; b + 7")));
    }
    return changed;
  }

  private static List<List<Stratum>> changedStrata(List<Stratum> strata) {
    List<List<Stratum>> changed = new ArrayList<>();
    for (int k = 0; k < strata.size(); k++) {
      List<Stratum> other = new ArrayList<>(strata);
      Stratum s = other.remove(k);
      changed.add(List.copyOf(other));
      other.add(new Stratum(s.equations() + "; b + 7", s.profile()));
      changed.add(List.copyOf(other));
      List<Integer> profile = new ArrayList<>(s.profile());
      profile.set(3, profile.get(3) + 1);
      other.set(other.size() - 1, new Stratum(s.equations(), profile));
      changed.add(List.copyOf(other));
    }
    return changed;
  }

  private static List<SortedMap<Cell, String>> changedCells(SortedMap<Cell, String> cells) {
    List<SortedMap<Cell, String>> changed = new ArrayList<>();
    for (Map.Entry<Cell, String> cell : cells.entrySet()) {
      SortedMap<Cell, String> other = new TreeMap<>(cells);
      other.put(cell.getKey(), "-(" + cell.getValue() + ")");
      changed.add(new TreeMap<>(other));
      other.remove(cell.getKey());
      changed.add(other);
    }
    return changed;
  }

  private static ObservedPoint mirror(Point point) {
    SortedMap<String, String> facts = new TreeMap<>(point.facts());
    facts.keySet().retainAll(PublishedTables.PLAIN_FACTS);
    if (point.fault().isEmpty()) {
      facts.putIfAbsent("generators", point.facts().get("dimension"));
    }
    return new ObservedPoint(facts, point.fault());
  }

  private static ObservedFamily mirror(PublishedEntry entry) {
    return new ObservedFamily(
        entry.killing().orElse(new TreeMap<>()),
        entry.determinant().orElse("0"),
        entry.conditions().orElse(List.of()),
        entry.restricted().orElse(new TreeMap<>()),
        entry.dual(),
        entry.strata().orElse(List.of()),
        entry.loci().values().stream().map(l -> String.join("; ", l)).toList());
  }

  private static ObservedFamily with(ObservedFamily family, SortedMap<Cell, String> killing) {
    return new ObservedFamily(
        killing,
        family.determinant(),
        family.conditions(),
        family.restricted(),
        family.dual(),
        family.strata(),
        family.components());
  }

  private static ObservedFamily with(ObservedFamily family, List<Stratum> strata) {
    return family.with(strata, family.components());
  }

  private static ObservedFamily withDual(ObservedFamily family, SortedMap<Cell, String> dual) {
    return new ObservedFamily(
        family.killing(),
        family.determinant(),
        family.conditions(),
        family.restricted(),
        Optional.of(dual),
        family.strata(),
        family.components());
  }

  private static ObservedFamily withDeterminant(ObservedFamily family, String determinant) {
    return new ObservedFamily(
        family.killing(),
        determinant,
        family.conditions(),
        family.restricted(),
        family.dual(),
        family.strata(),
        family.components());
  }

  private static ObservedFamily withConditions(ObservedFamily family, List<Condition> conditions) {
    return new ObservedFamily(
        family.killing(),
        family.determinant(),
        conditions,
        family.restricted(),
        family.dual(),
        family.strata(),
        family.components());
  }

  private static String wrong(String value) {
    return switch (value) {
      case "true" -> "false";
      case "false" -> "true";
      default ->
          value.startsWith("[")
              ? value.replace("]", ", 0]")
              : Integer.toString(Integer.parseInt(value) + 1);
    };
  }

  private static void noticed(List<String> differences) {
    assertFalse(differences.isEmpty(), "a change went unnoticed");
  }

  private static PublishedEntry entry(String id) {
    return PublishedTables.all().stream().filter(e -> e.id().equals(id)).findFirst().orElseThrow();
  }
}
