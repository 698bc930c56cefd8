package org.modewright.cli.internal;

/** What every reader of a result must know. */
final class Caution {

    static final String TEXT = "Results are an aid: a licensed engineer checks them against the governing code and local practice.";

    private Caution() {
    }
}
