package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The columns of one resource of a table package.
 *
 * @param resource name of the resource
 * @param columns all columns in the order in which they are written
 */
record TableSchema(String resource, List<Column> columns) {

    /** What a column holds. */
    enum Type {
        /** Text: an id, a reference or a list of words. */
        TEXT("string"),
        /** A finite number. */
        NUMBER("number"),
        /** 0 or 1. */
        FLAG("integer");

        private final String word;

        Type(String word) {
            this.word = word;
        }

        /** The name of the type in a table schema. */
        String word() {
            return word;
        }
    }

    /** A column: its name, whether it must be there and filled, and what it holds. */
    record Column(String name, boolean required, Type type) {
    }

    static final TableSchema NODES = of("nodes", "id! x!# y!# z!#");
    static final TableSchema MATERIALS = of("materials", "id! young!# poisson!# density!# shear#");
    static final TableSchema FRAME_SECTIONS = of("frame_sections", "id! area!# iy!# iz!# torsion!# shear_area_y# shear_area_z#");
    static final TableSchema PLATE_SECTIONS = of("plate_sections", "id! thickness!#");
    static final TableSchema MEMBERS = of("members", "id! start! end! section! material! roll# start_free end_free start_rigid# end_rigid# "
            + "axial_only? axial_force# group");
    static final TableSchema PANELS = of("panels", "id! n1! n2! n3! n4 section! material! group");
    static final TableSchema SPRINGS = of("springs", "id! node! to ux# uy# uz# rx# ry# rz# group");
    static final TableSchema SUPPORTS = of("supports", "node! ux? uy? uz? rx? ry? rz?");
    static final TableSchema MASSES = of("masses", "node! ux# uy# uz# rx# ry# rz#");
    static final TableSchema RIGID_FLOORS = of("rigid_floors", "floor! node!");
    static final TableSchema RIGID_LINKS = of("rigid_links", "id! from! to! dofs");
    static final TableSchema LEVELS = of("levels", "id! elevation!#");
    static final TableSchema GRAVITY_LOADS = of("gravity_loads", "pattern! kind! target! value!#");
    static final TableSchema MASS_RULE = of("mass_rule", "pattern! factor!#");

    /** Every resource, in the order in which a package is written. */
    static final List<TableSchema> ALL = List.of(NODES, MATERIALS, FRAME_SECTIONS, PLATE_SECTIONS, MEMBERS, PANELS, SPRINGS, SUPPORTS,
            MASSES, RIGID_FLOORS, RIGID_LINKS, LEVELS, GRAVITY_LOADS, MASS_RULE);

    List<String> names() {
        return columns.stream().map(Column::name).toList();
    }

    boolean has(String column) {
        return columns.stream().anyMatch(c -> c.name().equals(column));
    }

    /** A name followed by {@code !} must be there; {@code #} marks a number, {@code ?} a flag. */
    private static TableSchema of(String resource, String columns) {
        List<Column> list = new ArrayList<>();
        Arrays.stream(columns.split(" ")).forEach(word -> {
            Type type = word.endsWith("#") ? Type.NUMBER : word.endsWith("?") ? Type.FLAG : Type.TEXT;
            list.add(new Column(word.replaceAll("[!#?]", ""), word.indexOf('!') >= 0, type));
        });
        return new TableSchema(resource, List.copyOf(list));
    }
}
