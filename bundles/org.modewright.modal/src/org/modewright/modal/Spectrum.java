package org.modewright.modal;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.EigenRequest;
import org.modewright.numerics.EigenSession;
import org.modewright.numerics.EigenSolvers;
import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Factoriser;
import org.modewright.numerics.Factorisers;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SpectrumCertificate;
import org.modewright.numerics.SymmetricMatrix;

/** The lower part of a pencil's spectrum, found in steps, with its certificate. */
final class Spectrum implements AutoCloseable {

    private static final EigenPairs NONE = new EigenPairs(new double[0], new double[0][], new double[0], new double[0], true);

    private static final int RIGID_MOTIONS = 6;

    private final int order;
    private final EigenProblem problem;
    private final EigenSession session;
    private double below = Double.POSITIVE_INFINITY;
    private final List<String> remarks = new ArrayList<>();
    private EigenPairs pairs = NONE;

    private Spectrum(int order, EigenProblem problem, EigenSession session) {
        this.order = order;
        this.problem = problem;
        this.session = session;
    }

    static Spectrum open(SymmetricMatrix stiffness, SymmetricMatrix mass, Progress progress) {
        int order = stiffness.order();
        if (order == 0) {
            return new Spectrum(0, null, null);
        }
        EigenProblem problem = new EigenProblem(stiffness, mass);
        return new Spectrum(order, problem, EigenSolvers.forOrder(order).open(problem, progress));
    }

    /** &lambda; = (2&pi;f)&sup2;. */
    static double eigenvalue(double frequency) {
        double circular = 2 * Math.PI * frequency;
        return circular * circular;
    }

    /** f = &radic;&lambda;/2&pi;; 0 where &lambda; is not positive. */
    static double frequency(double eigenvalue) {
        return eigenvalue > 0 ? Math.sqrt(eigenvalue) / (2 * Math.PI) : 0;
    }

    /** Solves, and solves on in steps while the pairs are not enough and the policy leaves the number open. */
    void solve(SolveOn policy, Predicate<EigenPairs> enough, Progress progress) {
        if (session == null) {
            remarks.add("The structure has no free motion with mass, so it has no modes.");
            return;
        }
        EigenRequest request = policy.first(order);
        below = request.below();
        pairs = session.solve(request, progress);
        int asked = request.count();
        while (policy.isOpen() && !pairs.exhausted() && pairs.count() < order && !policy.isAtLimit(pairs) && !enough.test(pairs)) {
            progress.checkCancelled();
            request = policy.next(pairs, order);
            pairs = session.solve(request, progress);
        }
        remark(policy, enough, asked);
    }

    private void remark(SolveOn policy, Predicate<EigenPairs> enough, int asked) {
        boolean met = !policy.isOpen() || enough.test(pairs);
        if (pairs.count() > asked) {
            remarks.add("The first " + Figures.count(asked, "mode", "modes") + " did not reach the target; solved on to " + pairs.count()
                    + (met ? ", which do." : "."));
        }
        if (policy.isAtLimit(pairs) && (policy.isOpen() ? !met : true)) {
            remarks.add("Stopped at the limit of " + Figures.count(pairs.count(), "mode", "modes") + (policy.isOpen()
                    ? " before the target was reached." : "."));
        } else if (pairs.exhausted() && pairs.count() > 0) {
            remarks.add("These are all the modes that the model has: " + pairs.count() + ".");
        }
    }

    EigenPairs pairs() {
        return pairs;
    }

    /** The pairs, and beyond their number as many as it takes to have every eigenvalue that is not positive. */
    EigenPairs throughZero(Progress progress) {
        EigenPairs all = pairs;
        while (all.count() > 0 && all.values()[all.count() - 1] <= 0 && !all.exhausted() && all.count() < order) {
            int more = Math.min(order, all.count() + RIGID_MOTIONS + 1);
            all = session.solve(new EigenRequest(more, Double.POSITIVE_INFINITY), progress);
        }
        return all;
    }

    List<String> remarks() {
        return remarks;
    }

    /** The inertia count above the last pair; without pairs, below the limit that was asked for. */
    Certificate certify(Progress progress) {
        if (session == null) {
            return Certificate.EMPTY;
        }
        if (pairs.count() == 0) {
            return Double.isFinite(below) ? noneBelowTheLimit(progress) : Certificate.EMPTY;
        }
        SpectrumCertificate proof = session.certify(pairs, progress);
        return new Certificate(proof.complete(), frequency(proof.shift()), proof.counted(), proof.found(), proof.worstResidual(),
                proof.worstOrthogonality());
    }

    /** That there is no mode below the limit asked for is counted too. */
    private Certificate noneBelowTheLimit(Progress progress) {
        Factoriser factoriser = Factorisers.sparse(problem, progress);
        try (Factorisation factors = factoriser.factorise(problem.stiffness(), problem.mass(), below, progress)) {
            int counted = factors.inertia().negative();
            return new Certificate(counted == 0, frequency(below), counted, 0, 0, 0);
        }
    }

    @Override
    public void close() {
        if (session != null) {
            session.close();
        }
    }
}
