package rankfall.published;

import java.util.Collections;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * What the program says about one exact point, as text.
 *
 * @param facts by name: {@link PublishedTables#PLAIN_FACTS} all of them, {@link
 *     PublishedTables#NAME_FACTS} where the program names them; numbers in decimal, truth values
 *     {@code true} and {@code false}, lists as {@code [3, 1]}; empty where there is a fault
 * @param fault why there is no algebra at the point
 */
record ObservedPoint(SortedMap<String, String> facts, Optional<PublishedEntry.Fault> fault) {
  ObservedPoint {
    facts = Collections.unmodifiableSortedMap(new TreeMap<>(facts));
  }
}
