package org.modewright.testsupport;

import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;

/** An open dialogue or wizard. */
public final class DialogObject {

    private final UiThread ui;
    private final Shell shell;

    private DialogObject(UiThread ui, Shell shell) {
        this.ui = ui;
        this.shell = shell;
    }

    /** Waits for a dialogue with a title. */
    static DialogObject waitFor(UiThread ui, String title) {
        return new DialogObject(ui, ui.waitFor("the dialogue " + title, () -> shell(ui, title)));
    }

    /** The visible dialogue with a title; null if there is none. */
    static Shell shell(UiThread ui, String title) {
        for (Shell shell : ui.display().getShells()) {
            if (!shell.isDisposed() && shell.isVisible() && title.equals(shell.getText())) {
                return shell;
            }
        }
        return null;
    }

    /** Types into a field, in place of what stands there. */
    public DialogObject type(String id, String text) {
        ui.run(() -> {
            Control control = there(Control.class, id);
            if (control instanceof Combo combo) {
                combo.setText(text);
            } else {
                ((Text) control).setText(text);
            }
        });
        return this;
    }

    /** Chooses a radio button or a check box. */
    public DialogObject choose(String id) {
        ui.run(() -> {
            Button chosen = there(Button.class, id);
            for (Button other : Widgets.findAll(chosen.getParent(), Button.class, button -> button.getStyle() == chosen.getStyle())) {
                other.setSelection(other == chosen);
                Widgets.click(other);
            }
        });
        return this;
    }

    /** Text of a field. */
    public String text(String id) {
        return ui.get(() -> there(Control.class, id) instanceof Combo combo ? combo.getText() : there(Text.class, id).getText());
    }

    public TableObject table(String id) {
        return new TableObject(ui, id, () -> Widgets.find(shell, Table.class, id));
    }

    /** Whether a button can be pressed. */
    public boolean isEnabled(String label) {
        return ui.get(() -> button(label).isEnabled());
    }

    /** Presses a button once it can be pressed. */
    public void press(String label) {
        ui.waitUntil("the button " + label + " to be enabled", () -> button(label).isEnabled());
        ui.later(() -> Widgets.click(button(label)));
    }

    /** Waits until the dialogue is closed. */
    public void waitUntilClosed() {
        ui.waitUntil("the dialogue to close", shell::isDisposed);
    }

    private Button button(String label) {
        Button found = Widgets.find(shell, Button.class, button -> button.getText().replace("&", "").equals(label));
        if (found == null) {
            throw new AssertionError("The dialogue has no button " + label + ".");
        }
        return found;
    }

    private <T extends Control> T there(Class<T> type, String id) {
        T found = Widgets.find(shell, type, id);
        if (found == null) {
            throw new AssertionError("The dialogue has no field " + id + ".");
        }
        return found;
    }
}
