package org.modewright.ui.editor.pages;

import java.util.Set;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.NodalMass;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.RigidLink;
import org.modewright.model.structure.Spring;
import org.modewright.model.structure.Support;
import org.modewright.ui.canvas.SpacePage;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.EditorPage;
import org.modewright.ui.editor.Messages;

/** The structure in space with the properties of what is selected beside it. */
public final class SpaceTab implements EditorPage {

    private final EditorContext context;
    private final SideBySide parts;
    private final SpacePage space;
    private final PropertyForm form;

    public SpaceTab(Composite parent, EditorContext context) {
        this.context = context;
        parts = new SideBySide(parent, "space", true);
        space = new SpacePage(parts.main(), context.session(), context::model);
        form = new PropertyForm(parts, context, Messages.Form_nothingInSpace);
        space.canvas().addListener(SWT.MouseDown, this::pressed);
        context.offerMenu(space.canvas());
    }

    /** The context menu is about what the pointer is on, unless that belongs to what is selected anyway. */
    private void pressed(Event event) {
        String id = event.button == 3 ? space.canvas().idAt(event.x, event.y) : null;
        if (id != null && !context.session().selection().elementIds().contains(id)) {
            context.select(Set.of(id), this);
            form.select(Set.of(id));
        }
    }

    /** The drawing. */
    public SpacePage space() {
        return space;
    }

    @Override
    public Control control() {
        return parts.body();
    }

    @Override
    public void modelChanged() {
        space.modelChanged();
        form.select(context.session().selection().elementIds());
    }

    @Override
    public void findingsChanged() {
        form.findingsChanged();
    }

    @Override
    public void select(Set<String> ids) {
        form.select(ids);
    }

    @Override
    public boolean reveals(String id) {
        Identified object = context.object(id);
        return object instanceof Node || object instanceof Member || object instanceof Spring || object instanceof Support
                || object instanceof NodalMass || object instanceof RigidLink;
    }

    @Override
    public void showProperties() {
        parts.open(true);
        form.setFocus();
    }

    @Override
    public void setFocus() {
        space.setFocus();
    }

    @Override
    public void selectAll() {
        context.select(context.drawnIds(), this);
        form.select(context.session().selection().elementIds());
    }
}
