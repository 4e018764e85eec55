package evensun.result;

import org.jspecify.annotations.Nullable;

/**
 * The found design evaluated in another way.
 *
 * @param kind {@code numerics} or {@code material}
 * @param what what was done differently, in words
 * @param aim the aim then; null where it could not be evaluated
 * @param difference that aim minus the headline's
 * @param note why it could not be evaluated, or a remark
 */
public record Opinion(
    String kind, String what, @Nullable Double aim, @Nullable Double difference, String note) {}
