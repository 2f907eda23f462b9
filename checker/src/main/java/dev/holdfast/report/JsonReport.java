package dev.holdfast.report;

import dev.holdfast.check.ClaimResult;
import dev.holdfast.check.Fall;
import dev.holdfast.check.Finding;
import dev.holdfast.check.Headroom;
import dev.holdfast.check.PlanReport;
import dev.holdfast.plan.Place;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.OptionalDouble;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.JsonNodeFactory;
import tools.jackson.databind.node.ObjectNode;

/**
 * The report for programs, as {@code schema/report.schema.json} describes it. Computed figures have
 * eight significant digits, so that the same run gives the same bytes everywhere.
 */
public final class JsonReport {
  private static final MathContext DIGITS = new MathContext(8, RoundingMode.HALF_EVEN);

  private final JsonNodeFactory nodes = JsonNodeFactory.instance;

  /** The report of a run. */
  public String write(List<PlanReport> reports) {
    ObjectNode root = nodes.objectNode();
    root.put("format", "holdfast-report/1");
    ArrayNode plans = root.putArray("plans");
    reports.forEach(report -> plans.add(plan(report)));
    Tally tally = Tally.of(reports);
    root.putObject("totals")
        .put("plans", tally.plans())
        .put("hold", tally.hold())
        .put("blocks", tally.blocks())
        .put("warns", tally.warns())
        .put("notes", tally.notes());
    JsonMapper mapper = JsonMapper.builder().enable(SerializationFeature.INDENT_OUTPUT).build();
    return Safe.json(mapper.writeValueAsString(root).replace("\r\n", "\n")) + "\n";
  }

  private ObjectNode plan(PlanReport report) {
    ObjectNode plan = nodes.objectNode();
    plan.put("file", report.path());
    report.study().ifPresent(study -> plan.put("study", study));
    plan.put("verdict", report.standing().word());
    ArrayNode claims = plan.putArray("claims");
    report.claims().forEach(result -> claims.add(claim(result)));
    ArrayNode findings = plan.putArray("findings");
    report.findings().forEach(finding -> findings.add(finding(finding)));
    return plan;
  }

  private ObjectNode claim(ClaimResult result) {
    ObjectNode claim = nodes.objectNode();
    claim.put(
        result.subject().startsWith("families.") ? "family" : "analysis",
        result.subject().substring(result.subject().indexOf('.') + 1));
    result.caseNumber().ifPresent(number -> claim.put("case", number));
    claim.put("claim", result.claim().kind());
    result.claim().group().ifPresent(group -> claim.put("group", group));
    claim.put(
        "relation",
        switch (result.claim().relation()) {
          case IS -> "is";
          case AT_LEAST -> "at-least";
          case ABOUT -> "about";
        });
    claim.put("claimed", new BigDecimal(result.claim().figure().written()));
    put(claim, "computed", result.computed());
    if (!result.method().isEmpty()) {
      claim.put("stated-method", result.method());
    }
    put(claim, "exact", result.best());
    if (!result.bestMethod().isEmpty()) {
      claim.put("exact-method", result.bestMethod());
    }
    claim.put("verdict", result.verdict().word());
    if (!result.explanation().isEmpty()) {
      claim.put("why", result.explanation());
    }
    claim.set("at", place(result.claim().figure().place()));
    ArrayNode headroom = claim.putArray("headroom");
    result.headroom().forEach(room -> headroom.add(room(room)));
    result.fall().ifPresent(fall -> claim.set("since", fall(fall)));
    return claim;
  }

  private ObjectNode room(Headroom room) {
    return nodes
        .objectNode()
        .put("quantity", room.quantity())
        .put("now", number(room.now()))
        .put("limit", number(room.limit()))
        .put("direction", room.atMost() ? "at-most" : "at-least");
  }

  private ObjectNode fall(Fall fall) {
    ObjectNode since = nodes.objectNode();
    since.put("revision", fall.revision());
    since.put("computed", number(fall.before()));
    ArrayNode moved = since.putArray("moved");
    for (Fall.Move move : fall.moved()) {
      ObjectNode each = moved.addObject();
      each.put("name", move.name()).put("from", move.from()).put("to", move.to());
      put(each, "alone-unmoved", move.restores());
      each.set("at", place(move.place()));
    }
    return since;
  }

  private ObjectNode finding(Finding finding) {
    ObjectNode node = nodes.objectNode();
    node.put("finding", finding.kind().word());
    node.put("weight", finding.weight().word());
    if (!finding.subject().isEmpty()) {
      node.put("subject", finding.subject());
    }
    node.put("message", finding.message());
    node.set("at", place(finding.place()));
    ArrayNode repairs = node.putArray("repairs");
    finding.remedies().forEach(repairs::add);
    return node;
  }

  private ObjectNode place(Place place) {
    return nodes
        .objectNode()
        .put("line", place.line())
        .put("column", place.column())
        .put("pointer", place.pointer());
  }

  private static void put(ObjectNode node, String key, OptionalDouble value) {
    if (value.isPresent()) {
      node.put(key, number(value.getAsDouble()));
    }
  }

  private static BigDecimal number(double value) {
    BigDecimal rounded = BigDecimal.valueOf(value).round(DIGITS).stripTrailingZeros();
    return rounded.scale() < 0 ? rounded.setScale(0) : rounded;
  }
}
