package org.modewright.modal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.modewright.fem.Carrier;
import org.modewright.fem.Kind;

/** Which elements make a mode what it is, and which modes an element takes part in. Reads a {@link ModalResult}, changes nothing. */
public final class Dominance {

    /** Kinds of energy. */
    public enum Energy { STRAIN, KINETIC }

    /** What the carriers' shares are summed over. */
    public enum RollUp { ELEMENT, GROUP, LEVEL, SECTION, MATERIAL }

    /**
     * A row of a ranking.
     *
     * @param label name of the element, group, level, section or material; empty where the carriers have none
     * @param kind kind of the element; null for a roll-up
     * @param elementId id of the element; null for a roll-up
     * @param carrier index of the carrier; -1 for a roll-up
     * @param share share of the mode's energy
     * @param running sum of the shares up to and including this row
     */
    public record Share(String label, Kind kind, String elementId, int carrier, double share, double running) {
    }

    /**
     * What some elements hold of a mode's energies.
     *
     * @param mode index of the mode
     * @param strain their share of its strain energy
     * @param kinetic their share of its kinetic energy
     */
    public record ModeShare(int mode, double strain, double kinetic) {
    }

    private final ModalResult result;

    public Dominance(ModalResult result) {
        this.result = result;
    }

    /** All carriers, or all groups, levels, sections or materials, that hold energy of a mode, the largest share first. */
    public List<Share> ranked(int mode, Energy energy, RollUp by) {
        double[] shares = shares(mode, energy);
        return by == RollUp.ELEMENT ? rankedElements(shares) : rankedSums(shares, by);
    }

    /**
     * The leading carriers of a mode that together hold a share of its energy: at least one (where there is energy), at most so many.
     */
    public List<Share> leading(int mode, Energy energy, double share, int most) {
        List<Share> leading = new ArrayList<>();
        for (Share row : ranked(mode, energy, RollUp.ELEMENT)) {
            leading.add(row);
            if (row.running() >= share || leading.size() >= most) {
                break;
            }
        }
        return leading;
    }

    /** The modes in which some elements together hold at least a share of the strain or of the kinetic energy, in order. */
    public List<ModeShare> modesOf(Set<String> elementIds, double minShare) {
        List<Integer> wanted = new ArrayList<>();
        List<Carrier> carriers = result.carriers();
        for (int i = 0; i < carriers.size(); i++) {
            if (elementIds.contains(carriers.get(i).id())) {
                wanted.add(i);
            }
        }
        List<ModeShare> found = new ArrayList<>();
        for (int mode = 0; mode < result.modes().size(); mode++) {
            double strain = 0;
            double kinetic = 0;
            for (int carrier : wanted) {
                strain += result.strainShare(mode, carrier);
                kinetic += result.kineticShare(mode, carrier);
            }
            if (Math.max(strain, kinetic) >= minShare && !wanted.isEmpty()) {
                found.add(new ModeShare(mode, strain, kinetic));
            }
        }
        return found;
    }

    private double[] shares(int mode, Energy energy) {
        return energy == Energy.STRAIN ? result.strainShares(mode) : result.kineticShares(mode);
    }

    private List<Share> rankedElements(double[] shares) {
        List<Share> rows = new ArrayList<>();
        for (int i = 0; i < shares.length; i++) {
            if (shares[i] != 0) {
                Carrier carrier = result.carriers().get(i);
                rows.add(new Share(carrier.name(), carrier.kind(), carrier.id(), i, shares[i], 0));
            }
        }
        return descending(rows);
    }

    private List<Share> rankedSums(double[] shares, RollUp by) {
        Map<String, Double> sums = new LinkedHashMap<>();
        for (int i = 0; i < shares.length; i++) {
            if (shares[i] != 0) {
                sums.merge(label(result.carriers().get(i), by), shares[i], Double::sum);
            }
        }
        List<Share> rows = new ArrayList<>();
        sums.forEach((label, share) -> rows.add(new Share(label, null, null, -1, share, 0)));
        return descending(rows);
    }

    /** What a carrier is summed under in a roll-up; empty where it has none. */
    public static String label(Carrier carrier, RollUp by) {
        String label = switch (by) {
            case ELEMENT -> carrier.name();
            case GROUP -> carrier.group();
            case LEVEL -> carrier.level();
            case SECTION -> carrier.section();
            case MATERIAL -> carrier.material();
        };
        return label == null ? "" : label;
    }

    private static List<Share> descending(List<Share> rows) {
        rows.sort(Comparator.comparingDouble(Share::share).reversed());
        List<Share> ranked = new ArrayList<>(rows.size());
        double running = 0;
        for (Share row : rows) {
            running += row.share();
            ranked.add(new Share(row.label(), row.kind(), row.elementId(), row.carrier(), row.share(), running));
        }
        return ranked;
    }
}
