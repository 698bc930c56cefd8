package org.modewright.modal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.ModeShare;
import org.modewright.modal.Dominance.RollUp;
import org.modewright.modal.Dominance.Share;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.StructuralModel;

/** Shares of energy: sums, sensitivities, rankings and roll-ups. */
class EnergyTest {

    /** Relative step of the finite differences; their error is of its square, some 1e-8 of the slope. */
    private static final double STEP = 1e-4;

    /** A portal of two groups with a heavy beam. */
    private static Structures portal() {
        Structures s = new Structures("portal").material("steel", 2.1e11, 0.3, 7850).section("column", 0.01, 8e-5, 3e-5, 1e-6);
        s.node("a", 0, 0, 0).node("b", 0, 0, 4).node("c", 6, 0, 4).node("d", 6, 0, 0);
        s.support("a", "ux uy uz rx ry rz").support("d", "ux uy uz rx ry rz").level("roof", 4);
        s.member("ab", "a", "b").setGroup(s.group("columns"));
        s.member("dc", "d", "c").setGroup(s.model().getGroups().get(0));
        s.material("concrete", 3e10, 0.2, 2500).section("beam", 0.12, 3e-3, 1e-3, 2e-3);
        s.member("bc", "b", "c").setGroup(s.group("beams"));
        s.mass("b", 2000, 2000, 2000, 0, 0, 0).spring("stop", "c", null, 2e5, 0, 0, 0, 0, 0);
        return s;
    }

    private static int carrier(ModalResult result, String name) {
        for (int i = 0; i < result.carriers().size(); i++) {
            if (result.carriers().get(i).name().equals(name)) {
                return i;
            }
        }
        throw new AssertionError("no carrier " + name);
    }

    @Test
    void sharesSumToOne() {
        ModalResult result = portal().allModes();
        for (int mode = 0; mode < result.modes().size(); mode++) {
            assertEquals(1, sum(result.strainShares(mode)), 1e-12);
            assertEquals(1, sum(result.kineticShares(mode)), 1e-12);
            assertEquals(1, sum(result.modes().get(mode).split()), 1e-12);
        }
    }

    private static double sum(double[] values) {
        double sum = 0;
        for (double value : values) {
            sum += value;
        }
        return sum;
    }

    /** Scaling a part's stiffness by 1 + &epsilon; raises a frequency by 1/2 share &epsilon;. */
    @Test
    void strainShareIsSensitivityToStiffness() {
        ModalResult result = portal().modes(4);
        for (int mode = 0; mode < 4; mode++) {
            double share = result.strainShare(mode, carrier(result, "bc"));
            double slope = (beamScaled(1 + STEP, 1, mode) - beamScaled(1 - STEP, 1, mode)) / (2 * STEP)
                    / result.modes().get(mode).frequency();
            assertEquals(0.5 * share, slope, 1e-6, "mode " + (mode + 1));
        }
    }

    /** Scaling a part's mass by 1 + &epsilon; lowers a frequency by 1/2 share &epsilon;. */
    @Test
    void kineticShareIsSensitivityToMass() {
        ModalResult result = portal().modes(4);
        for (int mode = 0; mode < 4; mode++) {
            double share = result.kineticShare(mode, carrier(result, "bc"));
            double slope = (beamScaled(1, 1 + STEP, mode) - beamScaled(1, 1 - STEP, mode)) / (2 * STEP)
                    / result.modes().get(mode).frequency();
            assertEquals(-0.5 * share, slope, 1e-6, "mode " + (mode + 1));
        }
    }

    private static double beamScaled(double stiffness, double mass, int mode) {
        Structures structures = portal();
        StructuralModel model = structures.model();
        Material concrete = model.getMaterials().get(1);
        concrete.setYoung(stiffness * concrete.getYoung());
        concrete.setDensity(mass * concrete.getDensity());
        return structures.modes(4).modes().get(mode).frequency();
    }

    /** The same for a spring and a nodal mass. */
    @Test
    void sensitivitiesOfSpringAndNodalMass() {
        ModalResult result = portal().modes(2);
        double frequency = result.modes().get(0).frequency();
        Structures stiffer = portal();
        stiffer.model().getSprings().get(0).setUx(2e5 * (1 + STEP));
        Structures softer = portal();
        softer.model().getSprings().get(0).setUx(2e5 * (1 - STEP));
        double slope = (stiffer.modes(1).modes().get(0).frequency() - softer.modes(1).modes().get(0).frequency()) / (2 * STEP) / frequency;
        assertEquals(0.5 * result.strainShare(0, carrier(result, "stop")), slope, 1e-6);
        assertEquals(-0.5 * result.kineticShare(0, carrier(result, "b")),
                (withMass(1 + STEP) - withMass(1 - STEP)) / (2 * STEP) / frequency,
                1e-6);
    }

    private static double withMass(double factor) {
        Structures structures = portal();
        structures.model().getMasses().get(0).setUx(2000 * factor);
        structures.model().getMasses().get(0).setUy(2000 * factor);
        structures.model().getMasses().get(0).setUz(2000 * factor);
        return structures.modes(1).modes().get(0).frequency();
    }

    /** Strain energy includes the geometric stiffness: compression lowers a column's share, and shares still sum to 1. */
    @Test
    void strainEnergyIncludesGeometricStiffness() {
        Structures compressed = portal();
        compressed.model().getMembers().get(0).setAxialForce(-4e5);
        ModalResult with = compressed.modes(3);
        ModalResult without = portal().modes(3);
        int sway = with.modes().get(0).number() - 1;
        assertEquals(1, sum(with.strainShares(sway)), 1e-12);
        assertTrue(with.strainShare(sway, carrier(with, "ab")) < without.strainShare(sway, carrier(without, "ab")) - 1e-3);
    }

