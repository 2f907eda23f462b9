package dev.holdfast.plan;

import java.util.Optional;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlVersionException;
import tools.jackson.core.JacksonException;

/** Says in words of its own what the YAML parser refuses, and what to do about it. */
final class YamlWording {
  private static final String QUOTES = "Put a text that holds marks of YAML in quotes.";

  private YamlWording() {}

  static PlanProblem of(JacksonException refusal) {
    if (refusal.getCause() instanceof MarkedYamlEngineException marked) {
      return of(marked);
    }
    if (refusal.getCause() instanceof YamlVersionException) {
      return new PlanProblem(
          "The file asks for a version of YAML that is not read.",
          "Remove the line that begins with %YAML.",
          Place.START);
    }
    Place place =
        refusal.getLocation() == null || refusal.getLocation().getLineNr() < 1
            ? Place.START
            : new Place(refusal.getLocation().getLineNr(), refusal.getLocation().getColumnNr(), "");
    String said = refusal.getOriginalMessage();
    if (said.contains("Expected a property name")) {
      return new PlanProblem("A key must be a plain word.", "Remove the '? ' before it.", place);
    }
    return new PlanProblem("The file is not YAML: " + Quoted.plain(said) + ".", QUOTES, place);
  }

  private static PlanProblem of(MarkedYamlEngineException refusal) {
    String problem = refusal.getProblem() == null ? "" : refusal.getProblem();
    String context = refusal.getContext() == null ? "" : refusal.getContext();
    Place at = place(refusal.getProblemMark().or(refusal::getContextMark));
    Place opened = place(refusal.getContextMark().or(refusal::getProblemMark));
    if (problem.contains("(TAB)")) {
      return new PlanProblem("A tab stands at the start of a line.", "Indent with spaces.", at);
    }
    if (problem.contains("cannot start any token")) {
      return new PlanProblem(
          "The character at this place cannot begin a value.", "Put the text in quotes.", at);
    }
    if (problem.contains("mapping values are not allowed")) {
      return new PlanProblem(
          "A ': ' stands where no key can be.",
          "Put a text that holds ': ' in quotes; align a key with the others of its section.",
          at);
    }
    if (context.contains("quoted scalar") && problem.contains("end of stream")) {
      return new PlanProblem(
          "The quotation mark that opens here is never closed.", "Close it.", opened);
    }
    if (problem.contains("unknown escape")) {
      return new PlanProblem(
          "In double quotes a backslash stands before a character that it cannot change.",
          "Use single quotes, or write the backslash twice.",
          at);
    }
    if (context.contains("flow sequence")) {
      return new PlanProblem(
          "The list that opens here is not closed before line "
              + at.line()
              + ", column "
              + at.column()
              + ".",
          "Close it with ']', and put a comma between its entries.",
          opened);
    }
    if (context.contains("flow mapping")) {
      return new PlanProblem(
          "The section that opens here is not closed before line "
              + at.line()
              + ", column "
              + at.column()
              + ".",
          "Close it with '}', and put a comma between its entries.",
          opened);
    }
    if (problem.contains("could not find expected ':'")) {
      return new PlanProblem(
          "A line without ': ' stands among keys.", "Write 'key: value'.", opened);
    }
    if (context.contains("block mapping") || context.contains("block collection")) {
      return new PlanProblem(
          "This line fits no section by its indentation.",
          "Align it with the keys of the section that it belongs to.",
          at);
    }
    if (problem.contains("expected the node content") && problem.contains("<stream end>")) {
      return new PlanProblem(
          "The file ends where a value is wanted.",
          "Write the value, and close the brackets that are open.",
          at);
    }
    if (problem.contains("expected the node content")) {
      return new PlanProblem(
          "A value is wanted here, and a mark of YAML stands in its place.", QUOTES, at);
    }
    if (problem.contains("sequence entries are not allowed")) {
      return new PlanProblem(
          "A '- ' stands where no list can begin.", "Begin the list on a line of its own.", at);
    }
    if (context.contains("block scalar")) {
      return new PlanProblem(
          "A text that begins with '|' or '>' begins on the next line.", QUOTES, at);
    }
    if (problem.contains("alphabetic or numeric") || context.contains("tag")) {
      return new PlanProblem(
          "An anchor, an alias or a tag stands here; a plan has none.", QUOTES, at);
    }
    return new PlanProblem("The file is not YAML: " + Quoted.plain(problem) + ".", QUOTES, at);
  }

  private static Place place(Optional<Mark> mark) {
    return mark.map(m -> new Place(m.getLine() + 1, m.getColumn() + 1, "")).orElse(Place.START);
  }
}
