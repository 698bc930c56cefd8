package org.modewright.model.edit;

import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.Component;
import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Level;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.MultiPointTie;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.RigidFloor;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.model.structure.Support;
import org.modewright.model.structure.TieTerm;
import org.modewright.model.structure.Vector;
import org.modewright.model.structure.provider.StructureEditPlugin;

/**
 * What objects of a model are called in trees, lists and tables, such as "Member B12  (N4 to N9)".
 */
public final class Labels {

    private static final String UNKNOWN = "?";

    private Labels() {
    }

    /**
     * @param object an object of a model, or anything else
     * @return its label
     */
    public static String of(Object object) {
        if (!(object instanceof EObject modelObject)) {
            return String.valueOf(object);
        }
        String head = head(modelObject);
        String detail = detail(modelObject);
        return detail.isEmpty() ? head : head + "  (" + detail + ")";
    }

    /**
     * @param object an object, or null
     * @return its name alone, or null if it is nothing that has a name; a question mark where the name is missing
     */
    public static String name(Object object) {
        if (!(object instanceof Identified identified)) {
            return null;
        }
        return identified.getName() == null || identified.getName().isBlank() ? UNKNOWN : identified.getName();
    }

    private static String head(EObject object) {
        String kind = type(object instanceof Member member && member.isAxialOnly() ? "Bar" : object.eClass().getName());
        if (object instanceof StructuralModel model) {
            return model.getName() == null || model.getName().isBlank() ? kind : model.getName();
        }
        String name = name(object);
        return name == null || UNKNOWN.equals(name) ? kind : kind + " " + name;
    }

    private static String detail(EObject object) {
        if (object instanceof Node node) {
            return point(node.getX(), node.getY(), node.getZ());
        }
        if (object instanceof Vector vector) {
            return point(vector.getX(), vector.getY(), vector.getZ());
        }
        if (object instanceof Level level) {
            return "z = " + number(level.getElevation()) + unit(level, StructurePackage.Literals.LEVEL__ELEVATION);
        }
        if (object instanceof FrameSection section) {
            return "A = " + number(section.getArea()) + unit(section, StructurePackage.Literals.FRAME_SECTION__AREA);
        }
        return linkDetail(object);
    }

    private static String linkDetail(EObject object) {
        if (object instanceof Member member) {
            return text("to", reference(member.getStart()), reference(member.getEnd()));
        }
        if (object instanceof Spring spring) {
            return text("to", reference(spring.getNode()), spring.getTo() == null ? text("ground") : name(spring.getTo()));
        }
        if (object instanceof RigidLink link) {
            return text("to", reference(link.getFrom()), reference(link.getTo()));
        }
        if (object instanceof RigidFloor floor) {
            return text("nodes", floor.getNodes().size());
        }
        if (object instanceof MultiPointTie tie) {
            return text("terms", tie.getTerms().size());
        }
        if (object instanceof Support support) {
            String held = held(support);
            return reference(support.getNode()) + (held.isEmpty() ? "" : ": " + held);
        }
        return valueDetail(object);
    }

    private static String valueDetail(EObject object) {
        if (object instanceof NodalMass mass) {
            return reference(mass.getNode());
        }
        if (object instanceof LoadPattern pattern) {
            return text("massFactor", number(pattern.getMassFactor()));
        }
        if (object instanceof GravityLoad load) {
            EObject target = load instanceof NodeLoad atNode ? atNode.getNode() : ((MemberLoad) load).getMember();
            return reference(target) + ": " + number(load.getValue()) + unit(load, StructurePackage.Literals.GRAVITY_LOAD__VALUE);
        }
        if (object instanceof TieTerm term) {
            return number(term.getFactor()) + " · " + term.getComponent().getLiteral() + " " + reference(term.getNode());
        }
        if (object instanceof SpringCoupling coupling) {
            return coupling.getFirst().getLiteral() + "–" + coupling.getSecond().getLiteral() + ": " + number(coupling.getStiffness());
        }
        return "";
    }

    private static String held(Support support) {
        return List.of(StructurePackage.Literals.SUPPORT__UX, StructurePackage.Literals.SUPPORT__UY, StructurePackage.Literals.SUPPORT__UZ,
                StructurePackage.Literals.SUPPORT__RX, StructurePackage.Literals.SUPPORT__RY, StructurePackage.Literals.SUPPORT__RZ)
                .stream().filter(a -> (Boolean) support.eGet(a)).map(a -> Component.get(a.getName()).getLiteral())
                .collect(Collectors.joining(" "));
    }

    private static String reference(EObject target) {
        String name = name(target);
        return name == null ? UNKNOWN : name;
    }

    private static String point(double x, double y, double z) {
        return number(x) + ", " + number(y) + ", " + number(z);
    }

    /** Up to four significant decimals; powers of ten where the number is very large or very small. */
    private static String number(double value) {
        double size = Math.abs(value);
        boolean plain = value == 0 || size >= 1e-3 && size < 1e7;
        return new DecimalFormat(plain ? "0.####" : "0.####E0", DecimalFormatSymbols.getInstance(Locale.ROOT)).format(value);
    }

    private static String unit(EObject object, EAttribute attribute) {
        if (!(EcoreUtil.getRootContainer(object) instanceof StructuralModel model)) {
            return "";
        }
        String symbol = Units.of(model).symbol(Quantity.of(object, attribute));
        return symbol.isEmpty() ? "" : " " + symbol;
    }

    private static String type(String kind) {
        return StructureEditPlugin.INSTANCE.getString("_UI_" + kind + "_type");
    }

    private static String text(String key, Object... arguments) {
        return StructureEditPlugin.INSTANCE.getString("_UI_Label_" + key, arguments);
    }
}
