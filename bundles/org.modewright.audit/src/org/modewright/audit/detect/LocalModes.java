package org.modewright.audit.detect;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Severity;
import org.modewright.audit.Words;
import org.modewright.modal.Dominance;
import org.modewright.modal.Figures;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;

/** Local modes, one finding for each place where they are. */
final class LocalModes implements FindingDetector {

    static final String ID = "local-modes";

    private static final String PREFIX = "local: ";
    private static final String OF_GROUP = " of group ";
    private static final double LEADING = 0.8;
    private static final int ELEMENTS = 20;
    private static final double SMALLEST_SHOWN = 0.001;

    @Override
    public List<Finding> detect(AuditContext context) {
        ModalResult modal = context.modal();
        Map<String, List<Mode>> places = new LinkedHashMap<>();
        for (Mode mode : modal.modes()) {
            if (mode.isLocal()) {
                places.computeIfAbsent(place(mode), key -> new ArrayList<>()).add(mode);
            }
        }
        List<Finding> findings = new ArrayList<>();
        places.forEach((place, modes) -> findings.add(finding(place, modes, modal)));
        return findings;
    }

    /** The group that the mode is local to, whatever the number of its members; else what its character names. */
    private static String place(Mode mode) {
        String text = mode.character().text().replace(PREFIX, "");
        int group = text.indexOf(OF_GROUP);
        return group < 0 ? ": " + text : " to group " + text.substring(group + OF_GROUP.length());
    }

    private static Finding finding(String place, List<Mode> modes, ModalResult modal) {
        String numbers = Words.numbers(modes.stream().map(Mode::number).toList());
        double largest = 0;
        for (Mode mode : modes) {
            double[] shares = mode.effectiveMassShare();
            largest = Math.max(largest, Math.max(shares[0], Math.max(shares[1], shares[2])));
        }
        boolean one = modes.size() == 1;
        return new Finding(ID, Severity.INFO, objects(modes, modal), (one ? "Mode " + numbers + " is" : "Modes " + numbers + " are")
                + " local" + place + ". " + (one ? "It moves " : "Each moves ") + atMost(largest)
                + " of the mass in X, Y or Z.",
                "Nothing, if that part is meant to be so flexible; otherwise check its sections, connections and mass. Such modes only"
                        + " delay the mass that counts.");
    }

    private static String atMost(double share) {
        return share < SMALLEST_SHOWN / 2 ? "less than " + Figures.percent(SMALLEST_SHOWN) : "at most " + Figures.percent(share);
    }

    private static List<ObjectRef> objects(List<Mode> modes, ModalResult modal) {
        Set<ObjectRef> elements = new LinkedHashSet<>();
        List<ObjectRef> objects = new ArrayList<>();
        Dominance dominance = new Dominance(modal);
        for (Mode mode : modes) {
            dominance.leading(mode.number() - 1, Dominance.Energy.STRAIN, LEADING, ELEMENTS)
                    .forEach(share -> elements.add(Refs.carrier(modal.carriers().get(share.carrier()))));
        }
        elements.stream().limit(ELEMENTS).forEach(objects::add);
        modes.forEach(mode -> objects.add(Refs.mode(mode)));
        return objects;
    }
}
