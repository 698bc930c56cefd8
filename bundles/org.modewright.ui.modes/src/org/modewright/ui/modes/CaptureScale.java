package org.modewright.ui.modes;

import org.modewright.modal.ModalResult;

/** Where a mode stands along the axis of the staircase: by its number or by its period on a logarithmic scale, long periods first. */
public final class CaptureScale {

    private final ModalResult result;
    private final boolean byPeriod;
    private final double longest;
    private final double shortest;

    public CaptureScale(ModalResult result, boolean byPeriod) {
        this.result = result;
        double[] periods = result.modes().stream().mapToDouble(mode -> mode.period()).filter(Double::isFinite).toArray();
        longest = periods.length == 0 ? 1 : java.util.Arrays.stream(periods).max().getAsDouble();
        shortest = periods.length == 0 ? 1 : java.util.Arrays.stream(periods).min().getAsDouble();
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
}
