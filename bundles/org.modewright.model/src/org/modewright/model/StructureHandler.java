package org.modewright.model;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EEnumLiteral;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EcorePackage;
import org.eclipse.emf.ecore.InternalEObject;
import org.eclipse.emf.ecore.xmi.ClassNotFoundException;
import org.eclipse.emf.ecore.xmi.FeatureNotFoundException;
import org.eclipse.emf.ecore.xmi.IllegalValueException;
import org.eclipse.emf.ecore.xmi.UnresolvedReferenceException;
import org.eclipse.emf.ecore.xmi.XMIException;
import org.eclipse.emf.ecore.xmi.XMLHelper;
import org.eclipse.emf.ecore.xmi.XMLResource;
import org.eclipse.emf.ecore.xmi.impl.SAXXMIHandler;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructurePackage;

/**
 * Builds a model from the events of a parser. Knows no package but that of the structural model, follows no reference out of the file, and
 * ends at the first fault with a {@link LoadFault}.
 */
final class StructureHandler extends SAXXMIHandler {

    private static final Pattern NAMESPACE = Pattern.compile("urn:modewright:structure:(\\d{1,9})");
    private static final String ROOT = StructurePackage.Literals.STRUCTURAL_MODEL.getName();

    private record Place(int line, int column) {
    }

    private final Deque<Place> openElements = new ArrayDeque<>();
    private final Set<String> ids = new HashSet<>();
    private boolean rootSeen;

    StructureHandler(XMLResource resource, XMLHelper helper, Map<?, ?> options) {
        super(resource, helper, options);
    }

    @Override
    public void startElement(String uri, String localName, String name) {
        openElements.push(new Place(getLineNumber(), getColumnNumber()));
        if (!rootSeen) {
            rootSeen = true;
            checkRoot(name);
        }
        super.startElement(uri, localName, name);
    }

    private void checkRoot(String name) {
        int colon = name.indexOf(':');
        String namespace = attribs.getValue(colon < 0 ? "xmlns" : "xmlns:" + name.substring(0, colon));
        Matcher matcher = NAMESPACE.matcher(namespace == null ? "" : namespace);
        if (!matcher.matches()) {
            throw fault(name, "This is not a model file: its root element " + name + " is not in the namespace " + StructurePackage.eNS_URI
                    + ".", "Open a file that Modewright has saved.");
        }
        checkVersion(Integer.parseInt(matcher.group(1)), namespace);
        if (!name.substring(colon + 1).equals(ROOT)) {
            throw fault(name, "The root element is " + name + ", not a " + ROOT + ".", "Put the content inside one " + ROOT + " element.");
        }
        String version = attribs.getValue("formatVersion");
        if (version != null) {
            checkVersion(wholeNumber(version), "formatVersion");
        }
    }

    private int wholeNumber(String version) {
        try {
            return Integer.parseInt(version.strip());
        } catch (NumberFormatException e) {
            throw fault("formatVersion", "The format version '" + version + "' is not a whole number.",
                    "Write formatVersion=\"" + ModelFile.FORMAT_VERSION + "\".");
        }
    }

    private void checkVersion(int version, String word) {
        if (version > ModelFile.FORMAT_VERSION) {
            throw fault(word, "The file was written by a newer Modewright (file format " + version + "; this one reads up to "
                    + ModelFile.FORMAT_VERSION + ").", "Open it with a newer Modewright.");
        }
        if (version < 1) {
            throw fault(word, "There is no file format " + version + ".", "Write formatVersion=\"" + ModelFile.FORMAT_VERSION + "\".");
        }
    }

    @Override
    public void endElement(String uri, String localName, String name) {
        Place start = openElements.pop();
        if (types.peek() == OBJECT_TYPE && objects.peekEObject() instanceof Identified object) {
            checkId(object, start);
        }
        super.endElement(uri, localName, name);
    }

    private void checkId(Identified object, Place start) {
        String id = object.getId();
        String kind = object.eClass().getName();
        if (id == null || id.isEmpty()) {
            throw fault(start, List.of(), "A " + kind + " has no id.", "Give it an id that no other object of the file has.");
        }
        if (!Ids.isWellFormed(id)) {
            throw fault(start, List.of("id", id), "The id '" + id + "' of a " + kind + " is not valid.",
                    "Write letters, digits, '_', '-' and '.', beginning with a letter, a digit or '_'.");
        }
        if (!ids.add(id)) {
            throw fault(start, List.of("id", id), "The id '" + id + "' of a " + kind + " is already taken by an earlier object.",
                    "Give one of the two another id and correct the references to it.");
        }
    }

