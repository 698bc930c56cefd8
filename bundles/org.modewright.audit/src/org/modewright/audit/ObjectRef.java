package org.modewright.audit;

import java.util.Objects;

/**
 * An object that a finding concerns.
 *
 * @param kind node, member, panel, spring, group, mode or direction
 * @param id id in the model; of a mode its number, of a direction its word
 * @param name the name that the user gave it
 */
public record ObjectRef(String kind, String id, String name) {

    public ObjectRef {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(id, "id");
        Objects.requireNonNull(name, "name");
    }
}
