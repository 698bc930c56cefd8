package org.modewright.workspace;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;

/**
 * Findings as markers on model files. Those of the checks that need no modes are replaced whenever the model is checked, those of a run
 * whenever it is run; what both find is marked once.
 */
public final class FindingMarkers {

    /** All findings. */
    public static final String FINDING = "org.modewright.workspace.finding";
    /** Findings of the model itself, kept up to date by the builder. */
    public static final String MODEL_FINDING = "org.modewright.workspace.modelFinding";
    /** Findings of the last run. */
    public static final String RUN_FINDING = "org.modewright.workspace.runFinding";

    /** Attribute: stable id of the finding, such as "nodes-not-joined". */
    public static final String FINDING_ID = "findingId";
    /** Attribute: model ids of the objects concerned, one a line. */
    public static final String ELEMENT_IDS = "elementIds";
    /** Attribute: names of the objects concerned, one a line. */
    public static final String ELEMENT_NAMES = "elementNames";
    /** Attribute: what to do. */
    public static final String REMEDY = "remedy";

    private static final int MOST = 500;
    private static final int NAMED = 4;

    private FindingMarkers() {
    }

    /** Replaces the findings of the model itself. */
    public static void replaceModelFindings(IFile file, List<Finding> findings) throws CoreException {
        file.deleteMarkers(MODEL_FINDING, true, IResource.DEPTH_ZERO);
        Set<String> found = findings.stream().map(FindingMarkers::identity).collect(Collectors.toSet());
        for (IMarker marker : file.findMarkers(RUN_FINDING, true, IResource.DEPTH_ZERO)) {
            if (found.contains(identity(marker))) {
                marker.delete();
            }
        }
        create(file, MODEL_FINDING, findings);
    }

    /** Replaces the findings of the last run. */
    public static void replaceRunFindings(IFile file, List<Finding> findings) throws CoreException {
        file.deleteMarkers(RUN_FINDING, true, IResource.DEPTH_ZERO);
        Set<String> marked = new HashSet<>();
        for (IMarker marker : file.findMarkers(MODEL_FINDING, true, IResource.DEPTH_ZERO)) {
            marked.add(identity(marker));
        }
        create(file, RUN_FINDING, findings.stream().filter(finding -> !marked.contains(identity(finding))).toList());
    }

    /** Replaces the findings of the model itself by one fault of its file. */
    public static void replaceByFault(IFile file, String text, int line) throws CoreException {
        file.deleteMarkers(MODEL_FINDING, true, IResource.DEPTH_ZERO);
        Map<String, Object> attributes = new HashMap<>();
        attributes.put(IMarker.MESSAGE, text);
        attributes.put(IMarker.SEVERITY, IMarker.SEVERITY_ERROR);
        attributes.put(FINDING_ID, "unreadable-file");
        if (line > 0) {
            attributes.put(IMarker.LINE_NUMBER, line);
        }
        file.createMarker(MODEL_FINDING, attributes);
    }

    /** The model ids that a marker concerns. */
    public static List<String> elementIds(IMarker marker) {
        String ids = marker.getAttribute(ELEMENT_IDS, "");
        return ids.isEmpty() ? List.of() : List.of(ids.split("\n"));
    }

    private static void create(IFile file, String type, List<Finding> findings) throws CoreException {
        for (Finding finding : findings.subList(0, Math.min(MOST, findings.size()))) {
            file.createMarker(type, attributes(finding));
        }
        if (findings.size() > MOST) {
            file.createMarker(type, Map.of(IMarker.SEVERITY, IMarker.SEVERITY_WARNING, FINDING_ID, "more-findings", IMarker.MESSAGE,
                    (findings.size() - MOST) + " more findings are not listed. Mend those above first."));
        }
    }

    private static Map<String, Object> attributes(Finding finding) {
        Map<String, Object> attributes = new HashMap<>();
        attributes.put(IMarker.MESSAGE, finding.remedy().isBlank() ? finding.text() : finding.text() + " " + finding.remedy());
        attributes.put(IMarker.SEVERITY, severity(finding.severity()));
        attributes.put(FINDING_ID, finding.id());
        attributes.put(REMEDY, finding.remedy());
        attributes.put(ELEMENT_IDS, joined(finding, ObjectRef::id));
        attributes.put(ELEMENT_NAMES, joined(finding, ObjectRef::name));
        attributes.put(IMarker.LOCATION, location(finding.objects()));
        return attributes;
    }

    private static String location(List<ObjectRef> objects) {
        List<String> named = new ArrayList<>();
        for (ObjectRef object : objects.subList(0, Math.min(NAMED, objects.size()))) {
            named.add(object.kind() + " " + object.name());
        }
        if (objects.size() > NAMED) {
            named.add((objects.size() - NAMED) + " more");
        }
        return String.join(", ", named);
    }

    private static String joined(Finding finding, Function<ObjectRef, String> part) {
        return finding.objects().stream().map(part).collect(Collectors.joining("\n"));
    }

    private static String identity(Finding finding) {
        return finding.id() + '\n' + joined(finding, ObjectRef::id);
    }

    private static String identity(IMarker marker) {
        return marker.getAttribute(FINDING_ID, "") + '\n' + marker.getAttribute(ELEMENT_IDS, "");
    }

    private static int severity(Severity severity) {
        return switch (severity) {
            case ERROR -> IMarker.SEVERITY_ERROR;
            case WARNING -> IMarker.SEVERITY_WARNING;
            case INFO -> IMarker.SEVERITY_INFO;
        };
    }
}
