package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.modewright.fem.Carrier;
import org.modewright.fem.Kind;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.RollUp;
import org.modewright.modal.Dominance.Share;
import org.modewright.modal.ModalResult;

/**
 * An element, group, level, section or material with its shares of both energies of a mode.
 *
 * @param label its name; empty for carriers without one in a roll-up
 * @param kind kind of the element; null for a roll-up
 * @param elementId id of the element; null for a roll-up
 * @param strain share of the strain energy
 * @param kinetic share of the kinetic energy
 * @param running sum of the ranked share up to and including this row
 */
public record DominanceRow(String label, Kind kind, String elementId, double strain, double kinetic, double running) {

    private record Key(String label, int carrier) {
    }

    /** Ids of the elements that a row stands for: its own, or those of all carriers with its label. */
    public Set<String> elementIds(ModalResult result, RollUp by) {
        if (elementId != null) {
            return Set.of(elementId);
        }
        return result.carriers().stream().filter(carrier -> label.equals(Dominance.label(carrier, by))).map(Carrier::id)
                .collect(Collectors.toSet());
    }

    /** The rows of a mode, the largest share of the ranking energy first. */
    public static List<DominanceRow> of(ModalResult result, int mode, RollUp by, Energy rankedBy) {
        Dominance dominance = new Dominance(result);
        Map<Key, Share[]> pairs = new LinkedHashMap<>();
        collect(pairs, dominance.ranked(mode, Energy.STRAIN, by), 0);
        collect(pairs, dominance.ranked(mode, Energy.KINETIC, by), 1);
        List<DominanceRow> rows = new ArrayList<>(pairs.size());
        pairs.values().forEach(pair -> rows.add(merge(pair)));
        Comparator<DominanceRow> order = Comparator.comparingDouble(rankedBy == Energy.STRAIN ? DominanceRow::strain
                : DominanceRow::kinetic);
        rows.sort(order.reversed());
        return withRunning(rows, rankedBy);
    }

    private static void collect(Map<Key, Share[]> pairs, List<Share> shares, int side) {
        for (Share share : shares) {
            pairs.computeIfAbsent(new Key(share.label(), share.carrier()), key -> new Share[2])[side] = share;
        }
    }

    private static DominanceRow merge(Share[] pair) {
        Share any = pair[0] == null ? pair[1] : pair[0];
        return new DominanceRow(any.label(), any.kind(), any.elementId(), pair[0] == null ? 0 : pair[0].share(),
                pair[1] == null ? 0 : pair[1].share(), 0);
    }

    private static List<DominanceRow> withRunning(List<DominanceRow> rows, Energy rankedBy) {
        List<DominanceRow> complete = new ArrayList<>(rows.size());
        double running = 0;
        for (DominanceRow row : rows) {
            running += rankedBy == Energy.STRAIN ? row.strain : row.kinetic;
            complete.add(new DominanceRow(row.label, row.kind, row.elementId, row.strain, row.kinetic, running));
        }
        return complete;
    }
}
