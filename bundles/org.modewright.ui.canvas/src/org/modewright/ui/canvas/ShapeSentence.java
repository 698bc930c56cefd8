package org.modewright.ui.canvas;

import org.eclipse.osgi.util.NLS;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.ui.widgets.Numbers;

/** What a mode does, in one sentence: "Mode 3, 0.412 s: torsion, 71.0 % of the rotary inertia about Z". */
final class ShapeSentence {

    private static final double WORTH_SAYING = 0.01;

    private ShapeSentence() {
    }

    static String of(ModalResult result, int index) {
        Mode mode = result.modes().get(index);
        if (mode.isUnstable()) {
            return NLS.bind(Messages.Shape_sentenceUnstable, mode.number(), mode.character().text());
        }
        return NLS.bind(Messages.Shape_sentence,
                new Object[] {mode.number(), Numbers.period(mode.period()), mode.character().text(), largest(result, mode)});
    }

    private static String largest(ModalResult result, Mode mode) {
        Direction best = Direction.X;
        for (Direction direction : new Direction[] {Direction.Y, Direction.Z, Direction.RZ}) {
            if (mode.effectiveMassShare(direction) > mode.effectiveMassShare(best)) {
                best = direction;
            }
        }
        double share = mode.effectiveMassShare(best);
        if (share < WORTH_SAYING || !result.hasMass(best)) {
            return "";
        }
        return best.isTranslation() ? NLS.bind(Messages.Shape_holds, Numbers.percent(share), best.name())
                : NLS.bind(Messages.Shape_spin, Numbers.percent(share), best.name().substring(1));
    }
}
