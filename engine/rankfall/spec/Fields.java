package rankfall.spec;

import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The values of a mapping by key; faults of keys and of the kinds of values are gathered. */
final class Fields {
  private final Faults faults;
  private final Map<String, YamlNode.Entry> entries = new LinkedHashMap<>();
  private final Set<String> broken = new HashSet<>();

  private Fields(Faults faults) {
    this.faults = faults;
  }

  /** A mapping whose keys are fixed by the format. */
  static Fields of(YamlNode.Mapping mapping, List<String> keys, Faults faults) {
    Fields fields = new Fields(faults);
    for (YamlNode.Entry entry : distinct(mapping, faults)) {
      if (keys.contains(entry.name())) {
        fields.entries.put(entry.name(), entry);
      } else {
        fields.unknown(entry, keys);
      }
    }
    return fields;
  }

  /** The entries of a mapping whose keys are names; of equal keys the first, with a fault. */
  static List<YamlNode.Entry> distinct(YamlNode.Mapping mapping, Faults faults) {
    Map<String, YamlNode.Entry> first = new LinkedHashMap<>();
    for (YamlNode.Entry entry : mapping.entries()) {
      YamlNode.Entry before = first.putIfAbsent(entry.name(), entry);
      if (before != null) {
        faults.add(
            entry.key().place(),
            "the key '" + entry.name() + "' stands twice",
            "it stands in line " + before.key().place().line() + " already");
      }
    }
    return List.copyOf(first.values());
  }

  private void unknown(YamlNode.Entry entry, List<String> keys) {
    Optional<String> meant = Spelling.meant(entry.name(), keys);
    meant.ifPresent(broken::add);
    faults.add(
        entry.key().place(),
        "unknown key '" + entry.name() + "'",
        meant
            .map(key -> "did you mean '" + key + "'?")
            .orElse("the keys are " + String.join(", ", keys)));
  }

  /** Whether the key stands there, be it misspelt or with a wrong value. */
  boolean has(String key) {
    return entries.containsKey(key) || broken.contains(key);
  }

  /** Whether the key stands there misspelt or with a value of a wrong kind. */
  boolean isBroken(String key) {
    return broken.contains(key);
  }

  Optional<YamlNode.Entry> entry(String key) {
    return Optional.ofNullable(entries.get(key));
  }

  Optional<ScalarText> text(String key, String example) {
    return value(key, YamlNode.Text.class, "a single value", example).map(YamlNode.Text::text);
  }

  Optional<YamlNode.Sequence> list(String key, String example) {
    return value(key, YamlNode.Sequence.class, "a list", example);
  }

  Optional<YamlNode.Mapping> mapping(String key, String example) {
    return value(key, YamlNode.Mapping.class, "a mapping", example);
  }

  private <T extends YamlNode> Optional<T> value(
      String key, Class<T> kind, String wanted, String example) {
    YamlNode.Entry entry = entries.get(key);
    if (entry == null) {
      return Optional.empty();
    }
    if (entry.isNull() || !kind.isInstance(entry.value())) {
      broken.add(key);
      faults.add(
          entry.valuePlace(),
          "'" + key + "' " + (entry.isNull() ? "has no value" : "is not " + wanted),
          "write " + wanted + ", as in " + example);
      return Optional.empty();
    }
    return Optional.of(kind.cast(entry.value()));
  }

  /** One of a few words; the first of them where the key is left out or wrong. */
  <T> T choice(String key, Map<String, T> words) {
    List<String> names = List.copyOf(words.keySet());
    T standard = words.get(names.get(0));
    Optional<ScalarText> text = text(key, key + ": " + names.get(0));
    if (text.isEmpty()) {
      return standard;
    }
    T chosen = words.get(text.get().value());
    if (chosen == null) {
      broken.add(key);
      faults.add(
          text.get().place(),
          "'" + key + "' cannot be '" + text.get().value() + "'",
          "write " + String.join(" or ", names));
      return standard;
    }
    return chosen;
  }
}
