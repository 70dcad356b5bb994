package rankfall.report;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** A folder in which a file appears whole or not at all. */
record AtomicFolder(Path path) {

  /** Writes a file beside its place and renames it; a file of that name is replaced. */
  void put(String name, String text) throws IOException {
    Files.createDirectories(path);
    Path part = path.resolve("." + name + ".part");
    try {
      Files.writeString(part, text, StandardCharsets.UTF_8);
      Files.move(
          part,
          path.resolve(name),
          StandardCopyOption.ATOMIC_MOVE,
          StandardCopyOption.REPLACE_EXISTING);
    } finally {
      Files.deleteIfExists(part);
    }
  }

  /** Removes a file of an earlier run, if there is one. */
  void remove(String name) throws IOException {
    Files.deleteIfExists(path.resolve(name));
  }
}
