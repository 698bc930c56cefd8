package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Collectors;
import org.eclipse.osgi.util.NLS;
import org.modewright.fem.Carrier;
import org.modewright.fem.Kind;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.ModeShare;
import org.modewright.modal.Dominance.RollUp;
import org.modewright.modal.Dominance.Share;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.ui.widgets.Numbers;

/**
 * What makes a mode so, in one sentence: "Mode 3, 0.412 s: 81.2 % of the strain energy in 6 members of group east braces; 92.0 % of the
 * moving mass in 40 nodes on levels 4 and 5".
 */
public final class DominanceSentence {

    private static final double MOST_OF_IT = 0.8;
    private static final int FEW = 3;

    /** A level called "2" or "L2" is spoken of as level 2; one called "roof" or "floor 2" by its name alone. */
    private static final int LONGEST_NUMBER = 3;

    private DominanceSentence() {
    }

    public static String of(ModalResult result, int index) {
        Mode mode = result.modes().get(index);
        Dominance dominance = new Dominance(result);
        List<Share> strain = dominance.leading(index, Energy.STRAIN, MOST_OF_IT, Integer.MAX_VALUE);
        List<Share> kinetic = dominance.leading(index, Energy.KINETIC, MOST_OF_IT, Integer.MAX_VALUE);
        String where = places(dominance, index);
        if (strain.isEmpty()) {
            return kinetic.isEmpty() ? "" : NLS.bind(Messages.Dominance_rigidSentence,
                    new Object[] {mode.number(), total(kinetic), counted(kinetic), where});
        }
        String first = NLS.bind(Messages.Dominance_strainSentence,
                new Object[] {mode.number(), Numbers.period(mode.period()), total(strain), counted(strain) + commonGroup(result, strain)});
        return first + (kinetic.isEmpty() ? "" : NLS.bind(Messages.Dominance_kineticSentence,
                new Object[] {total(kinetic), counted(kinetic), where}));
    }

    /** The modes in which the selected elements take part, in one sentence. */
    public static String modesOf(ModalResult result, Set<String> elementIds, double share, List<ModeShare> modes) {
        if (elementIds.isEmpty()) {
            return Messages.Dominance_modesOfNothing;
        }
        String who = who(result, elementIds);
        boolean one = elementIds.size() == 1;
        if (modes.isEmpty()) {
            return NLS.bind(one ? Messages.Dominance_modesOfNone : Messages.Dominance_modesOfNoneTogether, who, Numbers.percent(share));
        }
        return NLS.bind(one ? Messages.Dominance_modesOf : Messages.Dominance_modesOfTogether,
                new Object[] {who, Numbers.percent(share), modes.size(), result.modes().size()});
    }

    private static String who(ModalResult result, Set<String> elementIds) {
        List<String> names = new ArrayList<>();
        for (Carrier carrier : result.carriers()) {
            if (elementIds.contains(carrier.id())) {
                names.add(carrier.kind().word() + " " + carrier.name());
            }
        }
        if (names.size() != elementIds.size() || names.size() > FEW) {
            return NLS.bind(Messages.Dominance_selected, Numbers.counted(elementIds.size(), Messages.Dominance_selectedOne,
                    Messages.Dominance_selectedMany));
        }
        String who = String.join(", ", names);
        return Character.toUpperCase(who.charAt(0)) + who.substring(1);
    }

    private static String total(List<Share> shares) {
        return Numbers.percent(shares.get(shares.size() - 1).running());
    }

    private static String counted(List<Share> shares) {
        Set<Kind> kinds = shares.stream().map(Share::kind).collect(Collectors.toSet());
        String word = kinds.size() == 1 ? kinds.iterator().next().word() : "element";
        if (shares.size() == 1) {
            return word + " " + shares.get(0).label();
        }
        return NLS.bind(Messages.Dominance_many, Numbers.count(shares.size()), word);
    }

    private static String commonGroup(ModalResult result, List<Share> shares) {
        Set<String> groups = shares.stream().map(share -> Objects.requireNonNullElse(result.carriers().get(share.carrier()).group(), ""))
                .collect(Collectors.toSet());
        String group = groups.size() == 1 ? groups.iterator().next() : "";
        return group.isEmpty() ? "" : NLS.bind(Messages.Dominance_ofGroup, group);
    }

    /** The levels that hold most of the moving mass, where they are few. */
    private static String places(Dominance dominance, int mode) {
        List<String> levels = new ArrayList<>();
        for (Share share : dominance.ranked(mode, Energy.KINETIC, RollUp.LEVEL)) {
            levels.add(share.label());
            if (share.running() >= MOST_OF_IT) {
                break;
            }
        }
        if (levels.isEmpty() || levels.size() > FEW || levels.contains("")) {
            return "";
        }
        levels.sort(null);
        boolean named = levels.stream().anyMatch(level -> level.length() > LONGEST_NUMBER);
        if (levels.size() == 1) {
            return NLS.bind(named ? Messages.Dominance_onPlace : Messages.Dominance_onLevel, levels.get(0));
        }
        return NLS.bind(named ? Messages.Dominance_onPlaces : Messages.Dominance_onLevels,
                String.join(", ", levels.subList(0, levels.size() - 1)), levels.get(levels.size() - 1));
    }
}
