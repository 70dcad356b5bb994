package rankfall.spec;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Reads spec files. */
public final class SpecReader {
  private SpecReader() {}

  /**
   * Reads all documents of one file.
   *
   * @param fileName the file as the user named it, for messages
   * @param bytes its content: UTF-8, with or without a byte order mark, at most 4 MiB
   * @return one result a YAML document, in the order of the text; at least one. A document without
   *     content is passed over; a file without any content is one faulty result. A fault in one
   *     document does not touch the others; where the YAML of one breaks off, the next one begins
   *     at the next line that starts with {@code ---}
   */
  public static List<SpecResult> read(String fileName, byte[] bytes) {
    FileText file;
    try {
      file = FileText.of(fileName, bytes);
    } catch (SpecFault fault) {
      return List.of(faulty(FileText.undecoded(fault)));
    }
    Optional<Place> control = file.firstControlCharacter();
    if (control.isPresent()) {
      SpecFault fault =
          SpecFault.of(
              control.get(), "a character that YAML does not allow", "remove it from the file");
      return List.of(faulty(file.diagnostic(fault)));
    }
    List<SpecResult> results = new ArrayList<>();
    for (YamlDocument document : YamlReader.documents(file)) {
      if (document instanceof YamlDocument.Broken broken) {
        results.add(new SpecResult.Faulty(broken.family(), List.of(broken.diagnostic())));
      } else {
        YamlNode root = ((YamlDocument.Tree) document).root();
        if (!(root instanceof YamlNode.Text text && text.text().isNull())) {
          results.add(DocumentReader.read(file, root));
        }
      }
    }
    if (results.isEmpty()) {
      SpecFault fault =
          SpecFault.of(
              file.place(0, 0, 1),
              "the file holds no spec",
              "begin with a line such as 'family: my-family'");
      results.add(faulty(file.diagnostic(fault)));
    }
    return List.copyOf(results);
  }

  private static SpecResult faulty(Diagnostic diagnostic) {
    return new SpecResult.Faulty(Optional.empty(), List.of(diagnostic));
  }
}
