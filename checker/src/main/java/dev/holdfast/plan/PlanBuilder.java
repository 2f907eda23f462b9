package dev.holdfast.plan;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Turns a tree in which nothing is wrong into a plan: names of quantities are replaced by their
 * figures; defaults, and what a case leaves to its analysis, are carried in.
 */
final class PlanBuilder {
  private static final List<String> BEYOND =
      List.of("clusters", "looks", "covariates", "prior", "finite-population");

  /** A section that is not there. */
  private static final Node.Mapping NONE = new Node.Mapping(Map.of(), Place.START);

  private final Node.Mapping root;
  private final QuantityNames names;
  private final Node.Mapping defaults;

  PlanBuilder(Node root, QuantityNames names) {
    this.root = (Node.Mapping) root;
    this.names = names;
    this.defaults = section(this.root, "defaults").orElse(NONE);
  }

  Plan plan() {
    return new Plan(
        study(root.entries().get("study")),
        each(section(root, "quantities"), this::quantity),
        each(section(root, "outcomes"), PlanBuilder::outcome),
        each(section(root, "analyses"), this::analysis),
        each(section(root, "families"), this::family),
        Optional.ofNullable(root.entries().get("recruitment")).map(this::recruitment),
        Optional.ofNullable(root.entries().get("registration")).map(PlanBuilder::registration),
        items(root, "amendments").stream().map(PlanBuilder::amendment).toList(),
        items(root, "waivers").stream().map(PlanBuilder::waiver).toList());
  }

  private static Study study(Node.Entry entry) {
    Node.Mapping study = (Node.Mapping) entry.value();
    return new Study(
        text(study, "title").orElseThrow(),
        text(study, "id"),
        text(study, "justification").orElseThrow(),
        text(study, "sensitivity"),
        text(study, "unit"),
        text(study, "participants").orElseThrow(),
        text(study, "stage").orElse("draft"),
        entry.keyPlace());
  }

  private Quantity quantity(String name, Node.Entry entry) {
    Node.Mapping quantity = (Node.Mapping) entry.value();
    Node.Scalar value = (Node.Scalar) quantity.get("value");
    return new Quantity(
        name,
        number(value.text(), Optional.of(name), value.place()),
        text(quantity, "unit"),
        text(quantity, "meaning"),
        Optional.ofNullable(quantity.entries().get("source")).map(PlanBuilder::source),
        entry.keyPlace());
  }

  private static Source source(Node.Entry entry) {
    Node.Mapping source = (Node.Mapping) entry.value();
    Map<String, Word> fields = new LinkedHashMap<>();
    source
        .entries()
        .forEach(
            (key, field) -> {
              if (!key.equals("kind")) {
                String written = field.value() instanceof Node.Scalar scalar ? scalar.text() : "";
                fields.put(key, new Word(written, field.keyPlace()));
              }
            });
    return new Source(
        text(source, "kind").orElseThrow(), Collections.unmodifiableMap(fields), entry.keyPlace());
  }

  private static Outcome outcome(String name, Node.Entry entry) {
    Node.Mapping outcome = (Node.Mapping) entry.value();
    return new Outcome(
        name,
        text(outcome, "role").orElseThrow(),
        text(outcome, "scale").orElseThrow(),
        text(outcome, "unit"),
        entry.keyPlace());
  }

  private Analysis analysis(String name, Node.Entry entry) {
    Node.Mapping analysis = (Node.Mapping) entry.value();
    Map<String, Place> beyond = new LinkedHashMap<>();
    for (String key : BEYOND) {
      if (analysis.get(key) != null) {
        beyond.put(key, analysis.entries().get(key).keyPlace());
      }
    }
    List<Node> listed = items(analysis, "cases");
    List<Case> cases = new ArrayList<>();
    if (listed.isEmpty() || analysis.get("claims") != null) {
      cases.add(situation(analysis, analysis, entry.keyPlace()));
    }
    listed.forEach(each -> cases.add(situation((Node.Mapping) each, analysis, each.place())));
    return new Analysis(
        name,
        word(analysis, "outcome").orElseThrow(),
        text(analysis, "question"),
        word(analysis, "arrangement").orElseThrow(),
        word(analysis, "test").orElseThrow(),
        word(analysis, "aim").orElse(new Word("superiority", entry.keyPlace())),
        Optional.ofNullable(analysis.entries().get("margin")).map(this::input),
        text(analysis, "one-sided-reason"),
        List.copyOf(cases),
        Collections.unmodifiableMap(beyond),
        figure(analysis, "loss"),
        entry.keyPlace());
  }

