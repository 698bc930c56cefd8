package org.modewright.ui.editor.fields;

import org.eclipse.osgi.util.NLS;

/** Texts of the fields. */
final class FieldMessages extends NLS {

    static String noSuchObject;
    static String notANumber;
    static String notFinite;
    static String notWhole;
    static String notAChoice;
    static String notAComponent;
    static String componentsHint;
    static String vectorHint;
    static String nodesHint;
    static String termsHint;
    static String couplingsHint;
    static String notAVector;
    static String notATerm;
    static String notACoupling;
    static String missing;
    static String none;

    static {
        NLS.initializeMessages("org.modewright.ui.editor.fields.messages", FieldMessages.class);
    }

    private FieldMessages() {
    }
}
