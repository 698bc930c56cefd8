package org.modewright.exchange.samples;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

import org.modewright.model.Ids;
import org.modewright.model.ModelFile;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Group;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.UnitSystem;
import org.modewright.testmodels.Parts;

/** Builds a structural model by the names of its parts. */
final class ModelBuilder {

    private static final MathContext FOUR_FIGURES = new MathContext(4);

    private final StructuralModel model;
    private final Parts parts;
    private final Map<String, Node> nodes = new HashMap<>();
    private final Map<String, Group> groups = new HashMap<>();
    private final Map<String, LoadPattern> patterns = new HashMap<>();

    ModelBuilder(String name, String title, String units, String notes) {
        model = ModelFile.create(name);
        parts = new Parts(model);
        model.setTitle(title);
        model.setUnits(UnitSystem.get(units));
        model.setNotes(notes);
    }

    StructuralModel model() {
        Ids.assignMissing(model);
        return model;
    }

    Node node(String name, double x, double y, double z) {
        Node node = parts.node(name, x, y, z);
        nodes.put(name, node);
        return node;
    }

    /** The node of a name, or null. */
    Node node(String name) {
        return nodes.get(name);
    }

    Material material(String name, double young, double poisson, double density) {
        return parts.material(name, young, poisson, density);
    }

    FrameSection section(String name, double area, double iy, double iz, double torsion) {
        return parts.section(name, area, iy, iz, torsion);
    }

    /** Welded I-section of three plates, without fillets: web h by tw between flanges b by tf. */
    FrameSection iSection(String name, double h, double b, double tw, double tf) {
        double web = h - 2 * tf;
        FrameSection section = section(name, rounded(2 * b * tf + web * tw),
                rounded((b * h * h * h - (b - tw) * web * web * web) / 12),
                rounded((2 * tf * b * b * b + web * tw * tw * tw) / 12),
                rounded((2 * b * tf * tf * tf + web * tw * tw * tw) / 3));
        section.setShearAreaY(rounded(2 * b * tf * 5 / 6));
        section.setShearAreaZ(rounded(h * tw));
        return section;
    }

    /** Round tube of outer diameter d and thickness t. */
    FrameSection tube(String name, double d, double t) {
        double inner = d - 2 * t;
        double second = Math.PI / 64 * (Math.pow(d, 4) - Math.pow(inner, 4));
        FrameSection section = section(name, rounded(Math.PI / 4 * (d * d - inner * inner)), rounded(second), rounded(second),
                rounded(2 * second));
        section.setShearAreaY(rounded(section.getArea() / 2));
        section.setShearAreaZ(rounded(section.getArea() / 2));
        return section;
    }

    private static double rounded(double value) {
        return new BigDecimal(value).round(FOUR_FIGURES).doubleValue();
    }

    Member member(String name, String start, String end, FrameSection section, Material material, String group) {
        Member member = parts.member(name, required(start), required(end), section, material);
        member.setGroup(group == null ? null : groups.computeIfAbsent(group, parts::group));
        return member;
    }

    Member bar(String name, String start, String end, FrameSection section, Material material, String group) {
        Member member = member(name, start, end, section, material, group);
        member.setAxialOnly(true);
        return member;
    }

    /** Holds the components that are named, such as {@code ux uy}. */
    void support(String node, String held) {
        parts.support(node, required(node), held);
    }

    void mass(String node, double x, double y, double z) {
        parts.mass(node, required(node), x, y, z);
    }

    void spring(String name, String node, String to, double ux) {
        parts.spring(name, required(node), to == null ? null : required(to), ux);
    }

    void floor(String name, List<Node> floorNodes) {
        parts.floor(name, floorNodes);
    }

    void link(String name, String from, String to, Component... components) {
        parts.link(name, required(from), required(to), components);
    }

    void level(String name, double elevation) {
        parts.level(name, elevation);
    }

    void pattern(String name, double massFactor) {
        patterns.put(name, parts.pattern(name, massFactor));
    }

    void lineLoad(String pattern, Member member, double value) {
        Parts.load(patterns.get(pattern), member, value);
    }

    void selfMassFactor(double factor) {
        model.setSelfMassFactor(factor);
    }

    /** Judges only these directions. */
    void judge(boolean x, boolean y, boolean z) {
        model.getAudit().setX(x);
        model.getAudit().setY(y);
        model.getAudit().setZ(z);
    }

    private Node required(String name) {
        Node node = nodes.get(name);
        if (node == null) {
            throw new IllegalArgumentException("There is no node " + name + ".");
        }
        return node;
    }
}
