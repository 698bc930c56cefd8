package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

import org.modewright.model.structure.Component;

/** Lists of components in one cell, such as {@code ry rz}. */
final class Words {

    private Words() {
    }

    /** The components that a cell lists, separated by blanks; unknown and repeated ones are problems. */
    static List<Component> components(Row row, String column) {
        List<Component> components = new ArrayList<>();
        if (row.isBlank(column)) {
            return components;
        }
        for (String word : row.cell(column).split("\\s+")) {
            Component component = Component.get(word);
            if (component == null) {
                row.problem(column, "\"" + word + "\" is no component; give some of ux uy uz rx ry rz, separated by blanks");
            } else if (components.contains(component)) {
                row.problem(column, "the component " + word + " is there twice");
            } else {
                components.add(component);
            }
        }
        return components;
    }

    static String text(List<Component> components) {
        return components.stream().map(Component::getLiteral).collect(Collectors.joining(" "));
    }
}
