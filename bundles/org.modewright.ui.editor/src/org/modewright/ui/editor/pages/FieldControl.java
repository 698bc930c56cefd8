package org.modewright.ui.editor.pages;

import java.util.List;
import org.eclipse.emf.ecore.EObject;
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
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.widgets.ThemeColours;

/** The widget of a field, with its label before it and the reason why a text is refused below it. */
abstract class FieldControl {

    private final Field field;
    private final EditorContext context;
    private final Label fault;
    private List<? extends EObject> objects = List.of();

    private FieldControl(Composite parent, Field field, EditorContext context, boolean labelled) {
        this.field = field;
        this.context = context;
        if (labelled) {
            Label label = new Label(parent, SWT.NONE);
            label.setText(field.label().replace("&", "&&"));
            label.setToolTipText(field.help());
        }
        Control control = create(parent, field);
        control.setToolTipText(field.help());
        control.setData(UiIds.WIDGET_ID, "field." + field.label());
        control.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false, labelled ? 1 : 2, 1));
        fault = new Label(parent, SWT.WRAP);
        fault.setForeground(ThemeColours.failed(fault));
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1);
        data.widthHint = 120;
        fault.setLayoutData(data);
        say("");
    }

    static FieldControl create(Composite parent, Field field, EditorContext context) {
        return switch (field.style()) {
            case TEXT -> new Typed(parent, field, context);
            case CHOICE -> new Chosen(parent, field, context);
            case FLAG -> new Flagged(parent, field, context);
        };
    }

    abstract Control create(Composite parent, Field of);

    /** Shows a text; different: the objects do not agree. */
    abstract void present(String text, boolean different);

    /** Shows the common value of the objects. */
    final void show(List<? extends EObject> newObjects) {
        objects = newObjects;
        String first = field.text(objects.get(0));
        boolean different = objects.stream().anyMatch(object -> !field.text(object).equals(first));
        present(first, different);
        say("");
    }

    final void commit(String text) {
        if (objects.isEmpty() || objects.stream().allMatch(object -> field.text(object).equals(text))) {
            say("");
            return;
        }
        try {
            context.execute(field.set(objects, text));
            say("");
        } catch (IllegalArgumentException refused) {
            say(refused.getMessage());
        }
    }

    /** Says why a text would be refused, without setting it. */
    final void consider(String text) {
        try {
            if (!objects.isEmpty()) {
                field.set(objects, text);
            }
            say("");
        } catch (IllegalArgumentException refused) {
            say(refused.getMessage());
        }
    }

    final void revert() {
        show(objects);
    }

    private void say(String text) {
        GridData data = (GridData) fault.getLayoutData();
        boolean hidden = text.isEmpty();
        if (text.equals(fault.getText()) && data.exclude == hidden) {
            return;
        }
        fault.setText(text.replace("&", "&&"));
        fault.setVisible(!hidden);
        data.exclude = hidden;
        fault.requestLayout();
    }

    /** A text field. */
    private static final class Typed extends FieldControl {

        private Text text;

        Typed(Composite parent, Field field, EditorContext context) {
            super(parent, field, context, true);
            text.addListener(SWT.Modify, event -> typing());
            text.addListener(SWT.DefaultSelection, event -> commitTyped());
            text.addListener(SWT.FocusOut, event -> commitTyped());
            text.addListener(SWT.KeyDown, this::key);
        }

        private boolean presenting;
        private boolean touched;

        @Override
        Control create(Composite parent, Field of) {
            text = new Text(parent, SWT.BORDER | (of.isNumber() ? SWT.RIGHT : SWT.LEFT));
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

        private void commitTyped() {
            if (touched) {
                commit(text.getText());
            }
        }

        private void key(Event event) {
            if (event.keyCode == SWT.ESC) {
                revert();
                text.selectAll();
                event.doit = false;
            }
        }
    }

    /** A list to choose from. */
    private static final class Chosen extends FieldControl {

        private Combo combo;

        Chosen(Composite parent, Field field, EditorContext context) {
            super(parent, field, context, true);
            combo.addListener(SWT.Selection, event -> commit(combo.getText()));
        }

        @Override
        Control create(Composite parent, Field of) {
            combo = new Combo(parent, SWT.READ_ONLY);
            combo.setItems(of.choices().toArray(new String[0]));
            return combo;
        }

        @Override
        void present(String value, boolean different) {
            if (different) {
                combo.deselectAll();
            } else {
                combo.setText(value);
            }
        }
    }

    /** A check box. */
    private static final class Flagged extends FieldControl {

        private Button button;

        Flagged(Composite parent, Field field, EditorContext context) {
            super(parent, field, context, false);
            button.addListener(SWT.Selection, event -> {
                button.setGrayed(false);
                commit(Boolean.toString(button.getSelection()));
            });
        }

        @Override
        Control create(Composite parent, Field of) {
            button = new Button(parent, SWT.CHECK);
            button.setText(of.label());
            return button;
        }

        @Override
        void present(String value, boolean different) {
            button.setGrayed(different);
            button.setSelection(different || Boolean.parseBoolean(value));
        }
    }
}
