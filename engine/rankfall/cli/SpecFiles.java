package rankfall.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

/** The spec files that a call names, directly or by their folder. */
final class SpecFiles {
  private SpecFiles() {}

  /**
   * Replaces each folder by the {@code *.yaml} and {@code *.yml} files below it.
   *
   * @param named files and folders in the order of the call
   * @return files in that order, those of a folder sorted by path; a file named twice stands once
   * @throws NoSuchFileException if a name belongs to no file, or a folder holds no spec
   * @throws IOException if a folder cannot be read
   */
  static List<Path> below(List<Path> named) throws IOException {
    List<Path> files = new ArrayList<>();
    for (Path path : named) {
      if (Files.isDirectory(path)) {
        List<Path> found = inFolder(path);
        if (found.isEmpty()) {
          throw new NoSuchFileException(path.toString(), null, "no *.yaml or *.yml below it");
        }
        files.addAll(found);
      } else if (Files.exists(path)) {
        files.add(path);
      } else {
        throw new NoSuchFileException(path.toString(), null, "no such file or folder");
      }
    }
    return files.stream().distinct().toList();
  }

  private static List<Path> inFolder(Path folder) throws IOException {
    try (Stream<Path> tree = Files.walk(folder)) {
      return tree.filter(Files::isRegularFile).filter(SpecFiles::hasSpecName).sorted().toList();
    }
  }

  private static boolean hasSpecName(Path file) {
    String name = file.getFileName().toString();
    return name.endsWith(".yaml") || name.endsWith(".yml");
  }
}
