package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.modewright.modal.ModalResult;
import org.modewright.ui.widgets.Numbers;

/** Where a mode stands along the axis of the staircase: by its number or by its period on a logarithmic scale, long periods first. */
public final class CaptureScale {

    private static final int MOST_TICKS = 12;

    /**
     * A place along the axis with what is written there.
     *
     * @param position 0 to 1
     * @param text a number or a period in seconds
     */
    public record Tick(double position, String text) {
    }

    private final ModalResult result;
    private final boolean byPeriod;
    private final double longest;
    private final double shortest;

    public CaptureScale(ModalResult result, boolean byPeriod) {
        this.result = result;
        double[] periods = result.modes().stream().mapToDouble(mode -> mode.period()).filter(Double::isFinite).toArray();
        longest = periods.length == 0 ? 1 : Arrays.stream(periods).max().getAsDouble();
        shortest = periods.length == 0 ? 1 : Arrays.stream(periods).min().getAsDouble();
        this.byPeriod = byPeriod && shortest < longest;
    }

    public boolean isByPeriod() {
        return byPeriod;
    }

    public double longest() {
        return longest;
    }

    public double shortest() {
        return shortest;
    }

    /** Position of a mode along the axis, 0 to 1; in order of the modes. */
    public double position(int mode) {
        int count = result.modes().size();
        if (!byPeriod) {
            return (mode + 1.0) / count;
        }
        double period = result.modes().get(mode).period();
        return Double.isInfinite(period) ? 0 : positionOf(period);
    }

    /** Position of a period along the axis; a little room is left before the longest, so that its step is seen. */
    public double positionOf(double period) {
        double span = Math.log(longest / shortest);
        return 0.04 + 0.96 * Math.log(longest / period) / span;
    }

    /** The mode whose position is nearest. */
    public int nearest(double position) {
        int best = 0;
        for (int mode = 1; mode < result.modes().size(); mode++) {
            if (Math.abs(position(mode) - position) < Math.abs(position(best) - position)) {
                best = mode;
            }
        }
        return best;
    }

    /** What stands along the axis: a few round numbers or periods, in order. */
    public List<Tick> ticks() {
        return byPeriod ? periodTicks() : numberTicks();
    }

    private List<Tick> numberTicks() {
        int count = result.modes().size();
        int step = roundStep(count);
        List<Tick> ticks = new ArrayList<>();
        for (int number = step; number <= count; number += step) {
            ticks.add(new Tick(position(number - 1), Integer.toString(number)));
        }
        return ticks;
    }

    private static int roundStep(int count) {
        for (int step : new int[] {1, 2, 5, 10, 20, 50, 100}) {
            if (count / step <= MOST_TICKS) {
                return step;
            }
        }
        return 200;
    }

    private List<Tick> periodTicks() {
        List<Tick> ticks = new ArrayList<>();
        for (int power = 3; power >= -5; power--) {
            for (int lead : new int[] {5, 2, 1}) {
                double period = lead * Math.pow(10, power);
                if (period <= longest && period >= shortest) {
                    ticks.add(new Tick(positionOf(period), Numbers.significant(period, 1)));
                }
            }
        }
        return ticks;
    }
}
