package rankfall.published;

import java.util.Locale;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.lie.PointFacts;
import rankfall.published.PublishedEntry.Fault;

/** Reads off the facts at a point what the published tables speak of. */
final class PointReading {
  private PointReading() {}

  /**
   * The facts as the tables write them.
   *
   * @param facts at a point that has an algebra
   * @return numbers in decimal, lists as {@code [3, 1]}; no signature over complex ground
   */
  static ObservedPoint of(PointFacts facts) {
    SortedMap<String, String> said = new TreeMap<>();
    said.put("generators", Integer.toString(facts.generators()));
    said.put("dimension", Integer.toString(facts.dimension()));
    said.put("rank", Integer.toString(facts.killing().rank()));
    facts
        .killing()
        .signature()
        .ifPresent(
            s -> {
              said.put("plus", Integer.toString(s.plus()));
              said.put("minus", Integer.toString(s.minus()));
              said.put("zero", Integer.toString(s.zero()));
            });
    said.put("derivedSeries", facts.derivedSeries().toString());
    said.put("lowerCentralSeries", facts.lowerCentralSeries().toString());
    said.put("centre", Integer.toString(facts.centre()));
    said.put("radical", Integer.toString(facts.radical()));
    said.put("nilradical", Integer.toString(facts.nilradical()));
    said.put("unimodular", Boolean.toString(facts.unimodular()));
    said.put("invariantForms.dimension", Integer.toString(facts.invariantForms().dimension()));
    said.put(
        "invariantForms.maximalRank",
        Integer.toString(facts.invariantForms().maximalRank().rank()));
    said.put("abelian", Boolean.toString(facts.abelian()));
    said.put("nilpotent", Boolean.toString(facts.nilpotent()));
    said.put("solvable", Boolean.toString(facts.solvable()));
    said.put("semisimple", Boolean.toString(facts.semisimple()));
    said.put("reductive", Boolean.toString(facts.reductive()));
    said.put("compact", Boolean.toString(facts.compact()));
    return new ObservedPoint(said, Optional.empty());
  }

  /**
   * A point without an algebra.
   *
   * @param reason as the program words it, one line
   * @return the kind of fault that the reason names
   * @throws IllegalArgumentException for a reason that names none
   */
  static ObservedPoint outside(String reason) {
    String text = reason.toLowerCase(Locale.ROOT);
    Fault fault;
    if (text.contains("pole")) {
      fault = Fault.POLE;
    } else if (text.contains("relation")) {
      fault = Fault.RELATIONS;
    } else if (text.contains("outside the domain")) {
      fault = Fault.DOMAIN;
    } else if (text.contains("closed") || text.contains("jacobi")) {
      fault = Fault.CLOSURE;
    } else {
      throw new IllegalArgumentException("no kind of fault is known for: " + reason);
    }
    return new ObservedPoint(new TreeMap<>(), Optional.of(fault));
  }
}
