package org.modewright.modal;

import org.modewright.fem.Snapshot;
import org.modewright.numerics.Progress;
import org.modewright.testmodels.NamedStructure;

/** Builds small structures for tests, in N, m and kg, and runs their modes. */
final class Structures extends NamedStructure<Structures> {

    Structures(String name) {
        super(name);
    }

    /** A chain of masses (kg) on springs (N/m) along X from the ground, the nodes one above the other; nothing else can move. */
    static Structures chain(double[] masses, double[] stiffnesses) {
        return new Structures("chain").storeys(masses, stiffnesses);
    }

    @Override
    protected Structures self() {
        return this;
    }

    Snapshot snapshot() {
        return Snapshot.of(model());
    }

    ModalResult allModes() {
        return ModalRun.run(snapshot(), ModalRequest.ofAllModes(), Progress.NONE);
    }

    ModalResult modes(int count) {
        return ModalRun.run(snapshot(), ModalRequest.ofModes(count), Progress.NONE);
    }
}
