package org.modewright.ui.modes;

import java.util.function.Consumer;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.modewright.modal.Direction;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.ThemeColours;

/** Chooses which modes the table shows: all, local ones, or those with a share of effective mass in a direction. */
final class FilterBar {

    private static final double[] SHARES = {0.001, 0.01, 0.05, 0.10};
    private static final int FIXED_ENTRIES = 3;

    private final Combo kind;
    private final Label inLabel;
    private final Label legend;
    private final Combo direction;
    private final Label count;
    private final Consumer<ModeFilter> whenChanged;

    FilterBar(Composite parent, Consumer<ModeFilter> whenChanged) {
        this.whenChanged = whenChanged;
        Composite bar = new Composite(parent, SWT.NONE);
        bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        GridLayout layout = new GridLayout(6, false);
        layout.marginWidth = 8;
        layout.marginHeight = 0;
        layout.horizontalSpacing = 8;
        bar.setLayout(layout);
        new Label(bar, SWT.NONE).setText(Messages.Filter_show);
        kind = new Combo(bar, SWT.READ_ONLY);
        kind.setData(UiIds.WIDGET_ID, "modes.filter");
        kind.setItems(Messages.Filter_all, Messages.Filter_local, Messages.Filter_notLocal);
        for (double share : SHARES) {
            kind.add(NLS.bind(Messages.Filter_atLeast, share * 100 < 1 ? Double.toString(share * 100)
                    : Long.toString(Math.round(share * 100))));
        }
        kind.select(0);
        inLabel = new Label(bar, SWT.NONE);
        inLabel.setText(Messages.Filter_in);
        direction = new Combo(bar, SWT.READ_ONLY);
        direction.setData(UiIds.WIDGET_ID, "modes.filter.direction");
        direction.setItems(Messages.Filter_anyDirection, "X", "Y", "Z");
        direction.select(0);
        count = new Label(bar, SWT.NONE);
        count.setData(UiIds.WIDGET_ID, "modes.filter.count");
        legend = new Label(bar, SWT.NONE);
        legend.setText(Messages.Modes_legend);
        legend.setToolTipText(Messages.Modes_legendTip);
        legend.setForeground(ThemeColours.secondaryText(bar));
        legend.setLayoutData(new GridData(SWT.RIGHT, SWT.CENTER, true, false));
        kind.addListener(SWT.Selection, event -> changed());
        direction.addListener(SWT.Selection, event -> changed());
        enableDirection();
    }

    private void changed() {
        enableDirection();
        whenChanged.accept(filter());
    }

    private void enableDirection() {
        boolean byShare = kind.getSelectionIndex() >= FIXED_ENTRIES;
        include(direction, byShare);
        include(inLabel, byShare);
        include(legend, kind.getSelectionIndex() == 0);
        include(count, kind.getSelectionIndex() != 0);
        kind.getParent().layout();
    }

    private static void include(Control control, boolean included) {
        control.setVisible(included);
        GridData data = control.getLayoutData() instanceof GridData given ? given : new GridData();
        data.exclude = !included;
        control.setLayoutData(data);
    }

    /** Says how many modes pass the filter. */
    void showCount(int shown, int all) {
        count.setText(shown == 0 ? Messages.Filter_none : NLS.bind(Messages.Filter_count, Numbers.count(shown), Numbers.count(all)));
        kind.getParent().layout();
    }

    private ModeFilter filter() {
        int entry = kind.getSelectionIndex();
        return switch (entry) {
            case 0 -> ModeFilter.ALL;
            case 1 -> new ModeFilter(ModeFilter.Kind.LOCAL, 0, null);
            case 2 -> new ModeFilter(ModeFilter.Kind.NOT_LOCAL, 0, null);
            default -> new ModeFilter(ModeFilter.Kind.AT_LEAST, SHARES[entry - FIXED_ENTRIES], chosenDirection());
        };
    }

    private Direction chosenDirection() {
        int entry = direction.getSelectionIndex();
        return entry == 0 ? null : Direction.values()[entry - 1];
    }
}
