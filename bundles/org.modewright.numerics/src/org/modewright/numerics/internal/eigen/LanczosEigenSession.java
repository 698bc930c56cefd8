package org.modewright.numerics.internal.eigen;

import java.util.Arrays;

import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SpectrumCertificate;

/**
 * Block Lanczos on A = (K - &sigma;M)<sup>-1</sup>M. After convergence an inertia count just above the last value tells whether values
 * are missing; if so, random directions are added and the iteration goes on until the count is met.
 */
final class LanczosEigenSession extends CertifiedSession {

    private static final int BLOCK = 4;
    private static final int SMALLEST_CAPACITY = 200;
    private static final double CAPACITY_FACTOR = 1.7;
    private static final double TOLERANCE = 1e-11;
    private static final int LARGEST_HUNT = 12;
    private static final int EXPANSIONS_PER_CHECK = 8;

    private final int rank;
    private final LanczosBasis basis;
    private EigenPairs known;
    private double nextEstimate = Double.POSITIVE_INFINITY;
    private int demanded;

    LanczosEigenSession(ShiftedProblem shifted, int rank) {
        super(shifted);
        this.rank = rank;
        this.basis = new LanczosBasis(shifted, rank);
        this.known = new EigenPairs(new double[0], new double[0][], new double[0], new double[0], rank == 0);
    }

    @Override
    EigenPairs known() {
        return known;
    }

    @Override
    double nextEstimate() {
        return nextEstimate;
    }

    @Override
    public int finiteEigenvalueCount() {
        return rank;
    }

    @Override
    public EigenPairs solve(EigenRequest request, Progress progress) {
        int limit = Math.min(request.count(), rank);
        if (Double.isFinite(request.below()) && limit > 0) {
            double spacing = 1e-9 * Math.abs(request.below() - shifted().shift());
            limit = Math.min(limit, shifted().count(request.below(), spacing, progress).below());
        }
        if (limit > known.count()) {
            extend(limit, progress);
        }
        return answer(Math.min(request.count(), limit), request.below());
    }

    /** Never complete where the iteration ended with fewer pairs than were asked for. */
    @Override
    public SpectrumCertificate certify(EigenPairs pairs, Progress progress) {
        SpectrumCertificate certificate = super.certify(pairs, progress);
        boolean cutShort = known.count() < demanded && pairs.count() == known.count();
        return cutShort ? new SpectrumCertificate(false, certificate.shift(), certificate.counted(), certificate.found(),
                certificate.worstResidual(), certificate.worstOrthogonality()) : certificate;
    }

    private void extend(int limit, Progress progress) {
        demanded = Math.max(demanded, limit);
        int wanted = limit;
        for (int hunt = 0; ; ) {
            RitzPairs ritz = converge(wanted, limit, progress);
            double[] values = ritz.eigenvalues(shifted().shift());
            int converged = ritz.converged(TOLERANCE, shifted().shift());
            int end = SpectralGap.endOfCluster(values, Math.min(limit, values.length) - 1, shifted().shift());
            if (end + 1 > converged && converged >= wanted) {
                wanted = Math.min(rank, end + 1);
                continue;
            }
            end = Math.min(end, converged - 1);
            double next = end + 1 < values.length ? values[end + 1] : Double.POSITIVE_INFINITY;
            int missing = end < 0 ? limit : countAbove(values[end], next, progress).below() - (end + 1);
            if (missing <= 0 || hunt == LARGEST_HUNT || basis.isFull()) {
                keep(ritz, end + 1, next, progress);
                return;
            }
            hunt++;
            progress.report("Searching for " + missing + " missing modes", Double.NaN);
            basis.inject(BLOCK);
            wanted = Math.min(rank, Math.max(wanted, end + 1 + missing));
        }
    }

    private void keep(RitzPairs ritz, int count, double next, Progress progress) {
        double[] theta = Arrays.copyOf(ritz.theta(), count);
        double[][] vectors = basis.purifiedVectors(ritz, count, progress);
        if (count > 0) {
            new GradedRefinement(shifted().problem().mass(), shifted()::apply, progress).refine(theta, vectors);
        }
        double[] values = Arrays.stream(theta).map(value -> shifted().shift() + 1.0 / value).toArray();
        EigenPairs assembled = new EigenPairAssembly(shifted()).assemble(values, vectors, count == rank, progress);
        known = assembled;
        nextEstimate = next;
    }

    /** Iterates until so many leading Ritz pairs have converged, or the basis spans everything. */
    private RitzPairs converge(int wanted, int asked, Progress progress) {
        int capacity = (int) Math.min(rank, Math.max(SMALLEST_CAPACITY, CAPACITY_FACTOR * wanted + 2 * BLOCK));
        int enough = Math.min(rank, wanted + wanted / 4 + BLOCK);
        if (basis.nextSize() == 0) {
            basis.inject(BLOCK);
        }
        if (basis.size() >= capacity && !basis.isFull()) {
            restart(basis.ritzPairs(progress), wanted, capacity);
        }
        while (true) {
            int step = Math.max(EXPANSIONS_PER_CHECK * BLOCK, basis.size() / EXPANSIONS_PER_CHECK);
            grow(Math.min(capacity, Math.max(enough, basis.size() + step)), progress);
            RitzPairs ritz = basis.ritzPairs(progress);
            int converged = ritz.converged(TOLERANCE, shifted().shift());
            progress.report("Converged modes: " + Math.min(converged, asked) + " of " + asked, Math.min(1.0, (double) converged / wanted));
            if (converged >= wanted || basis.nextSize() == 0 && !basis.inject(BLOCK)) {
                return ritz;
            }
            if (basis.size() >= capacity) {
                restart(ritz, wanted, capacity);
            }
        }
    }

    private void restart(RitzPairs ritz, int wanted, int capacity) {
        basis.restart(ritz, Math.min(basis.size() - BLOCK, wanted + (capacity - wanted) / 2));
    }

    private void grow(int target, Progress progress) {
        while (basis.size() < target && basis.nextSize() > 0) {
            progress.checkCancelled();
            basis.expand();
        }
    }
}
