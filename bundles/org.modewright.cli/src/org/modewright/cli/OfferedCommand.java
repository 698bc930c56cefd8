package org.modewright.cli;

import java.util.Objects;
import java.util.concurrent.Callable;

/**
 * A command that another bundle offers; the command itself is made only when it is called.
 *
 * @param name the word on the command line
 * @param summary what it does, in one line
 * @param maker makes the command
 */
public record OfferedCommand(String name, String summary, Callable<HeadlessCommand> maker) {

    /** Checks that everything is there. */
    public OfferedCommand {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(summary, "summary");
        Objects.requireNonNull(maker, "maker");
    }
}
