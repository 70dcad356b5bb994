package rankfall.house.broken.spec;

import com.fasterxml.jackson.databind.ObjectMapper;
import picocli.CommandLine;
import rankfall.house.broken.Truth;
import rankfall.house.broken.exact.Matrix;

/** A reader that looks ahead into exact, holds the whole truth, and brings libraries of others. */
public final class Reader {
  static int count;

  CommandLine commandLine;
  ObjectMapper mapper;
  Matrix matrix;
  Truth truth;
}
