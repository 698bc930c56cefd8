package org.modewright.ui.editor.pages;

import java.util.List;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.fieldassist.ContentProposalAdapter;
import org.eclipse.jface.fieldassist.TextContentAdapter;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.TextKeys;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.widgets.ThemeColours;

/** The widget of a field, with its label before it; below it, while it is typed, why a text is refused or what speaks against it. */
abstract class FieldControl {

    private static final int NARROW = 60;
    private static final int WIDEST_LABEL = 112;
    private static final int EXPLAINED = 120;

    /**
     * How a field stands in its grid.
     *
     * @param columns columns of the grid: 2, or 3 where explanations stand in the last one
     * @param explanation stands after the widget; null: the widget takes that room
     */
    record Place(int columns, String explanation) {

        static final Place FORM = new Place(2, null);

        static Place explained(String explanation) {
            return new Place(3, explanation);
        }
    }

    private final Field field;
    private final EditorContext context;
    private Label fault;
    private List<? extends EObject> objects = List.of();

    private FieldControl(Field field, EditorContext context) {
        this.field = field;
        this.context = context;
    }

    /** Builds the widget of a field into a grid of two columns. */
    static FieldControl create(Composite parent, Field field, EditorContext context) {
        return create(parent, field, context, Place.FORM);
    }

    /** Builds the widget of a field into a grid. */
    static FieldControl create(Composite parent, Field field, EditorContext context, Place place) {
        return switch (field.style()) {
            case TEXT -> new Typed(parent, field, context, place);
            case CHOICE -> new Chosen(parent, field, context, place);
            case FLAG -> new Flagged(parent, field, context, place);
        };
    }

    /** Builds the check box of a flag into a row of them. */
    static FieldControl flag(Composite parent, Field field, EditorContext context) {
        return new Flagged(parent, field, context, null);
    }

    abstract Control control();

    /** Shows a text; different: the objects do not agree. */
    abstract void present(String text, boolean different);

    final void labelBefore(Composite parent) {
        label(parent, field.label()).setToolTipText(field.help());
    }

    /** A label that wraps where it is long, so that the fields keep their room. */
    static Label label(Composite parent, String text) {
        Label label = new Label(parent, SWT.WRAP);
        label.setText(text.replace("&", "&&"));
        GridData data = new GridData(SWT.LEFT, SWT.CENTER, false, false);
        if (label.computeSize(SWT.DEFAULT, SWT.DEFAULT).x > WIDEST_LABEL) {
            data.widthHint = WIDEST_LABEL;
        }
        label.setLayoutData(data);
        return label;
    }

    final String help() {
        return field.help();
    }

    final void describe() {
        control().setToolTipText(field.help());
        control().setData(UiIds.WIDGET_ID, "field." + field.label());
    }

    /** Lays out the widget after its label, with the explanation after it and room for what is wrong below. */
    final void place(Composite parent, Place place, boolean labelled) {
        boolean explained = place.explanation() != null;
        int span = place.columns() - (labelled ? 1 : 0) - (explained ? 1 : 0);
        GridData data = new GridData(SWT.FILL, SWT.CENTER, !explained && labelled, false, span, 1);
        data.widthHint = labelled ? explained ? EXPLAINED : NARROW : SWT.DEFAULT;
        control().setLayoutData(data);
        if (explained) {
            explain(parent, place.explanation());
        }
        fault = new Label(parent, SWT.WRAP);
        fault.setData(UiIds.WIDGET_ID, "fault." + field.label());
        GridData below = wrapping(place.columns());
        below.exclude = true;
        fault.setLayoutData(below);
        fault.setVisible(false);
    }

    static Label explain(Composite parent, String text) {
        Label label = new Label(parent, SWT.WRAP);
        label.setText(text.replace("&", "&&"));
        label.setForeground(ThemeColours.secondaryText(parent));
        GridData data = wrapping(1);
        data.verticalAlignment = SWT.CENTER;
        label.setLayoutData(data);
        return label;
    }

