package org.modewright.cli;

import java.io.PrintWriter;
import java.util.Objects;
import java.util.function.BooleanSupplier;

/**
 * What a command works with.
 *
 * @param program the program and its version
 * @param out results
 * @param err progress, warnings and faults
 * @param terminal whether {@code err} is a terminal, so that a line may be rewritten
 * @param cancelled tells whether the user wants the work to stop; asked several times a second
 */
public record CommandContext(String program, PrintWriter out, PrintWriter err, boolean terminal, BooleanSupplier cancelled) {

    /** Checks that everything is there. */
    public CommandContext {
        Objects.requireNonNull(program, "program");
        Objects.requireNonNull(out, "out");
        Objects.requireNonNull(err, "err");
        Objects.requireNonNull(cancelled, "cancelled");
    }
}
