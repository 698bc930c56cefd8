package org.modewright.modal;

import java.util.Objects;

/**
 * What a mode does, in plain words.
 *
 * @param kind the class of motion
 * @param text the words, such as "sway X", "sway Y with torsion" or "local: 3 members of group roof mast"
 */
public record Character(Kind kind, String text) {

    /** Classes of motion; the limits between them are {@link CharacterRules our own convention}. */
    public enum Kind {
        SWAY_X, SWAY_Y, SWAY, TORSION, SWAY_WITH_TORSION, VERTICAL, LOCAL, RIGID, UNSTABLE, MIXED
    }

    public Character {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(text, "text");
    }
}