  /**
   * One situation.
   *
   * @param own the case, or the analysis itself
   * @param analysis what has the parts that the case leaves out
   */
  private Case situation(Node.Mapping own, Node.Mapping analysis, Place place) {
    Map<String, Input> effect = new LinkedHashMap<>();
    Place effectPlace = place;
    for (Node.Mapping level : List.of(analysis, own)) {
      Node.Entry entry = level.entries().get("effect");
      if (entry != null) {
        ((Node.Mapping) entry.value())
            .entries()
            .forEach((key, value) -> effect.put(key, input(value)));
        effectPlace = entry.keyPlace();
      }
    }
    return new Case(
        settings(own, analysis),
        Collections.unmodifiableMap(effect),
        effectPlace,
        figures(inherited(own, analysis, "sample")),
        figures(inherited(own, analysis, "allocation")),
        inherited(own, analysis, "events").map(this::figure),
        inherited(own, analysis, "method").map(PlanBuilder::word),
        claims(own),
        place);
  }

  private Settings settings(Node.Mapping own, Node.Mapping analysis) {
    Map<String, Word> conventions = new LinkedHashMap<>();
    for (Node.Mapping level : List.of(defaults, analysis, own)) {
      section(level, "conventions")
          .orElse(NONE)
          .entries()
          .forEach((key, entry) -> conventions.put(key, convention(entry.value())));
    }
    return new Settings(
        setting(own, analysis, "alpha").map(this::figure),
        setting(own, analysis, "sides").map(PlanBuilder::word),
        setting(own, analysis, "target-power").map(this::figure),
        new Conventions(Collections.unmodifiableMap(conventions)));
  }

  private Optional<Node> setting(Node.Mapping own, Node.Mapping analysis, String key) {
    for (Node.Mapping level : List.of(own, analysis, defaults)) {
      if (level.get(key) != null) {
        return Optional.of(level.get(key));
      }
    }
    return Optional.empty();
  }

  /** The word of a convention; of {@code multiple-of}, the number. */
  private static Word convention(Node value) {
    return word(value instanceof Node.Mapping mapping ? mapping.get("multiple-of") : value);
  }

  private Family family(String name, Node.Entry entry) {
    Node.Mapping family = (Node.Mapping) entry.value();
    return new Family(
        name,
        items(family, "of").stream().map(PlanBuilder::word).toList(),
        word(family, "control").orElseThrow(),
        figure(family, "alpha"),
        figure(family, "correlation"),
        text(family, "independent").orElse("no").equals("yes"),
        figures(Optional.ofNullable(family.get("levels"))),
        claims(family),
        entry.keyPlace());
  }

  private Recruitment recruitment(Node.Entry entry) {
    Node.Mapping recruitment = (Node.Mapping) entry.value();
    Optional<Node> enrol = Optional.ofNullable(recruitment.get("enrol"));
    return new Recruitment(
        enrol.filter(Node.Scalar.class::isInstance).map(this::figure),
        figures(enrol.filter(Node.Mapping.class::isInstance)),
        figure(recruitment, "loss"),
        text(recruitment, "no-loss-reason"),
        entry.keyPlace());
  }

  private static Registration registration(Node.Entry entry) {
    Node.Mapping registration = (Node.Mapping) entry.value();
    return new Registration(
        text(registration, "date"),
        text(registration, "place"),
        word(registration, "seal"),
        entry.keyPlace());
  }

  private static Amendment amendment(Node node) {
    Node.Mapping amendment = (Node.Mapping) node;
    return new Amendment(
        text(amendment, "date").orElseThrow(),
        word(amendment, "changes").orElseThrow(),
        text(amendment, "reason").orElseThrow(),
        text(amendment, "before-data").map(word -> word.equals("yes") || word.equals("true")),
        amendment.place());
  }

  private static Waiver waiver(Node node) {
    Node.Mapping waiver = (Node.Mapping) node;
    return new Waiver(
        word(waiver, "finding").orElseThrow(),
        word(waiver, "at").orElseThrow(),
        text(waiver, "reason").orElseThrow(),
        text(waiver, "until"),
        waiver.place());
  }

