package rankfall.spec;

import java.util.Optional;

/** One YAML document of a file, or the fault that ended it. */
sealed interface YamlDocument {

  /** A document whose YAML is right. */
  record Tree(YamlNode root) implements YamlDocument {}

  /** A document that broke off; the family is what a line of it says, where one does. */
  record Broken(Optional<String> family, Diagnostic diagnostic) implements YamlDocument {}
}
