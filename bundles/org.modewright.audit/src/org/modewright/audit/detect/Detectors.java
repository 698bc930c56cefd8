package org.modewright.audit.detect;

import java.util.List;
import org.modewright.audit.AuditContext;
import org.modewright.audit.Finding;
import org.modewright.audit.FindingDetector;
import org.modewright.audit.ModelFindings;

/** The built-in detectors. */
public final class Detectors {

    private Detectors() {
    }

    /** All of them, in the order in which equally grave findings are listed. */
    public static List<FindingDetector> builtIn() {
        return List.of(Detectors::modelAlone, new Unstable(), new IncompleteModes(), new MassAccount(), new ShortCapture(),
                new TorsionFirst(), new CloseModes(), new LocalModes(), new DroppedMotions());
    }

    private static List<Finding> modelAlone(AuditContext context) {
        return ModelFindings.of(context.snapshot(), context.thresholds());
    }
}
