package org.modewright.ui.modes;

import org.eclipse.osgi.util.NLS;

/** Texts of the views. */
final class Messages extends NLS {

    static String Column_number;
    static String Column_period;
    static String Column_frequency;
    static String Column_mass;
    static String Column_massTip;
    static String Column_running;
    static String Column_runningTip;
    static String Column_rotary;
    static String Column_rotaryTip;
    static String Column_spread;
    static String Column_spreadTip;
    static String Column_character;
    static String Column_residual;
    static String Column_residualTip;
    static String Column_errorBound;
    static String Column_errorBoundTip;
    static String Filter_show;
    static String Filter_all;
    static String Filter_local;
    static String Filter_notLocal;
    static String Filter_atLeast;
    static String Filter_anyDirection;
    static String Filter_in;
    static String Filter_none;
    static String Modes_columns;
    static String Modes_copy;
    static String Modes_copyAll;
    static String Modes_selectAll;
    static String Modes_localTip;
    static String Modes_closeTip;
    static String Modes_holdsTip;
    static String Modes_unstableTip;
    static String Modes_legend;
    static String Modes_sentence;
    static String Modes_sentenceRigid;
    static String Modes_sentenceNone;
    static String Modes_carry;
    static String Modes_carryAll;
    static String Modes_local;
    static String Modes_incomplete;
    static String Capture_overNumber;
    static String Capture_overPeriod;
    static String Capture_axisNumber;
    static String Capture_axisPeriod;
    static String Capture_axisMass;
    static String Capture_required;
    static String Capture_mode;
    static String Capture_tip;
    static String Capture_captured;
    static String Capture_missing;
    static String Capture_source;
    static String Capture_movable;
    static String Capture_onSupports;
    static String Capture_total;
    static String Capture_share;
    static String Capture_notJudged;
    static String Capture_noModes;
    static String Dominance_by;
    static String Dominance_ELEMENT;
    static String Dominance_GROUP;
    static String Dominance_LEVEL;
    static String Dominance_SECTION;
    static String Dominance_MATERIAL;
    static String Dominance_strain;
    static String Dominance_kinetic;
    static String Dominance_strainTip;
    static String Dominance_kineticTip;
    static String Dominance_none;
    static String Dominance_running;
    static String Dominance_runningTip;
    static String Dominance_noMode;
    static String Dominance_selectFirst;
    static String Dominance_strainSentence;
    static String Dominance_kineticSentence;
    static String Dominance_rigidSentence;
    static String Dominance_ofGroup;
    static String Dominance_onLevel;
    static String Dominance_onLevels;
    static String Dominance_many;
    static String Dominance_modesOf;
    static String Dominance_modesOfNothing;
    static String Dominance_modesOfNone;
    static String Dominance_atLeast;
    static String Dominance_tabRanking;
    static String Dominance_tabModes;

    static {
        NLS.initializeMessages("org.modewright.ui.modes.messages", Messages.class);
    }

    private Messages() {
    }
}
