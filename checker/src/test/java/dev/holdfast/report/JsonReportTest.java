package dev.holdfast.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.dialect.Dialects;
import dev.holdfast.check.PlanReport;
import dev.holdfast.check.Plans;
import dev.holdfast.plan.Characters;
import dev.holdfast.plan.SchemaBundle;
import dev.holdfast.plan.Schemas;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ObjectNode;

class JsonReportTest {
  private static final JsonMapper MAPPER = new JsonMapper();

  private static final String FAMILY =
      """
      families:
        primary:
          { of: [main, other], control: all-must-succeed, independent: yes, claims: { every: 0.80 } }
      """;

  private static PlanReport fallen() {
    return Plans.check(
        Plans.TWO_MEANS.replace("value: 10,", "value: 11.5,").replace("10, l", "12, l"),
        Plans.TWO_MEANS);
  }

  private static JsonNode written(PlanReport... reports) {
    return MAPPER.readTree(new JsonReport().write(List.of(reports)));
  }

  private static Schema schema() {
    return SchemaRegistry.withDialect(Dialects.getDraft7())
        .getSchema(MAPPER.readTree(new SchemaBundle(new Schemas()).of(Schemas.REPORT)));
  }

  @Test
  void everyKindOfReportIsValidAgainstItsSchema() {
    List<PlanReport> reports =
        List.of(
            Plans.check(Plans.TWO_MEANS),
            fallen(),
            Plans.check("format: nothing\n"),
            Plans.check(Plans.TWO_MEANS.replace("sd: score-sd", "d: 0.5") + "x: 1\n"),
            Plans.check(Plans.TWO_MEANS.replace(", sd: score-sd", "")),
            Plans.check(Plans.TWO_MEANS + FAMILY.replace("main, other", "main, main")),
            Plans.checker(true).check(Plans.read(Plans.TWO_MEANS)));
    assertEquals(List.of(), schema().validate(written(reports.toArray(new PlanReport[0]))));
    assertEquals(List.of(), schema().validate(written()));
  }

  @Test
  void everyPropertyOfTheSchemaIsExplained() {
    List<String> lacking = new ArrayList<>();
    collect("", MAPPER.readTree(new Schemas().text(Schemas.REPORT).orElseThrow()), lacking);
    assertEquals(List.of(), lacking);
  }

  private static void collect(String where, JsonNode node, List<String> lacking) {
    for (Map.Entry<String, JsonNode> entry : node.path("properties").properties()) {
      for (String key : List.of("title", "description", "examples")) {
        if (entry.getValue().path(key).isMissingNode()) {
          lacking.add(where + "/" + entry.getKey() + " " + key);
        }
      }
    }
    node.properties()
        .forEach(entry -> collect(where + "/" + entry.getKey(), entry.getValue(), lacking));
  }

  @Test
  void theSchemaIsClosed() {
    ObjectNode report = (ObjectNode) written(fallen());
    ((ObjectNode) report.path("plans").get(0).path("claims").get(0)).put("confidence", 1);
    assertFalse(schema().validate(report).isEmpty());
    ObjectNode other = (ObjectNode) written(fallen());
    ((ObjectNode) other.path("plans").get(0)).put("verdict", "fine");
    assertFalse(schema().validate(other).isEmpty());
  }

  @Test
  void aFallenClaimHasItsFiguresItsPlaceAndWhatMoved() {
    JsonNode claim = written(fallen()).path("plans").get(0).path("claims").get(0);
    assertEquals("main", claim.path("analysis").asString());
    assertEquals("power", claim.path("claim").asString());
    assertEquals("short", claim.path("verdict").asString());
    assertEquals(0.68466, claim.path("computed").asDouble(), 5e-5);
    assertEquals("/analyses/main/claims/power", claim.path("at").path("pointer").asString());
    JsonNode since = claim.path("since");
    assertEquals("HEAD", since.path("revision").asString());
    assertEquals("score-sd", since.path("moved").get(0).path("name").asString());
    assertEquals("10", since.path("moved").get(0).path("from").asString());
    assertEquals(0.8015, since.path("moved").get(0).path("alone-unmoved").asDouble(), 5e-5);
    JsonNode room = claim.path("headroom").get(1);
    assertEquals("score-sd", room.path("quantity").asString());
    assertEquals("at-most", room.path("direction").asString());
  }

  @Test
  void theClaimedFigureKeepsItsZeros() {
    assertTrue(
        new JsonReport().write(List.of(fallen())).contains("\"claimed\" : 0.80,"),
        new JsonReport().write(List.of(fallen())));
  }

  @Test
  void theTotalsCountPlansAndFindings() {
    JsonNode totals = written(Plans.check(Plans.TWO_MEANS), fallen()).path("totals");
    assertEquals(2, totals.path("plans").asInt());
    assertEquals(1, totals.path("hold").asInt());
    assertEquals(2, totals.path("blocks").asInt());
  }

  @Test
  void aPlanWithoutFindingsHasAnEmptyListAndTheFileEndsWithALine() {
    String text = new JsonReport().write(List.of(Plans.check(Plans.TWO_MEANS)));
    assertTrue(text.contains("\"findings\" : [ ]"), text);
    assertTrue(text.endsWith("}\n") && !text.contains("\r"));
  }

  @Test
  void hostileTextIsHarmlessInALogAndUnchangedForAProgram() {
    String hostile = "::error::a\u001B[2J\u009B\u202E##[group]\u2028\uDB40\uDC41\"é🐑";
    PlanReport report =
        new PlanReport(
            hostile, Optional.of(hostile), PlanReport.Standing.HOLDS, List.of(), List.of());
    String text = new JsonReport().write(List.of(report));
    assertTrue(
        text.lines().noneMatch(line -> line.strip().startsWith("::") || line.contains("##[")),
        text);
    assertTrue(text.codePoints().allMatch(c -> c == '\n' || Characters.isVisible(c)), text);
    assertTrue(text.contains("é🐑"), text);
    assertEquals(hostile, MAPPER.readTree(text).at("/plans/0/file").asString());
  }
}
