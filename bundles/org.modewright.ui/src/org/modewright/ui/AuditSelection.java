package org.modewright.ui;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.Share;
import org.modewright.modal.ModalResult;

/**
 * What is selected in an audit session: a mode, elements of the model, or both. All views and the editor of one window share it.
 *
 * @param mode index of the selected mode in the result's list of modes, from 0; -1: none
 * @param elementIds model ids of the selected objects (members, nodes, springs, floors, ...); never null
 */
public record AuditSelection(int mode, Set<String> elementIds) {

    private static final double DOMINATING = 0.8;
    private static final int MOST = 20;

    /** Nothing selected. */
    public static final AuditSelection NONE = new AuditSelection(-1, Set.of());

    public AuditSelection {
        elementIds = Set.copyOf(elementIds);
        if (mode < -1) {
            throw new IllegalArgumentException("The index of a mode is -1 (none) or more, not " + mode + ".");
        }
    }

    /**
     * A mode with the elements that dominate it: those that together hold most of its strain energy, or of its kinetic energy where
     * it has no strain energy.
     *
     * @param result the run
     * @param mode index of the mode in the result's list, from 0
     */
    public static AuditSelection ofMode(ModalResult result, int mode) {
        Dominance dominance = new Dominance(result);
        List<Share> leading = dominance.leading(mode, Energy.STRAIN, DOMINATING, MOST);
        if (leading.isEmpty()) {
            leading = dominance.leading(mode, Energy.KINETIC, DOMINATING, MOST);
        }
        return new AuditSelection(mode, leading.stream().map(Share::elementId).collect(Collectors.toSet()));
    }

    /** Whether a mode is selected. */
    public boolean hasMode() {
        return mode >= 0;
    }

    /** The same elements with another mode. */
    public AuditSelection withMode(int other) {
        return new AuditSelection(other, elementIds);
    }

    /** The same mode with other elements. */
    public AuditSelection withElements(Set<String> others) {
        return new AuditSelection(mode, others);
    }
}