    /**
     * d&lambda;/dk<sub>j</sub> = (&phi;<sub>j</sub> &minus; &phi;<sub>j-1</sub>)&sup2; = share &lambda;/k and d&lambda;/dm<sub>j</sub> =
     * &minus;&lambda;&phi;<sub>j</sub>&sup2; = &minus;share &lambda;/m: R. L. Fox and M. P. Kapoor, AIAA Journal 6 (1968) 2426-2429;
     * uniform five-storey frame, k = 100, m = 1, first and fifth mode (from memory, recomputed).
     */
    @Test
    void eigenvalueDerivativesOfTheUniformFrame() {
        ModalResult result = Structures.chain(new double[] {1, 1, 1, 1, 1}, new double[] {100, 100, 100, 100, 100}).allModes();
        double[][] byStiffness = {{0.028862994030694235, 0.024375813605183212, 0.016826100834358978, 0.00861083617923691,
            0.002338308121531873}, {0.10628817945420235, 0.7648331751186055, 1.3119721309911165, 1.1080066082619484, 0.39140697183648965}};
        double[][] byMass = {{-0.23383081215318754, -0.8610836179236828, -1.6826100834358961, -2.437581360518329, -2.8862994030694398},
            {-39.14069718364892, -110.80066082619479, -131.1972130991116, -76.48331751186053, -10.628817945420248}};
        int[] modes = {0, 4};
        for (int i = 0; i < 2; i++) {
            double eigenvalue = result.modes().get(modes[i]).eigenvalue();
            for (int storey = 0; storey < 5; storey++) {
                assertEquals(byStiffness[i][storey],
                        result.strainShare(modes[i], carrier(result, "storey " + (storey + 1))) * eigenvalue / 100, 1e-11);
                assertEquals(byMass[i][storey], -result.kineticShare(modes[i], carrier(result, "floor " + (storey + 1))) * eigenvalue,
                        1e-9);
            }
        }
    }

    @Test
    void rankingDescendsAndRuns() {
        ModalResult result = portal().modes(3);
        List<Share> rows = new Dominance(result).ranked(0, Energy.STRAIN, RollUp.ELEMENT);
        double running = 0;
        double last = Double.POSITIVE_INFINITY;
        for (Share row : rows) {
            running += row.share();
            assertEquals(running, row.running(), 1e-15);
            assertTrue(row.share() <= last);
            assertEquals(result.carriers().get(row.carrier()).id(), row.elementId());
            last = row.share();
        }
        assertEquals(1, running, 1e-12);
    }

    @Test
    void rollUpsSumTheirElements() {
        ModalResult result = portal().modes(3);
        Dominance dominance = new Dominance(result);
        for (RollUp by : List.of(RollUp.GROUP, RollUp.LEVEL, RollUp.SECTION, RollUp.MATERIAL)) {
            List<Share> rows = dominance.ranked(1, Energy.KINETIC, by);
            assertEquals(1, rows.get(rows.size() - 1).running(), 1e-12);
            assertNull(rows.get(0).elementId());
        }
        double columns = result.strainShare(0, carrier(result, "ab")) + result.strainShare(0, carrier(result, "dc"));
        Share group = dominance.ranked(0, Energy.STRAIN, RollUp.GROUP).stream().filter(row -> row.label().equals("columns")).findFirst()
                .orElseThrow();
        assertEquals(columns, group.share(), 1e-15);
        assertEquals("roof", dominance.ranked(0, Energy.KINETIC, RollUp.LEVEL).get(0).label());
    }

    @Test
    void leadingStopsAtShareOrCount() {
        ModalResult result = portal().modes(3);
        Dominance dominance = new Dominance(result);
        List<Share> leading = dominance.leading(0, Energy.STRAIN, 0.8, 20);
        assertTrue(leading.get(leading.size() - 1).running() >= 0.8);
        assertTrue(leading.size() == 1 || leading.get(leading.size() - 2).running() < 0.8);
        assertEquals(1, dominance.leading(0, Energy.STRAIN, 0.999, 1).size());
    }

    @Test
    void modesOfAnElement() {
        ModalResult result = portal().modes(6);
        String stop = result.carriers().get(carrier(result, "stop")).id();
        List<ModeShare> modes = new Dominance(result).modesOf(Set.of(stop), 0.01);
        for (int mode = 0; mode < 6; mode++) {
            double share = result.strainShare(mode, carrier(result, "stop"));
            int wanted = mode;
            assertEquals(share >= 0.01, modes.stream().anyMatch(row -> row.mode() == wanted), "mode " + (mode + 1));
        }
        assertEquals(List.of(), new Dominance(result).modesOf(Set.of("nothing"), 0));
    }

    @Test
    void resultGivesCopies() {
        ModalResult result = portal().modes(2);
        double[] shape = result.shape(0);
        double[] shares = result.strainShares(0);
        double[] mass = result.modes().get(0).effectiveMassShare();
        double[] before = shape.clone();
        shape[7] = 99;
        shares[0] = 99;
        mass[0] = 99;
        assertArrayEquals(before, result.shape(0));
        assertTrue(result.strainShare(0, 0) < 1);
        assertTrue(result.modes().get(0).effectiveMassShare(Direction.X) < 2);
    }
}
