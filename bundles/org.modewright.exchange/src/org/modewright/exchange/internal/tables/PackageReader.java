package org.modewright.exchange.internal.tables;

import java.io.IOException;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;

import org.eclipse.emf.ecore.EObject;
import org.modewright.exchange.Imported;
import org.modewright.exchange.PackageException;
import org.modewright.model.Defect;
import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.Severity;
import org.modewright.model.WellFormedness;

/** Makes a structure from the content of a table package: all of it or, where anything is wrong, nothing. */
public final class PackageReader {

    private static final Set<TableSchema> NOT_YET = Set.of(TableSchema.PANELS, TableSchema.PLATE_SECTIONS);

    private final PackageContent content;
    private final Import target;
    private final Map<TableSchema, Consumer<Row>> readers = new HashMap<>();
    private final Map<TableSchema, Index<?>> indices;
    private final GeometryTables geometry;

    private PackageReader(PackageContent content) {
        this.content = content;
        target = new Import(ModelFile.create(""));
        geometry = new GeometryTables(target);
        indices = Map.of(TableSchema.NODES, target.nodes, TableSchema.MATERIALS, target.materials, TableSchema.FRAME_SECTIONS,
                target.sections, TableSchema.MEMBERS, target.members);
        ElementTables elements = new ElementTables(target);
        MassTables masses = new MassTables(target);
        readers.put(TableSchema.NODES, geometry::node);
        readers.put(TableSchema.LEVELS, geometry::level);
        readers.put(TableSchema.SUPPORTS, geometry::support);
        readers.put(TableSchema.RIGID_FLOORS, geometry::floorNode);
        readers.put(TableSchema.RIGID_LINKS, geometry::link);
        readers.put(TableSchema.MATERIALS, elements::material);
        readers.put(TableSchema.FRAME_SECTIONS, elements::frameSection);
        readers.put(TableSchema.MEMBERS, elements::member);
        readers.put(TableSchema.SPRINGS, elements::spring);
        readers.put(TableSchema.MASSES, masses::mass);
        readers.put(TableSchema.MASS_RULE, masses::rule);
        readers.put(TableSchema.GRAVITY_LOADS, masses::load);
    }

    /**
     * Reads a package.
     *
     * @param location a folder, a zip, or a datapackage.json
     * @throws PackageException with every problem of the package
     */
    public static Imported read(Path location) throws IOException {
        try (PackageContent content = PackageContent.of(location)) {
            return new PackageReader(content).read(String.valueOf(location.getFileName()));
        }
    }

    private Imported read(String location) throws PackageException {
        Descriptor descriptor = new DescriptorReader(target.problems, target.warnings).read(content);
        if (descriptor == null) {
            target.problems.throwIfAny();
        }
        settings(descriptor, location);
        // the rule comes before the loads so that patterns keep the order of the rule
        List<TableSchema> order = List.of(TableSchema.NODES, TableSchema.MATERIALS, TableSchema.FRAME_SECTIONS, TableSchema.PLATE_SECTIONS,
                TableSchema.MEMBERS, TableSchema.PANELS, TableSchema.SPRINGS, TableSchema.SUPPORTS, TableSchema.MASSES,
                TableSchema.RIGID_FLOORS, TableSchema.RIGID_LINKS, TableSchema.LEVELS, TableSchema.MASS_RULE, TableSchema.GRAVITY_LOADS);
        for (TableSchema schema : order) {
            table(schema, descriptor.resources().get(schema.resource()));
        }
        geometry.checkFloors();
        if (!descriptor.resources().containsKey(TableSchema.NODES.resource())) {
            target.problems.add(PackageContent.DESCRIPTOR, 0, "resources", "", "the resource nodes is missing; a structure has nodes");
        }
        unnamedTables(descriptor);
        wellFormedness();
        target.problems.throwIfAny();
        Ids.assignMissing(target.model);
        return new Imported(target.model, target.warnings);
    }

    private void settings(Descriptor descriptor, String location) {
        target.model.setName(descriptor.name() == null || descriptor.name().isBlank() ? location : descriptor.name());
        target.model.setTitle(descriptor.title());
        target.model.setNotes(descriptor.description());
        target.model.setUnits(descriptor.units());
        target.model.setGravity(descriptor.gravity());
        target.model.setMassFormulation(descriptor.mass());
        target.model.setShearDeformation(descriptor.shearDeformation());
    }

    private void table(TableSchema schema, String path) {
        if (path == null) {
            return;
        }
        List<Row> rows = new CsvTable(schema, path, target.problems, target.warnings).read(content).orElse(null);
        if (rows == null) {
            Index<?> index = indices.get(schema);
            if (index != null) {
                index.markUnreadable();
            }
            return;
        }
        if (NOT_YET.contains(schema)) {
            rows.stream().findFirst().ifPresent(row -> row.problem("id", "the resource " + schema.resource()
                    + " is not yet supported; model the panels by members or remove the rows"));
            return;
        }
        rows.forEach(readers.get(schema));
    }

    private void unnamedTables(Descriptor descriptor) {
        Set<String> named = new HashSet<>(descriptor.resources().values());
        content.rootTables().stream().filter(file -> !named.contains(file)).forEach(
                file -> target.warnings.add(file + ": no known resource of datapackage.json has this path; the file was ignored"));
    }

    /** What the tables do not see row by row: only asked where they are in order, so that nothing is said twice. */
    private void wellFormedness() {
        if (!target.problems.isEmpty()) {
            return;
        }
        for (Defect defect : WellFormedness.check(target.model)) {
            if (defect.severity() == Severity.ERROR) {
                report(defect);
            }
        }
    }

    private void report(Defect defect) {
        Row row = null;
        for (EObject object = defect.object(); object != null && row == null; object = object.eContainer()) {
            row = target.origins.get(object);
        }
        String text = defect.text() + " " + defect.remedy();
        if (row == null) {
            target.problems.add(PackageContent.DESCRIPTOR, 0, "", "", text);
            return;
        }
        String column = defect.feature() == null ? "" : Columns.of(defect.feature());
        row.problem(column, text);
    }
}
