package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenSession;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SpectrumCertificate;

/** What the sessions have in common: an ascending list of known pairs, answers cut from it, and the certificate. */
abstract class CertifiedSession implements EigenSession {

    private static final double SAME = 1e-8;

    private final ShiftedProblem shifted;
    private final Certifier certifier;
    private double countedAt = Double.NaN;
    private ShiftedProblem.Count lastCount;

    CertifiedSession(ShiftedProblem shifted) {
        this.shifted = shifted;
        this.certifier = new Certifier(shifted);
    }

    /** The pairs known so far, ascending from the lowest; whole clusters. */
    abstract EigenPairs known();

    /** Estimate of the first eigenvalue beyond the known ones; infinite if there is none. */
    abstract double nextEstimate();

    ShiftedProblem shifted() {
        return shifted;
    }

    /** The first known pairs below a limit. */
    EigenPairs answer(int atMost, double below) {
        EigenPairs known = known();
        int count = 0;
        while (count < Math.min(atMost, known.count()) && known.values()[count] < below) {
            count++;
        }
        return new EigenPairs(Arrays.copyOf(known.values(), count), Arrays.copyOf(known.vectors(), count),
                Arrays.copyOf(known.residuals(), count), Arrays.copyOf(known.errorBounds(), count),
                count == known.count() && known.exhausted());
    }

    ShiftedProblem.Count countAbove(double last, double next, Progress progress) {
        double at = SpectralGap.above(last, next, shifted.shift());
        if (at != countedAt) {
            lastCount = shifted.count(at, 0.5 * (at - last), progress);
            countedAt = at;
        }
        return lastCount;
    }

    @Override
    public SpectrumCertificate certify(EigenPairs pairs, Progress progress) {
        progress.report("Counting the modes by inertia", Double.NaN);
        double[] values = known().values();
        if (pairs.count() == 0 || values.length == 0) {
            double at = values.length == 0 ? shifted.shift() : values[0] - 0.5 * (values[0] - shifted.shift());
            return certifier.certify(pairs, 0, shifted.count(at, 0.0, progress), progress);
        }
        int last = indexOfLast(pairs, values);
        int end = SpectralGap.endOfCluster(values, last, shifted.shift());
        double next = end + 1 < values.length ? values[end + 1] : nextEstimate();
        double top = Math.max(values[end], pairs.values()[pairs.count() - 1]);
        return certifier.certify(pairs, end - last, countAbove(top, Math.max(next, top), progress), progress);
    }

    /** Index of the last of the pairs among the known values. */
    private int indexOfLast(EigenPairs pairs, double[] values) {
        double last = pairs.values()[pairs.count() - 1];
        double tolerance = SAME * Math.abs(last - shifted.shift());
        int own = pairs.count() - 1;
        if (own < values.length && Math.abs(values[own] - last) <= tolerance) {
            return own;
        }
        int index = 0;
        while (index + 1 < values.length && values[index + 1] <= last + tolerance) {
            index++;
        }
        return index;
    }
}
