package rankfall.cli;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import rankfall.spec.SpecResult;

/** Reads what a call names. */
final class SpecDocuments {
  private SpecDocuments() {}

  /**
   * All documents of all files, in the order of the call.
   *
   * @param doors reads one file
   * @param named files and folders
   * @param command the verb that was called
   * @return one result a document
   * @throws ParameterException if a name belongs to no spec file, or a file cannot be read
   * @throws IOException if a folder cannot be read
   */
  static List<SpecResult> of(FrontDoors doors, List<Path> named, CommandLine command)
      throws IOException {
    List<SpecResult> documents = new ArrayList<>();
    for (Path file : files(named, command)) {
      documents.addAll(read(doors, file, command));
    }
    return List.copyOf(documents);
  }

  private static List<SpecResult> read(FrontDoors doors, Path file, CommandLine command) {
    try {
      return doors.read(file);
    } catch (IOException e) {
      throw new ParameterException(
          command, "'" + file + "' cannot be read (" + Cause.oneLine(e) + ")", e);
    }
  }

  private static List<Path> files(List<Path> named, CommandLine command) throws IOException {
    try {
      return SpecFiles.below(named);
    } catch (NoSuchFileException e) {
      throw new ParameterException(command, "'" + e.getFile() + "': " + e.getReason(), e);
    }
  }
}
