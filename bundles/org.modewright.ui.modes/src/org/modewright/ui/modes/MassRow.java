package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.osgi.util.NLS;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.modal.Direction;
import org.modewright.modal.ModalResult;
import org.modewright.ui.widgets.Numbers;

/**
 * A row of the ledger of masses.
 *
 * @param label what the mass is
 * @param kilograms mass in X, Y and Z, kg; NaN where there is none to speak of
 * @param isTotal whether it is a total; the rows that follow a total say what it is made of
 */
public record MassRow(String label, double[] kilograms, boolean isTotal) {

    private static final Direction[] AXES = {Direction.X, Direction.Y, Direction.Z};

    /** What can move, by source; what of it the modes hold and what they miss; and, apart from it, what sits on supports. */
    public static List<MassRow> of(ModalResult result) {
        MassLedger ledger = result.mass();
        List<MassRow> rows = new ArrayList<>();
        rows.add(new MassRow(Messages.Mass_movable, ledger.movable(), true));
        for (MassSource source : ledger.sources()) {
            rows.add(new MassRow(source.name(), source.movable(), false));
        }
        double[] captured = captured(result);
        rows.add(new MassRow(NLS.bind(Messages.Mass_captured, Numbers.counted(result.modes().size(), Messages.Mass_mode,
                Messages.Mass_modes)),
                captured, true));
        rows.add(new MassRow(Messages.Mass_missing, missing(ledger.movable(), captured), true));
        rows.add(new MassRow(Messages.Mass_onSupports, ledger.onSupports(), true));
        for (MassSource source : ledger.sources()) {
            rows.add(new MassRow(source.name(), source.onSupports(), false));
        }
        return rows;
    }

    private static double[] captured(ModalResult result) {
        double[] captured = new double[AXES.length];
        for (int axis = 0; axis < AXES.length; axis++) {
            captured[axis] = result.hasMass(AXES[axis]) ? result.capture(AXES[axis]) * result.mass().movable()[axis] : Double.NaN;
        }
        return captured;
    }

    private static double[] missing(double[] movable, double[] captured) {
        double[] missing = new double[AXES.length];
        for (int axis = 0; axis < AXES.length; axis++) {
            missing[axis] = Double.isNaN(captured[axis]) ? Double.NaN : Math.max(0, movable[axis] - captured[axis]);
        }
        return missing;
    }
}
