package org.modewright.ui.modes;

import org.eclipse.osgi.util.NLS;

/** Texts of the views. */
final class Messages extends NLS {

    public static String Column_number;
    public static String Column_period;
    public static String Column_frequency;
    public static String Column_mass;
    public static String Column_massTip;
    public static String Column_running;
    public static String Column_runningTip;
    public static String Column_rotary;
    public static String Column_rotaryTip;
    public static String Column_spread;
    public static String Column_spreadTip;
    public static String Column_character;
    public static String Column_residual;
    public static String Column_residualTip;
    public static String Column_errorBound;
    public static String Column_errorBoundTip;
    public static String Filter_show;
    public static String Filter_all;
    public static String Filter_local;
    public static String Filter_notLocal;
    public static String Filter_atLeast;
    public static String Filter_anyDirection;
    public static String Filter_in;
    public static String Filter_none;
    public static String Modes_columns;
    public static String Modes_copy;
    public static String Modes_copyAll;
    public static String Modes_selectAll;
    public static String Modes_localTip;
    public static String Modes_closeTip;
    public static String Modes_holdsTip;
    public static String Modes_unstableTip;
    public static String Modes_legend;
    public static String Modes_sentence;
    public static String Modes_sentenceRigid;
    public static String Modes_sentenceNone;
    public static String Modes_carry;
    public static String Modes_carryOne;
    public static String Modes_carryAllOne;
    public static String Modes_carryAll;
    public static String Modes_local;
    public static String Modes_incomplete;
    public static String Capture_accessibleName;
    public static String Capture_overNumber;
    public static String Capture_overPeriod;
    public static String Capture_axisNumber;
    public static String Capture_axisPeriod;
    public static String Capture_axisMass;
    public static String Capture_required;
    public static String Capture_mode;
    public static String Capture_tip;
    public static String Capture_source;
    public static String Capture_noModes;
    public static String Dominance_ELEMENT;
    public static String Dominance_GROUP;
    public static String Dominance_LEVEL;
    public static String Dominance_SECTION;
    public static String Dominance_MATERIAL;
    public static String Dominance_strain;
    public static String Dominance_kinetic;
    public static String Dominance_strainTip;
    public static String Dominance_kineticTip;
    public static String Dominance_none;
    public static String Dominance_running;
    public static String Dominance_runningTip;
    public static String Dominance_noMode;
    public static String Dominance_selectFirst;
    public static String Dominance_strainSentence;
    public static String Dominance_kineticSentence;
    public static String Dominance_rigidSentence;
    public static String Dominance_ofGroup;
    public static String Dominance_onLevel;
    public static String Dominance_onLevels;
    public static String Dominance_many;
    public static String Dominance_modesOf;
    public static String Dominance_modesOfTogether;
    public static String Dominance_modesOfNoneTogether;
    public static String Dominance_onPlace;
    public static String Dominance_onPlaces;
    public static String Dominance_selected;
    public static String Dominance_selectedOne;
    public static String Dominance_selectedMany;
    public static String Dominance_modesOfNothing;
    public static String Dominance_modesOfNone;
    public static String Dominance_atLeast;
    public static String Dominance_tabRanking;
    public static String Dominance_tabModes;
    public static String Dominance_strainShort;
    public static String Dominance_kineticShort;
    public static String Dominance_rollUp;
    public static String Dominance_rollUpTip;
    public static String Capture_tabStaircase;
    public static String Capture_tabMasses;
    public static String Capture_enough;
    public static String Capture_short;
    public static String Capture_moreModes;
    public static String Capture_moreUnknown;
    public static String Capture_modeMore;
    public static String Capture_modesMore;
    public static String Mass_movable;
    public static String Mass_captured;
    public static String Mass_mode;
    public static String Mass_modes;
    public static String Mass_missing;
    public static String Mass_onSupports;
    public static String Filter_count;
    public static String Modes_legendTip;
    public static String Column_numberTip;
    public static String Column_periodTip;
    public static String Column_frequencyTip;
    public static String Column_characterTip;
    public static String Dominance_copy;
    public static String Dominance_ofEnergy;

    static {
        NLS.initializeMessages("org.modewright.ui.modes.messages", Messages.class);
    }

    private Messages() {
    }
}
