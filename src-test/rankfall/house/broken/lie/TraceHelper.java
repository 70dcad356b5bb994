package rankfall.house.broken.lie;

import cc.redberry.rings.Rings;
import edu.jas.arith.BigRational;
import java.io.PrintStream;
import org.matheclipse.core.expression.F;
import org.snakeyaml.engine.v2.api.Load;

/** A class with a name that says nothing, and with three libraries and a stream of others. */
public final class TraceHelper {
  BigRational rational;
  F symbols;
  Load yaml;
  Rings rings;

  PrintStream stream() {
    return System.out;
  }
}
