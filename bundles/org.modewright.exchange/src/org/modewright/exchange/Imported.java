package org.modewright.exchange;

import java.util.List;

import org.modewright.model.structure.StructuralModel;

/**
 * A structure read from a file.
 *
 * @param model the structure
 * @param warnings what the file holds that was not understood, each in a sentence
 */
public record Imported(StructuralModel model, List<String> warnings) {

    /** Keeps a copy of the warnings. */
    public Imported {
        warnings = List.copyOf(warnings);
    }
}
