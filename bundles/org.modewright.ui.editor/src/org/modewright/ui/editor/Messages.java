package org.modewright.ui.editor;

import org.eclipse.osgi.util.NLS;

/** Texts of the structure editor. */
public final class Messages extends NLS {

    public static String Page_space;
    public static String Page_tables;
    public static String Page_loads;
    public static String Page_analysis;
    public static String Error_noFile;
    public static String Error_reload;
    public static String Save_failed;
    public static String Undo;
    public static String Redo;
    public static String Undo_plain;
    public static String Redo_plain;
    public static String Delete;
    public static String Delete_title;
    public static String Delete_question;
    public static String Delete_more;
    public static String Rename;
    public static String SelectAll;
    public static String Copy;
    public static String Changed_title;
    public static String Changed_question;
    public static String Changed_reload;
    public static String Changed_keep;
    public static String Form_many;
    public static String Form_mixed;
    public static String Form_kinds;
    public static String Form_different;
    public static String Checks_none;
    public static String Checks_first;
    public static String Tables_filter;
    public static String Tables_add;
    public static String Tables_duplicate;
    public static String Tables_delete;
    public static String Tables_copy;
    public static String Tables_paste;
    public static String Tables_pasted;
    public static String Tables_pasteFault;
    public static String Tables_empty;
    public static String Tables_noMatch;
    public static String Loads_patterns;
    public static String Loads_loads;
    public static String Loads_noPattern;
    public static String Loads_addPattern;
    public static String Loads_addNodeLoad;
    public static String Loads_addMemberLoad;
    public static String Loads_massTitle;
    public static String Loads_source;
    public static String Loads_total;
    public static String Loads_notComputable;
    public static String Loads_working;
    public static String Loads_delete;
    public static String Analysis_structure;
    public static String Analysis_solve;
    public static String Analysis_judge;
    public static String Analysis_unknownPack;
    public static String Units_title;
    public static String Units_question;
    public static String Units_convert;
    public static String Units_keep;
    public static String Act_coordinates;
    public static String Act_coordinatesPrompt;
    public static String Act_offset;
    public static String Act_offsetPrompt;
    public static String Act_group;
    public static String Act_groupPrompt;
    public static String Act_noGroup;
    public static String Act_needsTwoNodes;
    public static String Act_needsNodes;
    public static String Act_needsMemberAndNode;
    public static String Act_needsElements;
    public static String Act_needsSection;
    public static String Act_refused;
    public static String Act_triple;
    public static String Act_supportedAlready;
    public static String Act_needsSomething;
    public static String Cut;
    public static String Paste;
    public static String Changed_overwriteQuestion;
    public static String Changed_overwrite;
    public static String Gone_title;
    public static String Gone_question;
    public static String Gone_keep;
    public static String Gone_close;
    public static String Fold_open;
    public static String Fold_close;
    public static String Form_nothingInSpace;
    public static String Form_nothingInTable;
    public static String Form_nothingInLoads;
    public static String Checks_working;
    public static String Tables_kinds;
    public static String Loads_deletePattern;
    public static String Loads_atNode;
    public static String Loads_onMember;
    public static String Loads_massHelp;
    public static String Analysis_directions;
    public static String Find;
    public static String Error_page;
    public static String Error_file;
    public static String Error_place;

    static {
        NLS.initializeMessages("org.modewright.ui.editor.messages", Messages.class);
    }

    private Messages() {
    }
}
