package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.eclipse.osgi.util.NLS;
import org.modewright.modal.Direction;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.ModeShare;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.ui.widgets.Numbers;

/** What the table of modes shows of a result: running sums and the small signs of local and close modes, worked out once. */
public final class ModeRows {

    /** Frequencies within ten percent correlate in the common combination rules (common practice, no source). */
    public static final double CLOSE = 0.10;

    private static final String LOCAL_SIGN = "\u25c7";
    private static final String CLOSE_SIGN = "\u2248";
    private static final String HOLDS_SIGN = "\u25cf";
    private static final String UNSTABLE_SIGN = "!";

    private final ModalResult result;
    private final Map<Direction, double[]> running = new EnumMap<>(Direction.class);
    private final Map<Integer, ModeShare> holding = new HashMap<>();

    public ModeRows(ModalResult result) {
        this.result = result;
        for (Direction direction : Direction.values()) {
            running.put(direction, result.running(direction));
        }
    }

    public ModalResult result() {
        return result;
    }

    public int count() {
        return result.modes().size();
    }

    public Mode mode(int mode) {
        return result.modes().get(mode);
    }

    public double running(Direction direction, int mode) {
        return running.get(direction)[mode];
    }

    public boolean hasMass(Direction direction) {
        return result.hasMass(direction);
    }

    /** Marks the modes in which the selected elements hold at least a share of the energy. */
    public void mark(Set<String> elementIds, double share) {
        holding.clear();
        if (!elementIds.isEmpty()) {
            new Dominance(result).modesOf(elementIds, share).forEach(row -> holding.put(row.mode(), row));
        }
    }

    /** The index of the neighbour that is within {@link #CLOSE} and nearest; -1 if there is none. */
    public int closeTo(int mode) {
        double below = gap(mode - 1, mode);
        double above = gap(mode, mode + 1);
        if (Math.min(below, above) > CLOSE) {
            return -1;
        }
        return below <= above ? mode - 1 : mode + 1;
    }

    /** Relative distance of two neighbouring frequencies; infinite where one is missing or without frequency. */
    private double gap(int lower, int upper) {
        if (lower < 0 || upper >= count() || mode(lower).frequency() <= 0) {
            return Double.POSITIVE_INFINITY;
        }
        return mode(upper).frequency() / mode(lower).frequency() - 1;
    }

    public String signs(int mode) {
        StringBuilder signs = new StringBuilder();
        append(signs, holding.containsKey(mode), HOLDS_SIGN);
        append(signs, mode(mode).isUnstable(), UNSTABLE_SIGN);
        append(signs, mode(mode).isLocal(), LOCAL_SIGN);
        append(signs, closeTo(mode) >= 0, CLOSE_SIGN);
        return signs.isEmpty() ? "" : signs.append(' ').toString();
    }

    private static void append(StringBuilder signs, boolean holds, String sign) {
        if (holds) {
            signs.append(sign);
        }
    }

    /** Why a mode carries its signs, a line each; empty where it carries none. */
    public String reasons(int mode) {
        List<String> lines = new ArrayList<>();
        if (mode(mode).isUnstable()) {
            lines.add(NLS.bind(Messages.Modes_unstableTip, mode(mode).character().text()));
        }
        if (mode(mode).isLocal()) {
            lines.add(NLS.bind(Messages.Modes_localTip, mode(mode).character().text()));
        }
        int neighbour = closeTo(mode);
        if (neighbour >= 0) {
            double gap = gap(Math.min(mode, neighbour), Math.max(mode, neighbour));
            lines.add(NLS.bind(Messages.Modes_closeTip, mode(neighbour).number(), Numbers.percentNumber(gap)));
        }
        ModeShare share = holding.get(mode);
        if (share != null) {
            lines.add(NLS.bind(Messages.Modes_holdsTip, Numbers.percent(share.strain()), Numbers.percent(share.kinetic())));
        }
        return String.join("\n", lines);
    }
}
