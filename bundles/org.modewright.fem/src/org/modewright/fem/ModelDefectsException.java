package org.modewright.fem;

import java.util.List;

import org.modewright.model.Defect;

/** Thrown when a model has defects that keep it from being computed. */
public final class ModelDefectsException extends RuntimeException {

    private static final long serialVersionUID = 1L;
    private static final int LISTED = 3;

    private final transient List<Defect> defects;

    /**
     * Reports defects.
     *
     * @param defects the defects of severity error, at least one
     */
    public ModelDefectsException(List<Defect> defects) {
        super(message(defects));
        this.defects = List.copyOf(defects);
    }

    /** The defects of severity error. */
    public List<Defect> defects() {
        return defects;
    }

    private static String message(List<Defect> defects) {
        StringBuilder text = new StringBuilder("The model cannot be computed:");
        for (Defect defect : defects.subList(0, Math.min(LISTED, defects.size()))) {
            text.append(' ').append(defect.text()).append(' ').append(defect.remedy());
        }
        if (defects.size() > LISTED) {
            text.append(" And ").append(defects.size() - LISTED).append(" more.");
        }
        return text.toString();
    }
}
