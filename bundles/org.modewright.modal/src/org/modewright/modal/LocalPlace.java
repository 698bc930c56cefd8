package org.modewright.modal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.modewright.fem.Carrier;
import org.modewright.fem.Kind;
import org.modewright.fem.NodePoint;

/**
 * Says where a local mode is: "3 members of group roof mast". The leading elements are those that together hold four fifths of the mode's
 * strain energy; the group that holds most of it names the place.
 */
final class LocalPlace implements Characterisation.LocalWords {

    private static final double LEADING = 0.8;
    private static final int NAMED = 3;

    private final List<Carrier> carriers;
    private final List<NodePoint> nodes;
    private final double[] strain;
    private final double[] kinetic;

    LocalPlace(List<Carrier> carriers, List<NodePoint> nodes, double[] strain, double[] kinetic) {
        this.carriers = carriers;
        this.nodes = nodes;
        this.strain = strain;
        this.kinetic = kinetic;
    }

    @Override
    public String text() {
        List<Integer> leading = leading();
        if (leading.isEmpty()) {
            return "nodes without strain energy";
        }
        String group = leadingGroup();
        List<Integer> grouped = leading.stream().filter(i -> group != null && group.equals(carriers.get(i).group())).toList();
        return grouped.isEmpty() ? named(leading) : counted(grouped) + " of group " + group;
    }

    private List<Integer> leading() {
        List<Integer> order = IntStream.range(0, strain.length).filter(i -> strain[i] > 0).boxed()
                .sorted(Comparator.comparingDouble((Integer i) -> strain[i]).reversed()).toList();
        List<Integer> leading = new ArrayList<>();
        double sum = 0;
        for (int i : order) {
            if (sum >= LEADING) {
                break;
            }
            leading.add(i);
            sum += strain[i];
        }
        return leading;
    }

    /** The group with the largest share of both energies, if it holds a quarter of their sum. */
    private String leadingGroup() {
        Map<String, Double> sums = new LinkedHashMap<>();
        for (int i = 0; i < strain.length; i++) {
            String group = carriers.get(i).group();
            if (group != null && !group.isBlank()) {
                sums.merge(group, strain[i] + kinetic[i], Double::sum);
            }
        }
        return sums.entrySet().stream().filter(entry -> entry.getValue() >= 0.5).max(Map.Entry.comparingByValue())
                .map(Map.Entry::getKey).orElse(null);
    }

    private String counted(List<Integer> indices) {
        Map<Kind, Long> counts = indices.stream().collect(Collectors.groupingBy(i -> carriers.get(i).kind(), LinkedHashMap::new,
                Collectors.counting()));
        return counts.entrySet().stream().map(entry -> Figures.count(entry.getValue().intValue(), entry.getKey().word(),
                entry.getKey().word() + "s")).collect(Collectors.joining(" and "));
    }

    private String named(List<Integer> indices) {
        if (indices.size() <= NAMED) {
            return indices.stream().map(i -> carriers.get(i).kind().word() + " " + carriers.get(i).name())
                    .collect(Collectors.joining(", "));
        }
        return counted(indices) + " at node " + mostMovingNode();
    }

    private String mostMovingNode() {
        double[] moving = new double[nodes.size()];
        for (int i = 0; i < kinetic.length; i++) {
            for (int node : carriers.get(i).nodes()) {
                moving[node] += kinetic[i] / carriers.get(i).nodes().length;
            }
        }
        int most = IntStream.range(0, moving.length).boxed().max(Comparator.comparingDouble(i -> moving[i])).orElse(0);
        return nodes.get(most).name();
    }
}
