package org.modewright.exchange.internal.tables;

import java.util.LinkedHashMap;
import java.util.Map;

/** The objects of one kind by their id in the package. */
final class Index<T> {

    private final String kind;
    private final Map<String, T> objects = new LinkedHashMap<>();
    private boolean unreadable;

    /** @param kind what an object is called in a sentence */
    Index(String kind) {
        this.kind = kind;
    }

    /** The table of these objects could not be read: references to them are no further faults. */
    void markUnreadable() {
        unreadable = true;
    }

    /** Enters an object; a problem where its id is taken already. */
    void declare(Row row, String column, String id, T object) {
        if (id != null && objects.putIfAbsent(id, object) != null) {
            row.problem(column, "this id is there twice; every " + kind + " needs an id of its own");
        }
    }

    /** The object that a cell refers to; null, with a problem, where the cell is blank or there is no such object. */
    T required(Row row, String column) {
        String id = row.requiredId(column);
        return id == null ? null : find(row, column, id);
    }

    /** The object that a cell refers to; null where the cell is blank. */
    T optional(Row row, String column) {
        return row.isBlank(column) ? null : find(row, column, row.id(column));
    }

    boolean isEmpty() {
        return objects.isEmpty();
    }

    /** The object of an id, or null. */
    T get(String id) {
        return objects.get(id);
    }

    private T find(Row row, String column, String id) {
        T object = objects.get(id);
        if (object == null && !unreadable) {
            row.problem(column, "there is no " + kind + " with this id");
        }
        return object;
    }
}
