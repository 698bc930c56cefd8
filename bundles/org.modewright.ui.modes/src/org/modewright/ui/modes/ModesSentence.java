package org.modewright.ui.modes;

import org.eclipse.osgi.util.NLS;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.ui.widgets.Numbers;

/** Which modes there are, in one sentence: "60 modes, 0.05 s to 1.42 s; 9 carry 95.0 % of X; 31 local". */
public final class ModesSentence {

    private static final double CARRIED = 0.95;

    private ModesSentence() {
    }

    public static String of(ModalResult result) {
        if (result.modes().isEmpty()) {
            return Messages.Modes_sentenceNone;
        }
        String count = Numbers.counted(result.modes().size(), "mode", "modes");
        String local = local(result);
        String incomplete = result.certificate().complete() ? "" : NLS.bind(Messages.Modes_incomplete, result.certificate().line());
        double shortest = period(result, result.modes().size() - 1);
        if (Double.isInfinite(shortest)) {
            return NLS.bind(Messages.Modes_sentenceRigid, new Object[] {count, carried(result), local, incomplete});
        }
        return NLS.bind(Messages.Modes_sentence,
                new Object[] {count, Numbers.period(longest(result)), Numbers.period(shortest), carried(result), local, incomplete});
    }

    private static double period(ModalResult result, int mode) {
        return result.modes().get(mode).period();
    }

    private static double longest(ModalResult result) {
        return result.modes().stream().mapToDouble(Mode::period).filter(Double::isFinite).max().orElse(Double.POSITIVE_INFINITY);
    }

    private static String local(ModalResult result) {
        long local = result.modes().stream().filter(Mode::isLocal).count();
        return local == 0 ? "" : NLS.bind(Messages.Modes_local, Numbers.count(local));
    }

    /** The one of X and Y of which less is captured; null where nothing moves in either. */
    private static Direction weaker(ModalResult result) {
        if (!result.hasMass(Direction.X)) {
            return result.hasMass(Direction.Y) ? Direction.Y : null;
        }
        return result.hasMass(Direction.Y) && result.capture(Direction.Y) < result.capture(Direction.X) ? Direction.Y : Direction.X;
    }

    /** How many modes, the largest first, it takes to carry most of the weaker captured of X and Y. */
    private static String carried(ModalResult result) {
        Direction direction = weaker(result);
        if (direction == null) {
            return "";
        }
        double[] shares = result.modes().stream().mapToDouble(mode -> mode.effectiveMassShare(direction)).sorted().toArray();
        double sum = 0;
        for (int i = shares.length - 1; i >= 0; i--) {
            sum += shares[i];
            if (sum >= CARRIED) {
                int count = shares.length - i;
                return NLS.bind(count == 1 ? Messages.Modes_carryOne : Messages.Modes_carry,
                        new Object[] {Numbers.count(count), Numbers.percent(CARRIED), direction.name()});
            }
        }
        return NLS.bind(shares.length == 1 ? Messages.Modes_carryAllOne : Messages.Modes_carryAll, Numbers.percent(sum), direction.name());
    }
}
