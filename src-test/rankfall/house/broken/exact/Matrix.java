package rankfall.house.broken.exact;

import com.google.common.collect.ImmutableList;
import java.nio.file.Path;
import java.util.Random;
import rankfall.house.broken.spec.Reader;

/** A matrix that knows files, guesses, and needs a library of a library. */
public final class Matrix {
  Path path;
  Reader reader;
  ImmutableList<Integer> entries;

  int guess() {
    return new Random().nextInt();
  }
}
