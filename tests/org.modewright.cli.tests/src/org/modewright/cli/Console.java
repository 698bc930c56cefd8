package org.modewright.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.List;
import java.util.function.BooleanSupplier;

/** Runs the command line in this process and keeps what it says. */
final class Console {

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();
    private final int status;

    private Console(boolean terminal, BooleanSupplier cancelled, List<OfferedCommand> offered, String... arguments) {
        CommandContext context = new CommandContext("Modewright 0.1.0", new PrintWriter(out), new PrintWriter(err), terminal, cancelled);
        status = new ModewrightProgram(context, offered).run(arguments);
    }

    static Console run(String... arguments) {
        return new Console(false, () -> false, List.of(), arguments);
    }

    static Console onTerminal(String... arguments) {
        return new Console(true, () -> false, List.of(), arguments);
    }

    static Console cancelled(BooleanSupplier cancelled, String... arguments) {
        return new Console(false, cancelled, List.of(), arguments);
    }

    static Console withOffered(OfferedCommand command, String... arguments) {
        return new Console(false, () -> false, List.of(command), arguments);
    }

    int status() {
        return status;
    }

    String out() {
        return out.toString();
    }

    String err() {
        return err.toString();
    }

    @Override
    public String toString() {
        return "status " + status + "\n" + out + "\n" + err;
    }
}
