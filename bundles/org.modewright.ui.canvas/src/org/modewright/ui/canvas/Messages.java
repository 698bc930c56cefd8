package org.modewright.ui.canvas;

import org.eclipse.osgi.util.NLS;

/** Texts of the canvas and the mode shape view. */
final class Messages extends NLS {

    static String Canvas_accessibleName;
    static String Space_empty;
    static String View_space;
    static String View_front;
    static String View_side;
    static String View_plan;
    static String View_fit;
    static String View_labels;
    static String View_sections;
    static String View_nodes;
    static String Shape_views;
    static String Shape_play;
    static String Shape_pause;
    static String Shape_stepBack;
    static String Shape_stepForward;
    static String Shape_previous;
    static String Shape_next;
    static String Shape_ghost;
    static String Shape_colour;
    static String Shape_colourNone;
    static String Shape_colourStrain;
    static String Shape_colourKinetic;
    static String Shape_save;
    static String Shape_saveFilter;
    static String Shape_saveFailed;
    static String Shape_copy;
    static String Shape_amplitude;
    static String Shape_speed;
    static String Shape_phase;
    static String Shape_noMode;
    static String Shape_noModes;
    static String Shape_selectFirst;
    static String Shape_sentence;
    static String Shape_sentenceUnstable;
    static String Shape_holds;
    static String Shape_spin;
    static String Legend_strain;
    static String Legend_kinetic;

    static {
        NLS.initializeMessages("org.modewright.ui.canvas.messages", Messages.class);
    }

    private Messages() {
    }
}
