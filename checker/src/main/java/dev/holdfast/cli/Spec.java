package dev.holdfast.cli;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** Builds the options of commands, and their help in one form. */
final class Spec {
  private static final Map<String, String> STATUSES =
      Map.of(
          "0", "everything holds",
          "1", "something blocks, an invalid plan included",
          "2", "not checked, or not wholly: a wrong option, an unreadable path, no plan there",
          "3", "a fault of the program");

  private Spec() {}

  /**
   * A command.
   *
   * @param header what it does, in a few words
   * @param description what it does, in sentences
   * @param examples how it is called
   */
  static CommandSpec command(
      String name, String header, String description, List<String> examples) {
    CommandSpec spec = CommandSpec.create().name(name);
    spec.usageMessage()
        .width(96)
        .sortOptions(false)
        .header(header)
        .synopsisHeading("%nUsage: ")
        .descriptionHeading("%n")
        .description(description)
        .parameterListHeading("%nParameters:%n")
        .optionListHeading("%nOptions:%n")
        .footerHeading("%nExamples:%n")
        .footer(examples.stream().map(example -> "  " + example).toArray(String[]::new))
        .exitCodeListHeading("%nExit status:%n")
        .exitCodeList(new TreeMap<>(STATUSES));
    return spec;
  }

  /** Adds the option for help, the last of every command. */
  static CommandSpec helped(CommandSpec spec) {
    return spec.addOption(
        OptionSpec.builder("-h", "--help")
            .usageHelp(true)
            .description("Print this help and end.")
            .build());
  }

  /** A parameter at its place. */
  static PositionalParamSpec parameter(
      int index, String label, boolean required, String description) {
    return PositionalParamSpec.builder()
        .index(Integer.toString(index))
        .paramLabel(label)
        .type(String.class)
        .arity(required ? "1" : "0..1")
        .required(required)
        .description(description)
        .build();
  }

  /** Parameters of any number. */
  static PositionalParamSpec parameters(String label, String description) {
    return PositionalParamSpec.builder()
        .paramLabel(label)
        .type(String[].class)
        .arity("0..*")
        .description(description)
        .build();
  }

  /** An option without a value. */
  static OptionSpec flag(String description, String name, String... names) {
    return OptionSpec.builder(name, names)
        .type(boolean.class)
        .arity("0")
        .description(description)
        .build();
  }

  /** An option with a value; an array's may be given again. */
  static OptionSpec option(String name, String label, Class<?> type, String description) {
    return OptionSpec.builder(name)
        .paramLabel(label)
        .type(type)
        .arity("1")
        .description(description)
        .build();
  }
}