    private static GridData wrapping(int span) {
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, span, 1);
        data.widthHint = 2 * NARROW;
        return data;
    }

    /** Shows the common value of the objects. */
    final void show(List<? extends EObject> newObjects) {
        objects = newObjects;
        String first = field.text(objects.get(0));
        boolean different = objects.size() > 1 && !field.agree(objects);
        present(first, different);
        warn(different ? null : first);
    }

    private void warn(String text) {
        String warning = text == null || objects.isEmpty() ? null : field.warning(objects.get(0), text);
        say(warning == null ? "" : warning, false);
    }

    /** Sets the text; false if it is refused. */
    final boolean commit(String text) {
        if (objects.isEmpty() || field.text(objects.get(0)).equals(text) && field.agree(objects)) {
            warn(text);
            return true;
        }
        try {
            context.execute(field.set(objects, text));
            warn(text);
            return true;
        } catch (IllegalArgumentException refused) {
            say(refused.getMessage(), true);
            return false;
        }
    }

    /** Says why a text would be refused, or what speaks against it, without setting it. */
    final void consider(String text) {
        try {
            if (!objects.isEmpty()) {
                field.check(objects, text);
            }
            warn(text);
        } catch (IllegalArgumentException refused) {
            say(refused.getMessage(), true);
        }
    }

    final void revert() {
        show(objects);
    }

    private void say(String text, boolean refused) {
        if (fault == null || fault.isDisposed()) {
            return;
        }
        GridData data = (GridData) fault.getLayoutData();
        String shown = text.isEmpty() ? "" : (refused ? "✕ " : "⚠ ") + text.replace("&", "&&");
        if (shown.equals(fault.getText()) && data.exclude == text.isEmpty()) {
            return;
        }
        fault.setForeground(refused ? ThemeColours.failed(fault) : ThemeColours.caution(fault));
        fault.setText(shown);
        fault.setVisible(!text.isEmpty());
        data.exclude = text.isEmpty();
        PropertyForm.fitAround(fault);
    }

    /** A text field; names are proposed while they are typed. */
    private static final class Typed extends FieldControl {

        private final Text text;
        private boolean presenting;
        private boolean touched;

        Typed(Composite parent, Field field, EditorContext context, Place place) {
            super(field, context);
            labelBefore(parent);
            text = new Text(parent, SWT.BORDER | (field.isNumber() ? SWT.RIGHT : SWT.LEFT));
            describe();
            place(parent, place, true);
            text.addListener(SWT.Modify, event -> typing());
            text.addListener(SWT.DefaultSelection, event -> entered());
            text.addListener(SWT.FocusOut, event -> left());
            text.addListener(SWT.KeyDown, this::key);
            TextKeys.onUndo(text, this::takeBack);
            if (!field.choices().isEmpty()) {
                ContentProposalAdapter proposals = new ContentProposalAdapter(text, new TextContentAdapter(), new NameProposals(field),
                        null, null);
                proposals.setProposalAcceptanceStyle(ContentProposalAdapter.PROPOSAL_REPLACE);
                proposals.setPropagateKeys(true);
            }
        }

        @Override
        Control control() {
            return text;
        }

        @Override
        void present(String value, boolean different) {
            presenting = true;
            try {
                String now = different ? "" : value;
                if (!now.equals(text.getText())) {
                    text.setText(now);
                }
                text.setMessage(different ? Messages.Form_different : "");
                touched = false;
            } finally {
                presenting = false;
            }
        }

        private void typing() {
            if (!presenting) {
                touched = true;
                consider(text.getText());
            }
        }

        private void entered() {
            if (touched && commit(text.getText())) {
                touched = false;
            }
            text.selectAll();
        }

        /** Leaving the field sets a good text; a refused one goes, as no one would look for it any more. */
        private void left() {
            if (touched && !text.isDisposed()) {
                touched = false;
                if (!commit(text.getText())) {
                    revert();
                }
            }
        }

        /** Takes back what is typed and not set yet; false if there is nothing. */
        private boolean takeBack() {
            boolean typed = touched;
            if (typed) {
                revert();
                text.selectAll();
            }
            return typed;
        }

        private void key(Event event) {
            if (event.keyCode == SWT.ESC && takeBack()) {
                event.doit = false;
            }
        }
    }

    /** A list to choose from. */
    private static final class Chosen extends FieldControl {

        private final Combo combo;

        Chosen(Composite parent, Field field, EditorContext context, Place place) {
            super(field, context);
            labelBefore(parent);
            combo = new Combo(parent, SWT.READ_ONLY);
            combo.setItems(field.choices().toArray(new String[0]));
            describe();
            place(parent, place, true);
            combo.addListener(SWT.Selection, event -> commit(combo.getText()));
            combo.addListener(SWT.MouseVerticalWheel, event -> event.doit = false);
        }

        @Override
        Control control() {
            return combo;
        }

        @Override
        void present(String value, boolean different) {
            int index = different ? -1 : combo.indexOf(value);
            if (index < 0) {
                combo.deselectAll();
            } else if (combo.getSelectionIndex() != index) {
                combo.select(index);
            }
            combo.setToolTipText(index < 0 ? help() : value + "\n" + help());
        }
    }

    /** A check box. */
    private static final class Flagged extends FieldControl {

        private final Button button;

        Flagged(Composite parent, Field field, EditorContext context, Place place) {
            super(field, context);
            button = new Button(parent, SWT.CHECK);
            button.setText(field.label().replace("&", "&&"));
            describe();
            if (place != null) {
                place(parent, place, false);
            }
            button.addListener(SWT.Selection, event -> {
                button.setGrayed(false);
                commit(Boolean.toString(button.getSelection()));
            });
        }

        @Override
        Control control() {
            return button;
        }

        @Override
        void present(String value, boolean different) {
            button.setGrayed(different);
            button.setSelection(different || Boolean.parseBoolean(value));
        }
    }
}
