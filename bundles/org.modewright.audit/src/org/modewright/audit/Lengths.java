package org.modewright.audit;

import org.modewright.fem.Snapshot;
import org.modewright.modal.Figures;
import org.modewright.model.Quantity;
import org.modewright.model.Units;

/** Lengths in sentences, in the model's own unit. */
public final class Lengths {

    private final Units units;

    /** In the unit of a model. */
    public Lengths(Snapshot snapshot) {
        units = Units.of(snapshot.units());
    }

    /** A length given in m, as "4.00 mm" where mm is the model's unit. */
    public String of(double metres) {
        return Figures.significant(metres / units.toSi(Quantity.LENGTH), 3) + " " + units.symbol(Quantity.LENGTH);
    }
}
