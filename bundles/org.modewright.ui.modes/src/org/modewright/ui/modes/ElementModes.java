package org.modewright.ui.modes;

import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.function.IntConsumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
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

    private static final int WORDS = 4;
    private static final int LEAST_WORDS = 80;
    private static final int INDENT = 8;

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
        layout.marginWidth = 0;
        layout.marginHeight = 4;
        body.setLayout(layout);
        Label atLeast = new Label(body, SWT.NONE);
        atLeast.setText(Messages.Dominance_atLeast);
        GridData indented = new GridData();
        indented.horizontalIndent = INDENT;
        atLeast.setLayoutData(indented);
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
        column(SWT.RIGHT, Messages.Column_number, 48);
        column(SWT.RIGHT, Messages.Column_period, 56);
        column(SWT.RIGHT, Messages.Dominance_strainShort, 76);
        column(SWT.RIGHT, Messages.Dominance_kineticShort, 80);
        column(SWT.LEFT, Messages.Column_character, LEAST_WORDS);
        TextFit.install(table, index -> index == WORDS);
        table.addListener(SWT.Resize, event -> fitWords());
        table.addListener(SWT.MouseMove, this::explain);
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

    /** The column of words takes the room that the numbers leave. */
    private void fitWords() {
        int room = table.getClientArea().width;
        for (int i = 0; i < WORDS; i++) {
            room -= table.getColumn(i).getWidth();
        }
        int width = Math.max(LEAST_WORDS, room);
        if (width != table.getColumn(WORDS).getWidth()) {
            table.getColumn(WORDS).setWidth(width);
        }
    }

    private void explain(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        String tip = item == null ? null : result.modes().get(shares.get(table.indexOf(item)).mode()).character().text();
        if (!Objects.equals(tip, table.getToolTipText())) {
            table.setToolTipText(tip);
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
