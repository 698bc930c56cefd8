package org.modewright.ui.tests.editor;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.modewright.fem.Snapshot;
import org.modewright.modal.ModalRequest;
import org.modewright.modal.ModalRun;
import org.modewright.modal.Mode;
import org.modewright.model.edit.StructureEditAdapterFactory;
import org.modewright.model.edit.commands.StructureCommands;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.UnitSystem;
import org.modewright.numerics.Progress;

/** A structure has the same frequencies whatever units its numbers are in. */
class ConvertedFrequencyTest {

    /** Residuals of the eigenvalues are below 1e-10; the frequency is their root. */
    private static final double TOLERANCE = 1e-9;

    private static List<Double> frequencies(StructuralModel model) {
        ModalRequest sixModes = new ModalRequest(6, 0, null, 500, 1);
        return ModalRun.run(Snapshot.of(model), sixModes, Progress.NONE).modes().stream().map(Mode::frequency).toList();
    }

    @ParameterizedTest
    @EnumSource(UnitSystem.class)
    void theFrequenciesStay(UnitSystem system) {
        StructuralModel model = Frames.small();
        List<Double> before = frequencies(model);
        AdapterFactoryEditingDomain domain = new AdapterFactoryEditingDomain(new StructureEditAdapterFactory(), new BasicCommandStack());
        domain.getCommandStack().execute(new StructureCommands(domain, model).convertUnits(system));
        assertEquals(system, model.getUnits());
        List<Double> after = frequencies(model);
        assertEquals(before.size(), after.size());
        for (int mode = 0; mode < before.size(); mode++) {
            assertEquals(before.get(mode), after.get(mode), before.get(mode) * TOLERANCE, "mode " + (mode + 1));
        }
    }
}
