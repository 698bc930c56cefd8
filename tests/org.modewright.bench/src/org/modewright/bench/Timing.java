package org.modewright.bench;

import java.time.Duration;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Locale;
import java.util.concurrent.Callable;

/**
 * Seconds of one piece of work: its first run in this process, which compiles much of what it calls, and the median of the runs after.
 *
 * @param first     seconds of the first run
 * @param warm      seconds, median of the later runs
 * @param processor seconds of processor time of that median run, all threads; less than {@code warm} where other work took the processor
 */
record Timing(double first, double warm, double processor) {

    private static final int WARM_RUNS = 3;
    private static final double NANO = 1e-9;

    /** Runs the work once and three times more. */
    static Timing of(Callable<?> work) throws Exception {
        Run first = Run.of(work);
        Run[] later = new Run[WARM_RUNS];
        for (int run = 0; run < WARM_RUNS; run++) {
            later[run] = Run.of(work);
        }
        Arrays.sort(later, Comparator.comparingDouble(Run::elapsed));
        Run median = later[WARM_RUNS / 2];
        return new Timing(first.elapsed(), median.elapsed(), median.processor());
    }

    static String header(String title) {
        return String.format(Locale.ROOT, "  %-46s %11s %11s %11s", title, "first run", "warm", "processor");
    }

    String row(String what) {
        return String.format(Locale.ROOT, "    %-44s %9.3f s %9.3f s %9.2f s", what, first, warm, processor);
    }

    /** How many times longer this takes, warm. */
    double ratioTo(Timing other) {
        return warm / other.warm;
    }

    private record Run(double elapsed, double processor) {

        static Run of(Callable<?> work) throws Exception {
            Duration used = used();
            long start = System.nanoTime();
            work.call();
            double elapsed = (System.nanoTime() - start) * NANO;
            return new Run(elapsed, used().minus(used).toNanos() * NANO);
        }

        private static Duration used() {
            return ProcessHandle.current().info().totalCpuDuration().orElse(Duration.ZERO);
        }
    }
}
