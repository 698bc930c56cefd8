package org.modewright.rcp;

import org.eclipse.osgi.util.NLS;

/** Texts of the application. */
final class Messages extends NLS {

    public static String Application_inUse;
    public static String Application_title;
    public static String Application_unusable;
    public static String Menu_edit;
    public static String Menu_file;
    public static String Menu_help;
    public static String Menu_keys;
    public static String Menu_view;

    static {
        NLS.initializeMessages("org.modewright.rcp.messages", Messages.class);
    }

    private Messages() {
    }
}
