package org.modewright.ui.canvas;

import org.eclipse.osgi.util.NLS;

/** Texts of the canvas and the mode shape view. */
final class Messages extends NLS {

    public static String Canvas_accessibleName;
    public static String Space_empty;
    public static String View_space;
    public static String View_front;
    public static String View_side;
    public static String View_plan;
    public static String View_fit;
    public static String View_labels;
    public static String View_sections;
    public static String View_nodes;
    public static String Shape_views;
    public static String Shape_noModel;
    public static String Shape_play;
    public static String Shape_pause;
    public static String Shape_stepBack;
    public static String Shape_stepForward;
    public static String Shape_previous;
    public static String Shape_next;
    public static String Shape_ghost;
    public static String Shape_colour;
    public static String Shape_colourNone;
    public static String Shape_colourStrain;
    public static String Shape_colourKinetic;
    public static String Shape_save;
    public static String Shape_fileName;
    public static String Shape_saveFilter;
    public static String Shape_saveFailed;
    public static String Shape_copy;
    public static String Shape_amplitude;
    public static String Shape_speed;
    public static String Shape_phase;
    public static String Shape_noMode;
    public static String Shape_noModes;
    public static String Shape_selectFirst;
    public static String Shape_sentence;
    public static String Shape_sentenceUnstable;
    public static String Shape_holds;
    public static String Shape_spin;
    public static String Facts_section;
    public static String Facts_material;
    public static String Facts_length;
    public static String Facts_group;
    public static String Facts_startFree;
    public static String Facts_endFree;
    public static String Facts_energy;
    public static String Legend_strain;
    public static String Legend_kinetic;

    static {
        NLS.initializeMessages("org.modewright.ui.canvas.messages", Messages.class);
    }

    private Messages() {
    }
}
