package org.modewright.ui.editor.fields;

import org.eclipse.osgi.util.NLS;

/** Texts of the fields. */
final class FieldMessages extends NLS {

    public static String noSuchObject;
    public static String notANumber;
    public static String notFinite;
    public static String notWhole;
    public static String notAChoice;
    public static String notAComponent;
    public static String componentsHint;
    public static String vectorHint;
    public static String nodesHint;
    public static String termsHint;
    public static String couplingsHint;
    public static String notAVector;
    public static String notATerm;
    public static String notACoupling;
    public static String missing;
    public static String none;
    public static String setLabel;
    public static String loadKind;
    public static String loadKindHelp;
    public static String loadAtNode;
    public static String loadOnMember;
    public static String loadTarget;
    public static String loadTargetHelp;
    public static String loadValue;
    public static String loadValueHelp;
    public static String loadUnit;

    static {
        NLS.initializeMessages("org.modewright.ui.editor.fields.messages", FieldMessages.class);
    }

    private FieldMessages() {
    }
}