  private List<Claim> claims(Node.Mapping owner) {
    List<Claim> claims = new ArrayList<>();
    section(owner, "claims")
        .orElse(NONE)
        .entries()
        .forEach(
            (kind, entry) -> {
              if (kind.equals("sample")) {
                ((Node.Mapping) entry.value())
                    .entries()
                    .forEach(
                        (group, each) -> claims.add(claim(kind, Optional.of(group), each.value())));
              } else {
                claims.add(claim(kind, Optional.empty(), entry.value()));
              }
            });
    return List.copyOf(claims);
  }

  private Claim claim(String kind, Optional<String> group, Node node) {
    if (!(node instanceof Node.Mapping mapping)) {
      return new Claim(kind, group, Claim.Relation.IS, figure(node), Optional.empty());
    }
    String relation =
        mapping.entries().keySet().stream()
            .filter(key -> !key.equals("as"))
            .findFirst()
            .orElseThrow();
    return new Claim(
        kind,
        group,
        switch (relation) {
          case "at-least" -> Claim.Relation.AT_LEAST;
          case "about" -> Claim.Relation.ABOUT;
          default -> Claim.Relation.IS;
        },
        figure(mapping.get(relation)),
        word(mapping, "as"));
  }

  private Input input(Node.Entry entry) {
    Node value = entry.value();
    if (value instanceof Node.Mapping) {
      return new Input.Named(figures(Optional.of(value)), entry.keyPlace());
    }
    if (value instanceof Node.Sequence sequence) {
      boolean table = sequence.items().stream().allMatch(Node.Sequence.class::isInstance);
      return table
          ? new Input.Table(sequence.items().stream().map(this::row).toList(), entry.keyPlace())
          : new Input.Row(row(sequence), entry.keyPlace());
    }
    Node.Scalar scalar = (Node.Scalar) value;
    return scalar.kind() == Node.Scalar.Kind.TEXT && !names.isUse(scalar)
        ? new Input.Word(scalar.text(), scalar.place())
        : new Input.One(figure(scalar));
  }

  private List<Figure> row(Node sequence) {
    return ((Node.Sequence) sequence).items().stream().map(this::figure).toList();
  }

  private Map<String, Figure> figures(Optional<Node> section) {
    Map<String, Figure> figures = new LinkedHashMap<>();
    section
        .map(Node.Mapping.class::cast)
        .orElse(NONE)
        .entries()
        .forEach((key, entry) -> figures.put(key, figure(entry.value())));
    return Collections.unmodifiableMap(figures);
  }

  private Optional<Figure> figure(Node.Mapping section, String key) {
    return Optional.ofNullable(section.get(key)).map(this::figure);
  }

  /** A number, or that of the quantity whose name stands for it. */
  private Figure figure(Node node) {
    Node.Scalar scalar = (Node.Scalar) node;
    return scalar.kind() == Node.Scalar.Kind.NUMBER
        ? number(scalar.text(), Optional.empty(), scalar.place())
        : number(names.value(scalar.text()), Optional.of(scalar.text()), scalar.place());
  }

  private static Figure number(String written, Optional<String> quantity, Place place) {
    return new Figure(
        Double.parseDouble(written), written, WrittenNumber.decimals(written), quantity, place);
  }

  private static Optional<Node> inherited(Node.Mapping own, Node.Mapping analysis, String key) {
    return Optional.ofNullable(own.get(key)).or(() -> Optional.ofNullable(analysis.get(key)));
  }

  private static Optional<Word> word(Node.Mapping section, String key) {
    return Optional.ofNullable(section.get(key)).map(PlanBuilder::word);
  }

  private static Word word(Node node) {
    return new Word(((Node.Scalar) node).text(), node.place());
  }

  private static Optional<String> text(Node.Mapping section, String key) {
    return word(section, key).map(Word::text);
  }

  private static Optional<Node.Mapping> section(Node.Mapping owner, String key) {
    return Optional.ofNullable((Node.Mapping) owner.get(key));
  }

  private static List<Node> items(Node.Mapping owner, String key) {
    return owner.get(key) instanceof Node.Sequence sequence ? sequence.items() : List.of();
  }

  /** Makes a record of each entry of a section, in the order of the file. */
  private static <T> Map<String, T> each(Optional<Node.Mapping> section, Named<T> make) {
    Map<String, T> made = new LinkedHashMap<>();
    section.orElse(NONE).entries().forEach((name, entry) -> made.put(name, make.of(name, entry)));
    return Collections.unmodifiableMap(made);
  }

  /** Makes a record of an entry with a name. */
  private interface Named<T> {
    T of(String name, Node.Entry entry);
  }
}
