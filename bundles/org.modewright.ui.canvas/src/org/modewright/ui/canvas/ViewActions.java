package org.modewright.ui.canvas;

import java.util.List;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.modewright.render.StandardView;
import org.modewright.render.Thickness;
import org.modewright.ui.widgets.Images;

/** What toolbars and menus of a canvas hold: standard views and what is drawn. */
final class ViewActions {

    private ViewActions() {
    }

    /** The standard views and the one that brings everything into sight. */
    static List<IAction> views(StructureCanvas canvas) {
        return List.of(command(Messages.View_space, Images.VIEW_SPACE, () -> canvas.view(StandardView.AXONOMETRIC)),
                command(Messages.View_front, Images.VIEW_FRONT, () -> canvas.view(StandardView.ALONG_PLUS_Y)),
                command(Messages.View_side, Images.VIEW_SIDE, () -> canvas.view(StandardView.ALONG_MINUS_X)),
                command(Messages.View_plan, Images.VIEW_PLAN, () -> canvas.view(StandardView.PLAN)),
                command(Messages.View_fit, Images.FIT, canvas::fit));
    }

    /** What is drawn: thickness, signs, level names. */
    static List<IAction> options(StructureCanvas canvas) {
        return List.of(
                toggle(canvas, Messages.View_sections, Images.SECTIONS, () -> canvas.options().thickness() != Thickness.LINES,
                        on -> canvas.options().thickness(on ? Thickness.AUTOMATIC : Thickness.LINES)),
                toggle(canvas, Messages.View_nodes, Images.NODES, () -> canvas.options().markers(), on -> canvas.options().markers(on)),
                toggle(canvas, Messages.View_labels, Images.LABELS, () -> canvas.options().labels(), on -> canvas.options().labels(on)));
    }

    static IAction command(String label, String image, Runnable body) {
        Action action = new Action(label) {
            @Override
            public void run() {
                body.run();
            }
        };
        action.setToolTipText(label);
        if (image != null) {
            action.setImageDescriptor(Images.descriptor(image));
        }
        return action;
    }

    static IAction toggle(StructureCanvas canvas, String label, String image, BooleanSupplier state, Consumer<Boolean> change) {
        Action action = new Action(label, IAction.AS_CHECK_BOX) {
            @Override
            public void run() {
                change.accept(isChecked());
                canvas.redraw();
            }
        };
        action.setToolTipText(label);
        action.setImageDescriptor(Images.descriptor(image));
        action.setChecked(state.getAsBoolean());
        return action;
    }
}
