package org.modewright.exchange.internal.tables;

import java.util.Map;

import org.modewright.model.structure.MassFormulation;
import org.modewright.model.structure.UnitSystem;

/**
 * What {@code datapackage.json} says.
 *
 * @param name short name
 * @param title title for people
 * @param description remarks
 * @param units unit system of every number in the tables
 * @param gravity acceleration of gravity in the package's length unit per second squared; 0 for standard gravity
 * @param mass mass formulation of the members
 * @param shearDeformation false ignores all shear areas
 * @param resources path of the table of each resource, in the order of the file
 */
record Descriptor(String name, String title, String description, UnitSystem units, double gravity, MassFormulation mass,
        boolean shearDeformation, Map<String, String> resources) {
}
