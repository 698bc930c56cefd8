package org.modewright.cli.internal;

import java.io.PrintWriter;
import java.util.HashSet;
import java.util.Set;
import java.util.function.BooleanSupplier;

import org.modewright.cli.CommandContext;
import org.modewright.numerics.Progress;

/** Progress on standard error: one line that is rewritten on a terminal, else a line for every new stage and now and then in a long one. */
final class ConsoleProgress implements Progress, AutoCloseable {

    private static final long BETWEEN_REWRITES = 100_000_000L;
    private static final long BETWEEN_LINES = 5_000_000_000L;
    private static final int WIDTH = 78;

    private final PrintWriter err;
    private final boolean terminal;
    private final boolean quiet;
    private final BooleanSupplier cancelled;
    private final Set<String> told = new HashSet<>();
    private String stage = "";
    private long written;
    private boolean open;

    ConsoleProgress(CommandContext context, boolean quiet) {
        err = context.err();
        terminal = context.terminal();
        cancelled = context.cancelled();
        this.quiet = quiet;
    }

    @Override
    public synchronized void report(String newStage, double fraction) {
        if (quiet) {
            return;
        }
        boolean changed = !newStage.equals(stage);
        stage = newStage;
        if (terminal) {
            rewrite(fraction, changed);
        } else if (changed) {
            line();
        }
    }

    /** Stages that differ in their counts alone are one stage. */
    private void line() {
        long now = System.nanoTime();
        if (told.add(stage.replaceAll("\\d+", "#")) || now - written > BETWEEN_LINES) {
            err.println(stage);
            err.flush();
            written = now;
        }
    }

    private void rewrite(double fraction, boolean changed) {
        long now = System.nanoTime();
        if (changed || now - written > BETWEEN_REWRITES) {
            String text = Double.isNaN(fraction) ? stage : stage + " " + Math.round(100 * fraction) + " %";
            err.print("\r" + pad(text));
            err.flush();
            written = now;
            open = true;
        }
    }

    private static String pad(String text) {
        return text.length() >= WIDTH ? text.substring(0, WIDTH) : text + " ".repeat(WIDTH - text.length());
    }

    @Override
    public boolean isCancelled() {
        return cancelled.getAsBoolean();
    }

    /** Clears the line that was rewritten. */
    @Override
    public synchronized void close() {
        if (open) {
            err.print("\r" + pad("") + "\r");
            err.flush();
            open = false;
        }
    }
}
