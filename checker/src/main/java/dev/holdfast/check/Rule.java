package dev.holdfast.check;

import java.util.List;

/**
 * Looks at a plan for one kind of finding. Pure: it prints nothing, reads nothing, and its answer
 * depends on the view alone.
 */
public interface Rule {
  /** What it finds, in any order. */
  List<Finding> look(StudyView view);
}
