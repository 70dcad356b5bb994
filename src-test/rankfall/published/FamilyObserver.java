package rankfall.published;

import java.util.SortedMap;

/** Asks the program what it has to say about a spec. */
interface FamilyObserver {
  /**
   * The facts at a point.
   *
   * @param spec the text of the spec
   * @param at fractions by parameter, or by function of a parameter such as {@code cos(t)}
   * @return the facts, or the fault
   */
  ObservedPoint point(String spec, SortedMap<String, String> at);

  /**
   * The family at its general point.
   *
   * @param spec the text of the spec
   * @return what an analysis finds
   */
  ObservedFamily family(String spec);
}
