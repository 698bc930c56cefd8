package org.modewright.audit;

import java.util.List;
import java.util.Objects;

/**
 * Something that the audit found.
 *
 * @param id stable id of the kind of finding, such as {@code loose-part}; quick fixes are keyed on it
 * @param severity how grave it is
 * @param objects what it concerns, the most important first
 * @param text what is so and why it matters, with numbers
 * @param remedy what to do about it
 */
public record Finding(String id, Severity severity, List<ObjectRef> objects, String text, String remedy) {

    public Finding {
        Objects.requireNonNull(id, "id");
        Objects.requireNonNull(severity, "severity");
        objects = List.copyOf(objects);
        Objects.requireNonNull(text, "text");
        Objects.requireNonNull(remedy, "remedy");
    }
}
