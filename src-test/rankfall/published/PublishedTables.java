package rankfall.published;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.schema.FailsafeSchema;
import rankfall.published.PublishedEntry.Cell;
import rankfall.published.PublishedEntry.Condition;
import rankfall.published.PublishedEntry.Fault;
import rankfall.published.PublishedEntry.Point;
import rankfall.published.PublishedEntry.Stratum;

/** Reads the data files beside this class; an unknown key is a fault of the file, never skipped. */
public final class PublishedTables {
  /** The data files, without ending, in the order in which they are read. */
  static final List<String> FILES =
      List.of(
          "normalisation",
          "real-forms",
          "bianchi",
          "dimension-3-to-5",
          "contractions",
          "physics",
          "dependence",
          "traps",
          "levi");

  /** Facts at a point that are numbers, lists of numbers or truth values. */
  static final Set<String> PLAIN_FACTS =
      Set.of(
          "generators",
          "dimension",
          "rank",
          "plus",
          "minus",
          "zero",
          "derivedSeries",
          "lowerCentralSeries",
          "centre",
          "radical",
          "nilradical",
          "unimodular",
          "invariantForms.dimension",
          "invariantForms.maximalRank",
          "abelian",
          "nilpotent",
          "solvable",
          "semisimple",
          "reductive",
          "compact");

  /** Facts at a point that name an algebra. */
  static final Set<String> NAME_FACTS = Set.of("type", "typeAliases", "levi", "bianchi", "h");

  private static final Set<String> ENTRY_KEYS =
      Set.of(
          "id",
          "source",
          "tier",
          "spec",
          "solvedBy",
          "points",
          "killing",
          "determinant",
          "conditions",
          "restricted",
          "dual",
          "strata",
          "closureLocus",
          "jacobiLocus");

  private PublishedTables() {}

  /**
   * All entries of all files.
   *
   * @return in the order of {@link #FILES} and of the text
   */
  public static List<PublishedEntry> all() {
    return FILES.stream().flatMap(f -> read(f).stream()).toList();
  }

