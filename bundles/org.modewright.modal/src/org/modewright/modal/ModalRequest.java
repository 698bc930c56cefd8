package org.modewright.modal;

import java.util.Objects;

/**
 * What a modal run is asked for.
 *
 * @param modes number of modes, exact (all there are where there are fewer); 0: as many as the target needs
 * @param belowHz only modes below this frequency, Hz; 0: no such limit. Without a number of modes all below it are found, up to the limit
 * @param target until when an open number of modes goes on; null: the first twelve
 * @param limit the most modes of an open number
 * @param threads threads that may be used, at least 1
 * @param rules limits of the modes' characters
 */
public record ModalRequest(int modes, double belowHz, CaptureTarget target, int limit, int threads, CharacterRules rules) {

    /** The most modes of an open number, as the command line states it. */
    public static final int DEFAULT_LIMIT = 500;

    public ModalRequest {
        if (modes < 0) {
            throw new IllegalArgumentException("The number of modes is " + modes + "; it must be 1 or more, or 0 for as many as needed.");
        }
        if (!(belowHz >= 0) || Double.isInfinite(belowHz)) {
            throw new IllegalArgumentException("The frequency limit is " + belowHz + " Hz; it must be above 0, or 0 for none.");
        }
        if (limit < 1 || threads < 1) {
            throw new IllegalArgumentException("The limit of modes and the number of threads must be 1 or more, not " + limit + " and "
                    + threads + ".");
        }
        Objects.requireNonNull(rules, "rules");
    }

    /** A request with the default rules of characters. */
    public ModalRequest(int modes, double belowHz, CaptureTarget target, int limit, int threads) {
        this(modes, belowHz, target, limit, threads, CharacterRules.DEFAULT);
    }

    /** So many modes, exactly. */
    public static ModalRequest ofModes(int modes) {
        return new ModalRequest(modes, 0, null, DEFAULT_LIMIT, 1);
    }

    /** As many modes as there are, whatever their number. */
    public static ModalRequest ofAllModes() {
        return ofModes(Integer.MAX_VALUE);
    }

    /** As many modes as the target needs, up to the default limit. */
    public static ModalRequest of(CaptureTarget target) {
        return new ModalRequest(0, 0, target, DEFAULT_LIMIT, 1);
    }
}
