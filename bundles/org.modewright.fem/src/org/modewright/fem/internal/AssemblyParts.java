package org.modewright.fem.internal;

import java.util.List;

import org.modewright.fem.DroppedMotion;
import org.modewright.fem.ElementFormulations;
import org.modewright.fem.MassLedger;
import org.modewright.fem.Snapshot;
import org.modewright.numerics.Progress;

/**
 * What an assembly is made of.
 *
 * @param transformation from all unknowns to the components of nodes
 * @param kept the unknowns that have stiffness or mass, ascending
 * @param matrices stiffness and mass over the kept unknowns
 * @param store carriers with their matrices
 * @param rigid rigid-body vectors over all unknowns
 * @param ledger the mass
 * @param dropped the motions that were dropped
 */
public record AssemblyParts(Transformation transformation, int[] kept, MatrixPair matrices, CarrierStore store, RigidMotions rigid,
        MassLedger ledger, List<DroppedMotion> dropped) {

    /** Makes all parts. */
    public static AssemblyParts of(Snapshot snapshot, ElementFormulations formulations, Progress progress) {
        Transformation transformation = new ConstraintSet(snapshot).transformation(progress);
        NodalMasses nodalMasses = new NodalMasses(snapshot);
        CarrierStore store = new CarrierStore(snapshot, formulations, nodalMasses, progress);
        MatrixPair all = MatrixAssembler.assemble(store, transformation, progress);
        RigidMotions rigid = new RigidMotions(snapshot.nodes(), transformation, store, all.mass());
        MassLedger ledger = new LedgerBuilder(snapshot, store, nodalMasses, transformation, all.mass(), rigid).build();
        MotionDropping dropping = MotionDropping.of(store, transformation, progress);
        int[] kept = dropping.kept();
        MatrixPair matrices = dropping.dropped().isEmpty() ? all : all.restrictedTo(kept);
        return new AssemblyParts(transformation, kept, matrices, store, rigid, ledger, dropping.dropped());
    }
}
