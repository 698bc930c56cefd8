package org.modewright.fem;

import java.util.ArrayList;
import java.util.List;

import org.modewright.fem.internal.FrameFormulation;
import org.modewright.fem.internal.SpringFormulation;

/** The element formulations that an assembly draws from; the last one that accepts an element makes its matrices. */
public final class ElementFormulations {

    private final List<ElementFormulation> formulations;

    private ElementFormulations(List<ElementFormulation> formulations) {
        this.formulations = List.copyOf(formulations);
    }

    /** Frame members, bars and springs. */
    public static ElementFormulations standard() {
        return new ElementFormulations(List.of(new FrameFormulation(), new SpringFormulation()));
    }

    /** These and one more, which goes before all others. */
    public ElementFormulations with(ElementFormulation formulation) {
        List<ElementFormulation> more = new ArrayList<>(formulations);
        more.add(formulation);
        return new ElementFormulations(more);
    }

    /**
     * The matrices of an element.
     *
     * @throws IllegalArgumentException if no formulation accepts the element
     */
    public ElementMatrices matrices(StructuralElement element, Snapshot snapshot) {
        for (int i = formulations.size() - 1; i >= 0; i--) {
            if (formulations.get(i).accepts(element)) {
                return formulations.get(i).matrices(element, snapshot);
            }
        }
        throw new IllegalArgumentException("There is no formulation for the " + element.kind().word() + " " + element.name()
                + ". Add one to the formulations that the assembly is given.");
    }
}
