package org.modewright.modal;

import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenRequest;

/** How many modes a run asks for at first, and how it goes on: in steps that double, up to the limit. */
final class SolveOn {

    private static final int FIRST_STEP = 12;

    private final ModalRequest request;
    private final double below;

    SolveOn(ModalRequest request) {
        this.request = request;
        below = request.belowHz() > 0 ? Spectrum.eigenvalue(request.belowHz()) : Double.POSITIVE_INFINITY;
    }

    /** The first request to a structure with so many degrees of freedom. */
    EigenRequest first(int order) {
        return request(firstCount(), order);
    }

    private int firstCount() {
        if (request.modes() > 0) {
            return request.modes();
        }
        return request.belowHz() > 0 ? request.limit() : Math.min(FIRST_STEP, request.limit());
    }

    /** Whether the number of modes is left to the run. */
    boolean isOpen() {
        return request.modes() == 0 && request.belowHz() == 0 && request.target() != null;
    }

    /** Whether these are as many as the run may find. */
    boolean isAtLimit(EigenPairs pairs) {
        return request.modes() == 0 && pairs.count() >= request.limit() && !pairs.exhausted();
    }

    /** The next, larger request. */
    EigenRequest next(EigenPairs pairs, int order) {
        return request(Math.min(request.limit(), 2 * pairs.count()), order);
    }

    private EigenRequest request(int count, int order) {
        return new EigenRequest(Math.min(count, order), below);
    }
}
