package org.modewright.ui.modes;

import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.function.IntConsumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Spinner;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.ModeShare;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Numbers;

/** The modes in which the selected elements hold more than a chosen share of the strain or kinetic energy. */
final class ElementModes {

    private final Composite body;
    private String sentence = "";
    private final Spinner least;
    private final Table table;
    private ModalResult result;
    private Set<String> elementIds = Set.of();
    private List<ModeShare> shares = List.of();

    /**
     * @param parent where the table stands
     * @param whenPicked told of the index of a mode that was picked
     * @param whenCounted told that the sentence has changed by the user's choice of a share
     */
    ElementModes(Composite parent, IntConsumer whenPicked, Runnable whenCounted) {
        body = new Composite(parent, SWT.NONE);
        GridLayout layout = new GridLayout(3, false);
        layout.marginWidth = 8;
        layout.marginHeight = 4;
        body.setLayout(layout);
        new Label(body, SWT.NONE).setText(Messages.Dominance_atLeast);
        least = new Spinner(body, SWT.BORDER);
        least.setValues(50, 1, 1000, 1, 10, 50);
        least.setData(UiIds.WIDGET_ID, "dominance.least");
        least.addListener(SWT.Selection, event -> {
            refresh();
            whenCounted.run();
        });
        new Label(body, SWT.NONE).setText(Messages.Dominance_ofEnergy);
        table = new Table(body, SWT.FULL_SELECTION | SWT.BORDER);
        table.setHeaderVisible(true);
        table.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true, 3, 1));
        table.setData(UiIds.WIDGET_ID, "dominance.modes");
        column(SWT.RIGHT, Messages.Column_number, 56);
        column(SWT.RIGHT, Messages.Column_period, 64);
        column(SWT.RIGHT, Messages.Dominance_strainShort, 88);
        column(SWT.RIGHT, Messages.Dominance_kineticShort, 88);
        column(SWT.LEFT, Messages.Column_character, 200);
        table.addListener(SWT.Selection, event -> pick(whenPicked));
    }

    private void column(int style, String header, int width) {
        TableColumn column = new TableColumn(table, style);
        column.setText(header);
        column.setWidth(width);
    }

    Control control() {
        return body;
    }

    /** In how many modes the selection takes part. */
    String sentence() {
        return sentence;
    }

    void show(ModalResult newResult, Set<String> ids) {
        result = newResult;
        elementIds = ids;
        refresh();
    }

    private void refresh() {
        table.removeAll();
        shares = List.of();
        sentence = "";
        if (result == null) {
            return;
        }
        double share = least.getSelection() / 1000.0;
        shares = new Dominance(result).modesOf(elementIds, share);
        sentence = DominanceSentence.modesOf(result, elementIds, share, shares);
        for (ModeShare row : shares) {
            Mode mode = result.modes().get(row.mode());
            new TableItem(table, SWT.NONE).setText(new String[] {Integer.toString(mode.number()), Numbers.significant(mode.period()),
                Numbers.percentNumber(row.strain()), Numbers.percentNumber(row.kinetic()), mode.character().text()});
        }
    }

    /** All rows as text, tab-separated, in full precision. */
    String text() {
        StringBuilder text = new StringBuilder(String.join("\t", Arrays.stream(table.getColumns()).map(TableColumn::getText).toList()));
        for (ModeShare row : shares) {
            Mode mode = result.modes().get(row.mode());
            text.append('\n').append(String.join("\t", Integer.toString(mode.number()), Numbers.exact(mode.period()),
                    Numbers.exact(row.strain() * 100), Numbers.exact(row.kinetic() * 100), mode.character().text()));
        }
        return text.toString();
    }

    private void pick(IntConsumer whenPicked) {
        int index = table.getSelectionIndex();
        if (index >= 0 && index < shares.size()) {
            whenPicked.accept(shares.get(index).mode());
        }
    }
}
