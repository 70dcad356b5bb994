package rankfall.cli;

import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Stream;

/** Report folders as the program writes them, for tests that compare bytes. */
final class ReportFolders {
  private ReportFolders() {}

  /** Runs {@code analyse} with the rooms of the program behind it; what it said is returned. */
  static String analyse(Path out, String... arguments) {
    List<String> all = new ArrayList<>(List.of("analyse", "--out", out.toString()));
    Collections.addAll(all, arguments);
    StringWriter said = new StringWriter();
    PrintWriter messages = new PrintWriter(said);
    int status =
        Rankfall.commandLine(new Program(), messages, messages).execute(all.toArray(String[]::new));
    assertNotEquals(ExitStatus.WRONG_CALL, status, said.toString());
    return said.toString();
  }

  /** The text of every file below a folder, by its path inside. */
  static SortedMap<String, String> read(Path folder) throws IOException {
    SortedMap<String, String> texts = new TreeMap<>();
    if (Files.isDirectory(folder)) {
      try (Stream<Path> files = Files.walk(folder)) {
        for (Path file : files.filter(Files::isRegularFile).toList()) {
          String name = folder.relativize(file).toString().replace('\\', '/');
          texts.put(name, Files.readString(file, StandardCharsets.UTF_8));
        }
      }
    }
    return texts;
  }

  /**
   * Compares two folders.
   *
   * @param due by path
   * @param found by path
   * @return a sentence for each file that is missing, not due, or different
   */
  static List<String> differences(SortedMap<String, String> due, SortedMap<String, String> found) {
    TreeSet<String> names = new TreeSet<>(due.keySet());
    names.addAll(found.keySet());
    List<String> out = new ArrayList<>();
    for (String name : names) {
      if (!found.containsKey(name)) {
        out.add(name + ": is not written");
      } else if (!due.containsKey(name)) {
        out.add(name + ": is written and was not due");
      } else if (!due.get(name).equals(found.get(name))) {
        out.add(name + ", " + firstDifference(due.get(name), found.get(name)));
      }
    }
    return out;
  }

  private static String firstDifference(String due, String found) {
    List<String> a = List.of(due.split("\n", -1));
    List<String> b = List.of(found.split("\n", -1));
    int k = 0;
    while (k < Math.min(a.size(), b.size()) && a.get(k).equals(b.get(k))) {
      k++;
    }
    return "line "
        + (k + 1)
        + ": due '"
        + (k < a.size() ? shortened(a.get(k)) : "end")
        + "', found '"
        + (k < b.size() ? shortened(b.get(k)) : "end")
        + "'";
  }

  private static String shortened(String line) {
    return line.length() > 200 ? line.substring(0, 200) + "..." : line;
  }
}
