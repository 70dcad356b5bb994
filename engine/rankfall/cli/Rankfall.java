package rankfall.cli;

import java.io.OutputStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;

/** The program: finds exactly where the Killing forms of families of Lie algebras degenerate. */
@Command(
    name = "rankfall",
    description = "Finds exactly where the Killing forms of families of Lie algebras degenerate.",
    synopsisSubcommandLabel = "VERB",
    commandListHeading = "%nVerbs:%n")
public final class Rankfall implements Runnable {
  @SuppressWarnings("UnusedVariable") // declares options
  @Mixin
  private CommonOptions common;

  @CommandLine.Spec private CommandSpec self;

  private Rankfall() {}

  /**
   * Runs one verb and ends the process with its exit status.
   *
   * <p>The end is on purpose: a library keeps threads for a minute after its last use, and by now
   * every file is closed.
   *
   * @param arguments a verb and what belongs to it
   */
  public static void main(String[] arguments) {
    PrintWriter out = utf8(System.out);
    PrintWriter err = utf8(System.err);
    int status = commandLine(new Program(), out, err).execute(arguments);
    out.flush();
    err.flush();
    System.exit(status);
  }

  /**
   * The command line with all verbs.
   *
   * @param doors the rooms behind the verbs
   * @param out takes results
   * @param err takes messages
   */
  static CommandLine commandLine(FrontDoors doors, PrintWriter out, PrintWriter err) {
    return new CommandLine(new Rankfall())
        .addSubcommand(new Analyse(doors))
        .addSubcommand(new Check(doors))
        .addSubcommand(new Point(doors))
        .addSubcommand(new Scan(doors))
        .setOut(out)
        .setErr(err)
        .setParameterExceptionHandler((wrong, arguments) -> wrongCall(wrong))
        .setExecutionExceptionHandler((thrown, verb, result) -> broken(thrown, verb));
  }

  @Override
  public void run() {
    throw new ParameterException(self.commandLine(), "a verb is missing");
  }

  private static int wrongCall(ParameterException wrong) {
    CommandLine verb = wrong.getCommandLine();
    verb.getErr().println(wrong.getMessage());
    verb.getErr().println("try '" + verb.getCommandSpec().qualifiedName() + " --help'");
    return ExitStatus.WRONG_CALL;
  }

  private static int broken(Exception thrown, CommandLine verb) {
    verb.getErr().println(Cause.oneLine(thrown));
    return ExitStatus.INCOMPLETE;
  }

  private static PrintWriter utf8(OutputStream stream) {
    return new PrintWriter(stream, true, StandardCharsets.UTF_8);
  }
}
