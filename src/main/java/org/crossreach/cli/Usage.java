package org.crossreach.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ScopeType;

/**
 * What can be said to a command: its operands and options, in the order in which its help lists
 * them.
 *
 * <p>It is put together by calls and not by annotations, since to find those takes longer at every
 * start than to reduce a small measurement.
 */
final class Usage {

  private final CommandSpec spec;

  /**
   * Nothing but the name yet.
   *
   * @param name the word that is typed
   * @param description one sentence
   * @param work what the command does; it gives the exit code
   */
  Usage(String name, String description, Callable<Integer> work) {
    spec = CommandSpec.wrapWithoutInspection(work, new Collected()).name(name);
    spec.usageMessage()
        .description(description)
        .sortOptions(false)
        .exitCodeListHeading("%nExit codes:%n")
        .exitCodeList(ExitCode.explained());
  }

  /** The same for the library that reads the command line. */
  CommandSpec spec() {
    return spec;
  }

  /** Receives results. */
  PrintWriter out() {
    return spec.commandLine().getOut();
  }

  /** Receives everything else. */
  PrintWriter err() {
    return spec.commandLine().getErr();
  }

  /** What to throw where the words make no sense together. */
  ParameterException wrong(String message) {
    return new ParameterException(spec.commandLine(), message);
  }

  /** An option without a value. */
  Given<Boolean> flag(String name, String description) {
    return add(OptionSpec.builder(name).type(boolean.class), description, false);
  }

  /** An option without a value that every command has too; listed last in their help. */
  Given<Boolean> commonFlag(String name, String description) {
    return add(common(name), description, false);
  }

  /** The option that prints the help, which every command has too; listed last. */
  void help(String name, String longName, String description) {
    add(common(name, longName).usageHelp(true), description, false);
  }

  private static OptionSpec.Builder common(String... names) {
    return OptionSpec.builder(names).type(boolean.class).scopeType(ScopeType.INHERIT).order(1);
  }

  /** The option that prints the version. */
  void version(String name, String description) {
    add(OptionSpec.builder(name).type(boolean.class).versionHelp(true), description, false);
  }

  /**
   * An option that takes one value.
   *
   * @param name the option as it is typed
   * @param label stands for the value in the help
   * @param type what the value is read as
   * @param otherwise what holds without the option; may be null
   * @param description one sentence
   */
  <T> Given<T> option(String name, String label, Class<T> type, T otherwise, String description) {
    return add(OptionSpec.builder(name).paramLabel(label).type(type), description, otherwise);
  }

  /** An option that may be repeated. */
  <T> Given<List<T>> options(String name, String label, Class<T> type, String description) {
    return add(listed(name, label, type), description, List.of());
  }

  /** An option that may be repeated, and takes several values with commas between them. */
  <T> Given<List<T>> list(
      String name, String label, Class<T> type, List<T> otherwise, String description) {
    return add(listed(name, label, type).splitRegex(","), description, otherwise);
  }

  /** An option that takes a key and a value, and may be repeated with other keys. */
  Given<Map<String, String>> pairs(String name, String label, String description) {
    OptionSpec.Builder option =
        OptionSpec.builder(name)
            .paramLabel(label)
            .type(Map.class)
            .auxiliaryTypes(String.class, String.class);
    return add(option, description, Map.of());
  }

  /** The one operand. */
  <T> Given<T> operand(String label, Class<T> type, String description) {
    return add(
        PositionalParamSpec.builder().index("0").paramLabel(label).type(type).required(true),
        description,
        null);
  }

  /** Any number of operands, but no fewer than some. */
  <T> Given<List<T>> operands(int fewest, String label, Class<T> type, String description) {
    return add(
        PositionalParamSpec.builder()
            .paramLabel(label)
            .type(List.class)
            .auxiliaryTypes(type)
            .arity(fewest + "..*")
            .required(fewest > 0),
        description,
        List.of());
  }

  private static OptionSpec.Builder listed(String name, String label, Class<?> type) {
    return OptionSpec.builder(name).paramLabel(label).type(List.class).auxiliaryTypes(type);
  }

  private <T> Given<T> add(OptionSpec.Builder option, String description, T otherwise) {
    OptionSpec word = option.description(description).build();
    spec.addOption(word);
    return new Given<>(word, otherwise);
  }

  private <T> Given<T> add(PositionalParamSpec.Builder operand, String description, T otherwise) {
    PositionalParamSpec word = operand.description(description).build();
    spec.addPositional(word);
    return new Given<>(word, otherwise);
  }
}
