package org.modewright.audit;

/** How grave a finding is. */
public enum Severity {
    /** The results cannot be used, or the audit does not pass. */
    ERROR("error"),
    /** Probably not what was meant. */
    WARNING("warning"),
    /** Worth knowing; a good model has some. */
    INFO("info");

    private final String word;

    Severity(String word) {
        this.word = word;
    }

    /** The word in files. */
    public String word() {
        return word;
    }
}
