package org.modewright.ui.internal;

import org.eclipse.osgi.util.NLS;

/** Texts of the workbench's shared parts. */
public final class Messages extends NLS {

    public static String CertificateLine_none;
    public static String CertificateLine_running;
    public static String CertificateLine_stale;
    public static String Explorer_empty;
    public static String Explorer_incomplete;
    public static String Explorer_member;
    public static String Explorer_members;
    public static String Explorer_mode;
    public static String Explorer_modes;
    public static String Explorer_noResult;
    public static String Explorer_node;
    public static String Explorer_nodes;
    public static String Explorer_notPassed;
    public static String Explorer_passed;
    public static String Explorer_reading;
    public static String Explorer_size;
    public static String Explorer_unstable;
    public static String Export_description;
    public static String Export_failed;
    public static String Export_noFolder;
    public static String Export_noTarget;
    public static String Export_remarks;
    public static String Export_target;
    public static String Export_targetHint;
    public static String Export_title;
    public static String Export_writing;
    public static String Freshness_job;
    public static String Import_columnColumn;
    public static String Import_columnFile;
    public static String Import_columnRow;
    public static String Import_columnText;
    public static String Import_columnValue;
    public static String Import_description;
    public static String Import_empty;
    public static String Import_errors;
    public static String Import_faulty;
    public static String Import_file;
    public static String Import_folder;
    public static String Import_kind;
    public static String Import_noFile;
    public static String Import_noSource;
    public static String Import_noWarnings;
    public static String Import_number;
    public static String Import_oneError;
    public static String Import_project;
    public static String Import_reading;
    public static String Import_remarks;
    public static String Import_source;
    public static String Import_sourceHint;
    public static String Import_summary;
    public static String Import_title;
    public static String Import_zip;
    public static String ModelCreation_failed;
    public static String ModelCreation_task;
    public static String ModelReader_job;
    public static String NewProject_description;
    public static String NewProject_empty;
    public static String NewProject_name;
    public static String NewProject_sample;
    public static String NewProject_start;
    public static String NewProject_title;
    public static String NewProject_units;
    public static String Preferences_amplitude;
    public static String Preferences_amplitudeUnit;
    public static String Preferences_animation;
    public static String Preferences_appearance;
    public static String Preferences_browse;
    public static String Preferences_folder;
    public static String Preferences_noFolder;
    public static String Preferences_play;
    public static String Preferences_runOnSave;
    public static String Preferences_runs;
    public static String Preferences_speed;
    public static String Preferences_speedUnit;
    public static String Preferences_theme;
    public static String Preferences_threads;
    public static String Preferences_threadsNote;
    public static String ProjectNames_missing;
    public static String ProjectNames_taken;
    public static String SampleProject_failed;
    public static String SampleProject_name;
    public static String SentenceBar_stale;
    public static String SentenceBar_staleTip;
    public static String SessionPage_cancel;
    public static String SessionPage_noModel;
    public static String SessionPage_noResult;
    public static String SessionPage_openSample;
    public static String SessionPage_reading;
    public static String SessionPage_run;
    public static String SessionPage_running;
    public static String Session_notComputable;
    public static String Session_notOpened;
    public static String Session_programFault;
    public static String Session_runFailed;
    public static String StartPage_begin;
    public static String StartPage_caution;
    public static String StartPage_import;
    public static String StartPage_importText;
    public static String StartPage_kernel;
    public static String StartPage_new;
    public static String StartPage_newText;
    public static String StartPage_noRecent;
    public static String StartPage_product;
    public static String StartPage_purpose;
    public static String StartPage_recent;
    public static String StartPage_sample;
    public static String StartPage_sampleText;
    public static String StartPage_title;
    public static String Themes_dark;
    public static String Themes_light;

    static {
        NLS.initializeMessages("org.modewright.ui.internal.messages", Messages.class);
    }

    private Messages() {
    }
}