  /**
   * The entries of one file.
   *
   * @param file its name without ending
   * @return in the order of the text
   */
  static List<PublishedEntry> read(String file) {
    try (InputStream in = PublishedTables.class.getResourceAsStream(file + ".yaml")) {
      if (in == null) {
        throw new IllegalArgumentException("no data file " + file);
      }
      return parse(in);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /**
   * The entries of a text in the form of the data files.
   *
   * @param in UTF-8
   * @return in the order of the text
   * @throws IllegalArgumentException for a key that the form does not know
   */
  static List<PublishedEntry> parse(InputStream in) {
    LoadSettings settings =
        LoadSettings.builder()
            .setSchema(new FailsafeSchema())
            .setAllowDuplicateKeys(false)
            .setCodePointLimit(4 << 20)
            .build();
    Object root = new Load(settings).loadFromInputStream(in);
    return list(root).stream().map(PublishedTables::entry).toList();
  }

  private static PublishedEntry entry(Object node) {
    Map<String, Object> m = map(node);
    require(ENTRY_KEYS, m.keySet(), "entry " + m.get("id"));
    Map<String, List<String>> loci = new TreeMap<>();
    for (String key : List.of("closureLocus", "jacobiLocus")) {
      if (m.containsKey(key)) {
        loci.put(key, list(m.get(key)).stream().map(PublishedTables::text).toList());
      }
    }
    return new PublishedEntry(
        text(m.get("id")),
        text(m.get("source")),
        number(m.get("tier")),
        text(m.get("spec")),
        listAt(m, "solvedBy").stream().map(PublishedTables::texts).toList(),
        listAt(m, "points").stream().map(PublishedTables::point).toList(),
        cells(m, "killing"),
        Optional.ofNullable(m.get("determinant")).map(PublishedTables::text),
        Optional.ofNullable(m.get("conditions"))
            .map(c -> list(c).stream().map(PublishedTables::condition).toList()),
        cells(m, "restricted"),
        cells(m, "dual"),
        Optional.ofNullable(m.get("strata"))
            .map(s -> list(s).stream().map(PublishedTables::stratum).toList()),
        Collections.unmodifiableMap(loci));
  }

  private static Point point(Object node) {
    Map<String, Object> m = map(node);
    SortedMap<String, String> facts = new TreeMap<>();
    for (Map.Entry<String, Object> e : m.entrySet()) {
      String key = e.getKey();
      if (key.equals("invariantForms")) {
        texts(e.getValue()).forEach((k, v) -> facts.put("invariantForms." + k, v));
      } else if (!Set.of("at", "world", "error").contains(key)) {
        facts.put(key, e.getValue() instanceof List<?> l ? l.toString() : text(e.getValue()));
      }
    }
    Set<String> known = new TreeSet<>(PLAIN_FACTS);
    known.addAll(NAME_FACTS);
    require(known, facts.keySet(), "a point at " + m.get("at"));
    Optional<Fault> fault =
        Optional.ofNullable(m.get("error"))
            .map(t -> Fault.valueOf(text(t).toUpperCase(Locale.ROOT)));
    if (fault.isPresent() != facts.isEmpty()) {
      throw new IllegalArgumentException("facts and a fault, or neither, at " + m.get("at"));
    }
    return new Point(
        texts(m.get("at")),
        Collections.unmodifiableSortedMap(facts),
        Optional.ofNullable(m.get("world")).map(PublishedTables::text),
        fault);
  }

  private static Condition condition(Object node) {
    Map<String, Object> m = map(node);
    require(Set.of("condition", "multiplicity"), m.keySet(), "a condition");
    return new Condition(text(m.get("condition")), number(m.get("multiplicity")));
  }

  private static Stratum stratum(Object node) {
    Map<String, Object> m = map(node);
    require(Set.of("equations", "profile"), m.keySet(), "a stratum");
    List<Integer> profile = list(m.get("profile")).stream().map(PublishedTables::number).toList();
    return new Stratum(text(m.get("equations")), profile);
  }

  private static Optional<SortedMap<Cell, String>> cells(Map<String, Object> m, String key) {
    if (!m.containsKey(key)) {
      return Optional.empty();
    }
    SortedMap<Cell, String> cells = new TreeMap<>();
    texts(m.get(key)).forEach((k, v) -> cells.put(cell(k), v));
    return Optional.of(Collections.unmodifiableSortedMap(cells));
  }

  private static Cell cell(String text) {
    int gap = text.indexOf(' ');
    return new Cell(
        Integer.parseInt(text.substring(0, gap)), Integer.parseInt(text.substring(gap + 1)));
  }

  private static void require(Set<String> known, Set<String> found, String where) {
    Set<String> unknown = new TreeSet<>(found);
    unknown.removeAll(known);
    if (!unknown.isEmpty()) {
      throw new IllegalArgumentException("unknown keys " + unknown + " in " + where);
    }
  }

  private static SortedMap<String, String> texts(Object node) {
    SortedMap<String, String> out = new TreeMap<>();
    map(node).forEach((k, v) -> out.put(k, text(v)));
    return Collections.unmodifiableSortedMap(out);
  }

  private static List<?> listAt(Map<String, Object> m, String key) {
    return m.containsKey(key) ? list(m.get(key)) : List.of();
  }

  private static Map<String, Object> map(Object node) {
    if (!(node instanceof Map<?, ?> m)) {
      throw new IllegalArgumentException("a mapping is due: " + node);
    }
    Map<String, Object> out = new TreeMap<>();
    m.forEach((k, v) -> out.put(text(k), v));
    return out;
  }

  private static List<?> list(Object node) {
    if (!(node instanceof List<?> l)) {
      throw new IllegalArgumentException("a list is due: " + node);
    }
    return new ArrayList<>(l);
  }

  private static int number(Object node) {
    return Integer.parseInt(text(node));
  }

  private static String text(Object node) {
    if (!(node instanceof String s)) {
      throw new IllegalArgumentException("a text is due: " + node);
    }
    return s;
  }
}
