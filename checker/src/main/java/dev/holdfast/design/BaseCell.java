package dev.holdfast.design;

import java.util.List;
import java.util.Set;

/** What every cell says of itself, kept as it was given. */
public abstract class BaseCell implements Cell {
  private final CellKey key;
  private final Set<Scale> scales;
  private final String title;
  private final String question;
  private final Arms arms;
  private final List<InputSpec> inputs;
  private final List<Method> methods;

  /** A cell; the parts are those of {@link Cell}. */
  protected BaseCell(
      CellKey key,
      Set<Scale> scales,
      String title,
      String question,
      Arms arms,
      List<InputSpec> inputs,
      List<Method> methods) {
    this.key = key;
    this.scales = Set.copyOf(scales);
    this.title = title;
    this.question = question;
    this.arms = arms;
    this.inputs = List.copyOf(inputs);
    this.methods = List.copyOf(methods);
  }

  @Override
  public final CellKey key() {
    return key;
  }

  @Override
  public final Set<Scale> scales() {
    return scales;
  }

  @Override
  public final String title() {
    return title;
  }

  @Override
  public final String question() {
    return question;
  }

  @Override
  public final Arms arms() {
    return arms;
  }

  @Override
  public final List<InputSpec> inputs() {
    return inputs;
  }

  @Override
  public final List<Method> methods() {
    return methods;
  }
}
