package evensun.evaluation;

import evensun.scenario.SearchSpec;
import evensun.stack.ResolvedStack;
import java.util.ArrayList;
import java.util.List;

/**
 * A number of the stack that follows another whenever that one is set.
 *
 * @param leader what is set
 * @param follower what follows
 * @param ratio what the leader's value is multiplied by
 */
public record Tie(Parameter leader, Parameter follower, double ratio) {

  /** The ties that a scenario's search asks for; keys that name nothing are reported elsewhere. */
  public static List<Tie> of(ResolvedStack stack) {
    List<Tie> ties = new ArrayList<>();
    stack.scenario().search().stream()
        .flatMap(search -> search.vary().stream())
        .filter(SearchSpec.VarySpec::isTied)
        .forEach(
            vary ->
                Parameter.of(vary.sameAs(), stack)
                    .ifPresent(
                        leader ->
                            Parameter.of(vary.key(), stack)
                                .ifPresent(
                                    follower ->
                                        ties.add(new Tie(leader, follower, vary.ratio())))));
    return ties;
  }
}
