package dev.holdfast.cli;

import dev.holdfast.design.Cell;
import dev.holdfast.design.Convention;
import dev.holdfast.design.Scale;
import dev.holdfast.design.Unit;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * The text of a plan for a cell.
 *
 * <p>Examples are entries {@code key|value|meaning} parted by semicolons; a key {@code shares.new}
 * is the entry {@code new} of {@code shares}, a value that starts with {@code =} is written in
 * place and is no quantity, one that starts with {@code [} is a table.
 */
final class StartText {
  private final Cell cell;
  private final String examples;
  private final Map<Convention, String> conventions;

  StartText(Cell cell, String examples, Map<Convention, String> conventions) {
    this.cell = cell;
    this.examples = examples;
    this.conventions = conventions;
  }

  /**
   * The plan.
   *
   * @param sizes numbers by group, or of events; empty while they are still to be computed
   * @param power the power claimed; empty while the numbers are asked for
   */
  String write(List<String> sizes, List<String> power) {
    Map<String, String> effect = new LinkedHashMap<>();
    StringBuilder quantities = new StringBuilder();
    for (String example : examples.split(";")) {
      String[] parts = example.strip().split("\\|");
      effect.put(parts[0], entry(parts, quantities));
    }
    String scale = cell.scales().stream().map(Scale::word).sorted().findFirst().orElseThrow();
    boolean events = cell.arms().unit() == Unit.EVENTS;
    StringBuilder text = new StringBuilder();
    text.append("# yaml-language-server: $schema=plan.schema.json\n");
    text.append(
        "# 'holdfast schema > plan.schema.json' writes that file; an editor then completes and\n");
    text.append("# explains the keys. Without it, leave the first line out.\n#\n");
    text.append("# A study plan for holdfast. Every figure here is an example: put in your own,\n");
    text.append("# say where each comes from, then run: holdfast check\n");
    text.append("format: holdfast-plan/1\n\nstudy:\n");
    text.append("  title: The title of your study\n");
    text.append("  justification: power\n");
    text.append("  participants: humans          # or animals, samples, records, simulated\n");
    text.append("  stage: draft\n\ndefaults:\n");
    text.append("  alpha: 0.05\n  sides: two\n  target-power: 0.80\n");
    if (quantities.length() > 0) {
      text.append("\n# The numbers that the argument rests on. Each needs a source, such as\n");
      text.append(
          "#   source: { kind: published-study, cite: Author (year) and table, doi: 10.… }\n");
      text.append("#   source: { kind: smallest-worthwhile, reason: who agreed on it, and why }\n");
      text.append("quantities:\n").append(quantities);
    }
    text.append("\noutcomes:\n  outcome:\n    role: primary\n    scale: ").append(scale);
    text.append("\n\nanalyses:\n  main:\n    outcome: outcome\n");
    text.append("    question: ").append(cell.question()).append('\n');
    text.append("    arrangement: ").append(cell.key().arrangement().word()).append('\n');
    text.append("    test: ").append(cell.key().test()).append('\n');
    if (!conventions.isEmpty()) {
      text.append("    conventions: { ").append(stated()).append(" }\n");
    }
    text.append("    effect:\n").append(effect(effect));
    List<String> groups = groups();
    if (events) {
      if (!sizes.isEmpty()) {
        text.append("    events: ").append(sizes.get(0)).append('\n');
      }
    } else if (!sizes.isEmpty()) {
      text.append("    sample: ")
          .append(byGroup(groups, sizes))
          .append(pairs() ? "   # pairs analysed\n" : "   # analysed, by group\n");
    }
    text.append("    claims: { ").append(claims(groups, sizes, power, events)).append(" }\n");
    text.append(
        "\n# Of those enrolled, some are lost before the analysis: plan for it, or say why not.\n");
    text.append("recruitment:\n  no-loss-reason: Put your reason here, or the loss you expect\n");
    return text.toString();
  }

  private boolean pairs() {
    return cell.arms().unit() == Unit.PAIRS;
  }

  private String stated() {
    return Arrays.stream(Convention.values())
        .filter(conventions::containsKey)
        .map(convention -> convention.key() + ": " + conventions.get(convention))
        .collect(Collectors.joining(", "));
  }

  private static String entry(String[] parts, StringBuilder quantities) {
    String value = parts[1];
    if (value.startsWith("=")) {
      return value.substring(1);
    }
    if (value.startsWith("[")) {
      return value;
    }
    String name = parts[0].replace('.', '-');
    quantities
        .append("  ")
        .append(name)
        .append(":\n    value: ")
        .append(value)
        .append("\n    meaning: ")
        .append(parts[2])
        .append("\n    # source: still to fill in\n");
    return name;
  }

  private static String effect(Map<String, String> effect) {
    StringBuilder text = new StringBuilder();
    String open = "";
    for (Map.Entry<String, String> entry : effect.entrySet()) {
      int dot = entry.getKey().indexOf('.');
      String key = dot < 0 ? entry.getKey() : entry.getKey().substring(0, dot);
      if (dot >= 0 && !key.equals(open)) {
        text.append("      ").append(key).append(":\n");
      }
      open = dot < 0 ? "" : key;
      text.append(dot < 0 ? "      " : "        ")
          .append(dot < 0 ? key : entry.getKey().substring(dot + 1))
          .append(": ")
          .append(entry.getValue())
          .append('\n');
    }
    return text.toString();
  }

  private List<String> groups() {
    if (cell.arms().least() == 1) {
      return List.of(pairs() ? "pairs" : "all");
    }
    return cell.arms().most() > 2 ? List.of("first", "second", "third") : List.of("new", "usual");
  }

  private static String byGroup(List<String> groups, List<String> sizes) {
    StringBuilder text = new StringBuilder("{ ");
    for (int i = 0; i < groups.size(); i++) {
      text.append(i == 0 ? "" : ", ")
          .append(groups.get(i))
          .append(": ")
          .append(sizes.isEmpty() ? "100" : sizes.get(i));
    }
    return text.append(" }").toString();
  }

  private static String claims(
      List<String> groups, List<String> sizes, List<String> power, boolean events) {
    if (sizes.isEmpty()) {
      return events ? "events: 100" : "sample: " + byGroup(groups, List.of());
    }
    if (events) {
      return "power: " + power.get(0) + ", events: " + sizes.get(0);
    }
    long total = sizes.stream().mapToLong(Long::parseLong).sum();
    return "power: " + power.get(0) + ", total: " + total;
  }
}
