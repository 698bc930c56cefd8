package org.modewright.bench;

import java.time.Duration;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Locale;
import java.util.concurrent.Callable;

/**
 * Seconds of one piece of work: its first run in this process, which compiles much of what it calls, and the median of the runs after.
 * Short work is repeated within a run, because processor time is told in steps of ten milliseconds.
 *
 * @param first     seconds of the first run
 * @param warm      seconds, median of the later runs
 * @param processor seconds of processor time of that median run, all threads; less than {@code warm} where other work took the processor
 */
record Timing(double first, double warm, double processor) {

    private static final int WARM_RUNS = 3;
    private static final double NANO = 1e-9;
    private static final double SHORTEST_RUN = 0.3;
    private static final int MOST_REPETITIONS = 50;

    /** Runs the work once, once more to see how long it takes, and three times to measure. */
    static Timing of(Callable<?> work) throws Exception {
        Run first = Run.of(work, 1);
        int repetitions = (int) Math.min(MOST_REPETITIONS, Math.ceil(SHORTEST_RUN / Run.of(work, 1).elapsed()));
        Run[] later = new Run[WARM_RUNS];
        for (int run = 0; run < WARM_RUNS; run++) {
            later[run] = Run.of(work, repetitions);
        }
        Arrays.sort(later, Comparator.comparingDouble(Run::elapsed));
        Run median = later[WARM_RUNS / 2];
        return new Timing(first.elapsed(), median.elapsed(), median.processor());
    }

    static String header(String title) {
        return String.format(Locale.ROOT, "  %-46s %11s %11s %11s", title, "first run", "warm", "processor");
    }

    String row(String what) {
        return String.format(Locale.ROOT, "    %-44s %9.3f s %9.3f s %9.3f s", what, first, warm, processor);
    }

    /** How many times more processor time this takes, warm; other work on the machine disturbs that less than the elapsed time. */
    double ratioTo(Timing other) {
        return processor / other.processor;
    }

    private record Run(double elapsed, double processor) {

        static Run of(Callable<?> work, int repetitions) throws Exception {
            Duration used = used();
            long start = System.nanoTime();
            for (int i = 0; i < repetitions; i++) {
                work.call();
            }
            double elapsed = (System.nanoTime() - start) * NANO;
            return new Run(elapsed / repetitions, used().minus(used).toNanos() * NANO / repetitions);
        }

        private static Duration used() {
            return ProcessHandle.current().info().totalCpuDuration().orElse(Duration.ZERO);
        }
    }
}
