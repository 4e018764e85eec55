package evensun.scenario;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The solver a scenario asks for.
 *
 * @param id solver id
 * @param options options handed to it as text
 * @param place where it stands
 */
public record SolverSpec(String id, Map<String, String> options, Place place) {

  public SolverSpec {
    options = Collections.unmodifiableMap(new LinkedHashMap<>(options));
  }
}
