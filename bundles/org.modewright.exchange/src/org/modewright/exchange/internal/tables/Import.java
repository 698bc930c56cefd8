package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;

import org.eclipse.emf.ecore.EObject;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructureFactory;

/** A structure in the making, with all that the tables share while they are read. */
final class Import {

    final StructuralModel model;
    final ProblemList problems = new ProblemList();
    final List<String> warnings = new ArrayList<>();
    final Map<EObject, Row> origins = new IdentityHashMap<>();

    final Index<Node> nodes = new Index<>("node");
    final Index<Material> materials = new Index<>("material");
    final Index<FrameSection> sections = new Index<>("frame section");
    final Index<Member> members = new Index<>("member");
    final Index<Spring> springs = new Index<>("spring");
    final Index<RigidLink> links = new Index<>("rigid link");
    final Index<Level> levels = new Index<>("level");
    final Map<String, LoadPattern> patterns = new HashMap<>();

    private final Map<String, Group> groups = new HashMap<>();

    Import(StructuralModel model) {
        this.model = model;
    }

    /** Remembers the row of an object, for faults that show only when the structure is whole. */
    void from(Row row, EObject object) {
        origins.put(object, row);
    }

    /** The group that a cell names, made where it is new; null where the cell is blank. */
    Group group(Row row) {
        return row.isBlank("group") ? null : groups.computeIfAbsent(row.id("group"), name -> {
            Group group = StructureFactory.eINSTANCE.createGroup();
            group.setName(name);
            model.getGroups().add(group);
            return group;
        });
    }

    /** The load pattern of a name, made where it is new. */
    LoadPattern pattern(String name) {
        return patterns.computeIfAbsent(name, key -> {
            LoadPattern pattern = StructureFactory.eINSTANCE.createLoadPattern();
            pattern.setName(key);
            model.getLoadPatterns().add(pattern);
            return pattern;
        });
    }
}