    @Override
    protected EPackage getPackageForURI(String uri) {
        if (uri == null || uri.equals(StructurePackage.eNS_URI)) {
            return StructurePackage.eINSTANCE;
        }
        throw fault(uri, "The namespace '" + uri + "' has no place in a model file.", "Remove what belongs to it.");
    }

    @Override
    protected void handleProxy(InternalEObject proxy, String uri) {
        throw fault(uri, "A reference leads out of the file ('" + uri + "').", "Refer to objects of the same file by their ids.");
    }

    @Override
    public void error(XMIException e) {
        if (e instanceof UnresolvedReferenceException fault) {
            throw unresolved(fault);
        }
        if (e instanceof FeatureNotFoundException fault) {
            throw unknownFeature(fault);
        }
        if (e instanceof IllegalValueException fault) {
            throw wrongValue(fault);
        }
        if (e instanceof ClassNotFoundException fault) {
            throw fault(fault.getName(), "There is no kind of object named '" + fault.getName() + "' here.",
                    "Correct the name or remove the element.");
        }
        throw LoadFault.of(e);
    }

    private LoadFault unresolved(UnresolvedReferenceException e) {
        EStructuralFeature feature = e.getFeature();
        return new LoadFault(e.getLine(), e.getColumn(), List.of(feature.getName(), e.getReference()),
                "The " + feature.getName() + " of " + Names.describe(e.getObject()) + " refers to '" + e.getReference()
                        + "', which is not in the file.",
                "Refer to the id of a " + feature.getEType().getName() + " of the file.", e);
    }

    private LoadFault unknownFeature(FeatureNotFoundException e) {
        String owner = e.getObject() == null ? "This element" : "A " + e.getObject().eClass().getName();
        return new LoadFault(e.getLine(), e.getColumn(), List.of(e.getName()), owner + " has no property '" + e.getName() + "'.",
                "Correct the name or remove the property.", e);
    }

    private LoadFault wrongValue(IllegalValueException e) {
        if (e.getFeature() instanceof EReference reference) {
            return wrongTarget(e, reference);
        }
        String value = String.valueOf(e.getValue());
        return new LoadFault(e.getLine(), e.getColumn(), List.of(e.getFeature().getName()),
                "The " + e.getFeature().getName() + " of a " + e.getObject().eClass().getName() + " is '" + value + "', which is not "
                        + wanted(e.getFeature()) + ".", "Write " + wanted(e.getFeature()) + ".", e);
    }

    private LoadFault wrongTarget(IllegalValueException e, EReference reference) {
        Place place = forwardSingleReferences.stream()
                .filter(r -> r.getObject() == e.getObject() && r.getFeature() == reference)
                .map(r -> new Place(r.getLineNumber(), r.getColumnNumber())).findFirst()
                .or(() -> forwardManyReferences.stream().filter(r -> r.getObject() == e.getObject() && r.getFeature() == reference)
                        .map(r -> new Place(r.getLineNumber(), r.getColumnNumber())).findFirst())
                .orElse(new Place(e.getLine(), e.getColumn()));
        String target = e.getValue() instanceof EObject object ? Names.describe(object) : "something else";
        return new LoadFault(place.line(), place.column(), List.of(reference.getName()),
                "The " + reference.getName() + " of " + Names.describe(e.getObject()) + " refers to " + target + ", not to a "
                        + reference.getEType().getName() + ".",
                "Refer to the id of a " + reference.getEType().getName() + ".", e);
    }

    private static String wanted(EStructuralFeature feature) {
        EClassifier type = feature.getEType();
        if (type instanceof EEnum choices) {
            return choices.getELiterals().stream().map(EEnumLiteral::getLiteral)
                    .collect(Collectors.joining("', '", feature.isMany() ? "a list of '" : "one of '", "'"));
        }
        if (type == EcorePackage.Literals.EDOUBLE) {
            return "a number";
        }
        if (type == EcorePackage.Literals.EINT) {
            return "a whole number";
        }
        return type == EcorePackage.Literals.EBOOLEAN ? "true or false" : "a text";
    }

    private LoadFault fault(String word, String reason, String remedy) {
        return new LoadFault(getLineNumber(), getColumnNumber(), word == null ? List.of() : List.of(word), reason, remedy, null);
    }

    private static LoadFault fault(Place place, List<String> words, String reason, String remedy) {
        return new LoadFault(place.line(), place.column(), words, reason, remedy, null);
    }
}
