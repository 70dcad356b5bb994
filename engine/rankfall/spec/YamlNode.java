package rankfall.spec;

import java.util.List;

/** A node of a YAML document with its place. */
sealed interface YamlNode {

  Place place();

  /** What a person calls such a node. */
  String kind();

  /** A scalar. */
  record Text(ScalarText text) implements YamlNode {
    @Override
    public Place place() {
      return text.place();
    }

    @Override
    public String kind() {
      return "a single value";
    }
  }

  /** A list. */
  record Sequence(List<YamlNode> items, Place place) implements YamlNode {
    public Sequence {
      items = List.copyOf(items);
    }

    @Override
    public String kind() {
      return "a list";
    }
  }

  /** Keys with values, in the order of the text; a key may still stand twice. */
  record Mapping(List<Entry> entries, Place place) implements YamlNode {
    public Mapping {
      entries = List.copyOf(entries);
    }

    @Override
    public String kind() {
      return "a mapping";
    }
  }

  /** A key with its value. */
  record Entry(ScalarText key, YamlNode value) {
    String name() {
      return key.value();
    }

    boolean isNull() {
      return value instanceof Text t && t.text().isNull();
    }

    /** The value's place, or the key's where nothing is written. */
    Place valuePlace() {
      return isNull() ? key.place() : value.place();
    }
  }
}
