package evensun.scenario.reader;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.scenario.Source;
import evensun.scenario.tree.Faults;
import evensun.scenario.tree.Fields;
import evensun.scenario.tree.Node;
import evensun.scenario.tree.Node.Mapping;
import evensun.scenario.tree.Node.Scalar;
import evensun.scenario.tree.TreeReader;
import java.util.List;

/** A parsed scenario whose values are not checked yet. Immutable. */
public final class Draft {

  private final Source source;
  private final Mapping root;
  private final Faults treeFaults;

  private Draft(Source source, Mapping root, Faults treeFaults) {
    this.source = source;
    this.root = root;
    this.treeFaults = treeFaults;
  }

  static Draft of(Source source) {
    Faults faults = new Faults();
    Node root = TreeReader.read(source, faults);
    if (root instanceof Mapping mapping) {
      return new Draft(source, mapping, faults);
    }
    faults.throwIfAny();
    String what =
        root instanceof Scalar scalar && scalar.isNothing()
            ? "the file is empty; `evensun new FILE` writes a scenario to start from"
            : "a scenario is a mapping that starts with evensun: 1, but this is "
                + root.described();
    throw new InputException(Place.of(source.name()), what);
  }

  /**
   * Checks and binds the scenario, some of its values replaced.
   *
   * @param settings replacements, applied in this order
   * @throws InputException with everything that is wrong
   */
  public Scenario bind(List<Setting> settings) {
    Faults faults = new Faults();
    faults.addAll(treeFaults);
    Scenario scenario = RootBinder.bind(source, edited(settings, faults));
    faults.throwIfAny();
    return scenario;
  }

  /**
   * Checks settings that touch the stack alone, in a fraction of the time that binding takes.
   *
   * @param settings replacements, applied in this order
   * @throws InputException with everything that is wrong with the stack
   */
  public void checkStack(List<Setting> settings) {
    Faults faults = new Faults();
    StackBinder.bind(edited(settings, faults));
    faults.throwIfAny();
  }

  private Fields edited(List<Setting> settings, Faults faults) {
    Mapping edited = root;
    for (Setting setting : settings) {
      edited = Edits.apply(edited, setting, faults);
    }
    return new Fields("", edited, faults);
  }
}
