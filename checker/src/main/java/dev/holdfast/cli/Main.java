package dev.holdfast.cli;

import dev.holdfast.plan.Nearest;
import dev.holdfast.report.Safe;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.InvalidPathException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/** The program {@code holdfast}. */
public final class Main {
  private static final List<Command> COMMANDS =
      List.of(
          new StartCommand(),
          new CheckCommand(),
          new ExplainCommand(),
          new CatalogueCommand(),
          new FindingsCommand(),
          new SchemaCommand());

  private Main() {}

  /** Runs a command and ends the program with its status. */
  public static void main(String[] arguments) {
    Console console =
        new Console(
            new PrintStream(new FileOutputStream(FileDescriptor.out)),
            new PrintStream(new FileOutputStream(FileDescriptor.err)),
            System.getenv(),
            System.console() != null);
    System.exit(run(console, arguments));
  }

  /**
   * Runs a command.
   *
   * @return its status
   */
  public static int run(Console console, String... arguments) {
    try {
      CommandLine line = new CommandLine(top());
      line.setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF));
      return dispatch(console, line.parseArgs(arguments));
    } catch (ParameterException e) {
      console.remark(complaint(e));
      console.remark("see '" + e.getCommandLine().getCommandSpec().qualifiedName() + " --help'");
      return Status.NOT_CHECKED;
    } catch (UnusableException e) {
      console.remark(e.getMessage());
      return Status.NOT_CHECKED;
    } catch (InvalidPathException e) {
      console.remark("'" + e.getInput() + "' is no path");
      return Status.NOT_CHECKED;
    } catch (RuntimeException | StackOverflowError | OutOfMemoryError e) {
      return fault(console, e);
    }
  }

  private static int dispatch(Console console, ParseResult parsed) {
    if (parsed.isVersionHelpRequested()) {
      console.print(Version.line() + "\n");
      return Status.HOLDS;
    }
    ParseResult innermost = parsed.hasSubcommand() ? parsed.subcommand() : parsed;
    CommandSpec spec = innermost.commandSpec();
    String usage = spec.commandLine().getUsageMessage(Ansi.OFF);
    if (innermost.isUsageHelpRequested()) {
      console.print(usage);
      return Status.HOLDS;
    }
    if (!parsed.hasSubcommand()) {
      console.advise(usage);
      return Status.NOT_CHECKED;
    }
    return COMMANDS.stream()
        .filter(command -> command.name().equals(spec.name()))
        .findFirst()
        .orElseThrow()
        .run(innermost, console);
  }

  /** What is wrong with the arguments, in words of our own where they can say more. */
  private static String complaint(ParameterException e) {
    CommandSpec spec = e.getCommandLine().getCommandSpec();
    if (e instanceof UnmatchedArgumentException unmatched && !unmatched.getUnmatched().isEmpty()) {
      String word = unmatched.getUnmatched().get(0);
      List<String> known = new ArrayList<>();
      String what;
      if (word.startsWith("-")) {
        what = "option";
        spec.options().forEach(option -> known.addAll(Arrays.asList(option.names())));
      } else if (!spec.subcommands().isEmpty()) {
        what = "command";
        known.addAll(spec.subcommands().keySet());
      } else {
        return "'" + word + "' is one argument too many";
      }
      Optional<String> near = Nearest.to(word.replaceFirst("=.*", ""), known);
      return "there is no "
          + what
          + " '"
          + word
          + "'"
          + near.map(each -> "; did you mean '" + each + "'?").orElse("");
    }
    if (e instanceof MissingParameterException missing && !missing.getMissing().isEmpty()) {
      ArgSpec first = missing.getMissing().get(0);
      String owner = first.isOption() ? " for " + ((OptionSpec) first).longestName() : "";
      return "missing: " + first.paramLabel() + owner;
    }
    return e.getMessage().lines().findFirst().orElse("wrong arguments");
  }

  private static int fault(Console console, Throwable e) {
    console.remark(
        "a fault of the program ("
            + e.getClass().getSimpleName()
            + (e.getMessage() == null ? "" : ": " + e.getMessage())
            + "); set HOLDFAST_TRACE=1 to see where");
    if ("1".equals(console.environment().get("HOLDFAST_TRACE"))) {
      StringWriter trace = new StringWriter();
      e.printStackTrace(new PrintWriter(trace, true));
      trace.toString().lines().forEach(each -> console.advise(Safe.line(each) + "\n"));
    }
    return Status.FAULT;
  }

  private static CommandSpec top() {
    CommandSpec top =
        Spec.command(
            "holdfast",
            "Keeps the sample-size argument of a study true.",
            "Recomputes what a study plan claims from what it assumes, and says where the two have"
                + " parted.",
            List.of(
                "holdfast start parallel-groups/student-t study-plan.yaml",
                "                        a first plan, to be filled in",
                "holdfast check          whether the plans below this folder hold",
                "holdfast explain study-plan.yaml",
                "                        how the figures of a plan come about",
                "",
                "'holdfast COMMAND --help' says more of a command."));
    top.usageMessage().commandListHeading("%nCommands:%n");
    for (Command command : COMMANDS) {
      top.addSubcommand(command.name(), command.spec());
    }
    top.addOption(
        OptionSpec.builder("--version")
            .versionHelp(true)
            .description("Print the version and end.")
            .build());
    return Spec.helped(top);
  }
}
