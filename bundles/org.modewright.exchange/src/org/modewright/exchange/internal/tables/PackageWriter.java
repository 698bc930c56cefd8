package org.modewright.exchange.internal.tables;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.Support;

/** Makes the files of a table package from a structure, in the order of the model and always the same for the same model. */
public final class PackageWriter {

    private final StructuralModel model;
    private final List<String> warnings = new ArrayList<>();
    private final PackageNames names = new PackageNames(warnings);
    private final Map<TableSchema, TableText> tables = new LinkedHashMap<>();
    private final Set<String> springIds = new HashSet<>();

    private PackageWriter(StructuralModel model) {
        this.model = model;
    }

    /**
     * A package in memory.
     *
     * @param files the files by name, the description last
     * @param warnings what the package cannot hold
     */
    public record Written(Map<String, byte[]> files, List<String> warnings) {
    }

    /** Writes a structure. */
    public static Written write(StructuralModel model) {
        return new PackageWriter(model).write();
    }

    private Written write() {
        new LostContent(model, warnings).warn();
        names.add("node", model.getNodes());
        names.add("material", model.getMaterials());
        names.add("section", model.getFrameSections());
        names.add("member", model.getMembers());
        names.add("group", model.getGroups());
        names.add("spring", model.getSprings());
        names.add("floor", model.getRigidFloors());
        names.add("link", model.getRigidLinks());
        names.add("level", model.getLevels());
        names.add("pattern", model.getLoadPatterns());
        TableSchema.ALL.forEach(schema -> tables.put(schema, new TableText(schema.names())));
        model.getNodes().forEach(this::node);
        model.getMaterials().forEach(this::material);
        model.getFrameSections().forEach(this::section);
        model.getMembers().forEach(this::member);
        model.getSprings().forEach(spring -> springIds.add(names.of(spring)));
        model.getSprings().forEach(this::spring);
        model.getSupports().forEach(this::support);
        model.getMasses().forEach(this::mass);
        model.getRigidFloors().forEach(this::floor);
        model.getRigidLinks().forEach(this::link);
        model.getLevels().forEach(level -> row(TableSchema.LEVELS).text(names.of(level)).number(level.getElevation()).end());
        massRule();
        model.getLoadPatterns().forEach(this::loads);
        return new Written(files(), List.copyOf(warnings));
    }

    private TableText row(TableSchema schema) {
        return tables.get(schema);
    }

    private Map<String, byte[]> files() {
        Map<String, byte[]> files = new LinkedHashMap<>();
        List<TableSchema> written = new ArrayList<>();
        tables.forEach((schema, table) -> {
            if (table.rows() > 0 || schema == TableSchema.NODES) {
                files.put(schema.resource() + ".csv", table.bytes());
                written.add(schema);
            }
        });
        files.put(PackageContent.DESCRIPTOR, DescriptorWriter.write(model, written));
        return files;
    }

    private void node(Node node) {
        row(TableSchema.NODES).text(names.of(node)).number(node.getX()).number(node.getY()).number(node.getZ()).end();
    }

    private void material(Material material) {
        row(TableSchema.MATERIALS).text(names.of(material)).number(material.getYoung()).number(material.getPoisson())
                .number(material.getDensity()).optional(material.getShear()).end();
    }

    private void section(FrameSection section) {
        row(TableSchema.FRAME_SECTIONS).text(names.of(section)).number(section.getArea()).number(section.getIy()).number(section.getIz())
                .number(section.getTorsion()).optional(section.getShearAreaY()).optional(section.getShearAreaZ()).end();
    }

    private void member(Member member) {
        row(TableSchema.MEMBERS).text(names.of(member)).text(names.of(member.getStart())).text(names.of(member.getEnd()))
                .text(names.of(member.getSection())).text(names.of(member.getMaterial())).optional(member.getRoll())
                .text(Words.text(member.getStartFree())).text(Words.text(member.getEndFree())).optional(member.getStartRigid())
                .optional(member.getEndRigid()).flag(member.isAxialOnly()).optional(member.getAxialForce())
                .text(names.of(member.getGroup())).end();
    }

    private void spring(Spring spring) {
        stiffnesses(names.of(spring), spring.getNode(), spring.getTo(), List.of(spring.getUx(), spring.getUy(), spring.getUz(),
                spring.getRx(), spring.getRy(), spring.getRz())).text(names.of(spring.getGroup())).end();
    }

    private TableText stiffnesses(String id, Node node, Node to, List<Double> values) {
        TableText row = row(TableSchema.SPRINGS).text(id).text(names.of(node)).text(names.of(to));
        values.forEach(row::optional);
        return row;
    }

    private void support(Support support) {
        row(TableSchema.SUPPORTS).text(names.of(support.getNode())).flag(support.isUx()).flag(support.isUy()).flag(support.isUz())
                .flag(support.isRx()).flag(support.isRy()).flag(support.isRz()).end();
        if (LostContent.isElastic(support)) {
            stiffnesses(freeSpringId("support " + names.of(support.getNode())), support.getNode(), null, LostContent.elastic(support))
                    .blank().end();
        }
    }

    private String freeSpringId(String wanted) {
        String id = wanted;
        for (int i = 2; !springIds.add(id); i++) {
            id = wanted + " (" + i + ")";
        }
        return id;
    }

    private void mass(NodalMass mass) {
        row(TableSchema.MASSES).text(names.of(mass.getNode())).optional(mass.getUx()).optional(mass.getUy()).optional(mass.getUz())
                .optional(mass.getRx()).optional(mass.getRy()).optional(mass.getRz()).end();
    }

    private void floor(RigidFloor floor) {
        floor.getNodes().forEach(node -> row(TableSchema.RIGID_FLOORS).text(names.of(floor)).text(names.of(node)).end());
    }

    private void link(RigidLink link) {
        row(TableSchema.RIGID_LINKS).text(names.of(link)).text(names.of(link.getFrom())).text(names.of(link.getTo()))
                .text(Words.text(link.getComponents())).end();
    }

    private void massRule() {
        if (model.getSelfMassFactor() != 1) {
            row(TableSchema.MASS_RULE).text(MassTables.SELF).number(model.getSelfMassFactor()).end();
        }
        model.getLoadPatterns().forEach(pattern -> row(TableSchema.MASS_RULE).text(patternId(pattern)).number(pattern.getMassFactor())
                .end());
    }

    private void loads(LoadPattern pattern) {
        pattern.getLoads().forEach(load -> load(patternId(pattern), load));
    }

    private void load(String pattern, GravityLoad load) {
        String kind = load instanceof NodeLoad ? "node" : "member";
        String target = load instanceof NodeLoad node ? names.of(node.getNode()) : names.of(((MemberLoad) load).getMember());
        row(TableSchema.GRAVITY_LOADS).text(pattern).text(kind).text(target).number(load.getValue()).end();
    }

    /** {@code self} means the own mass of the elements in the tables; a pattern of that name gets another. */
    private String patternId(LoadPattern pattern) {
        String id = names.of(pattern);
        return id.equals(MassTables.SELF) ? "self (loads)" : id;
    }
}
