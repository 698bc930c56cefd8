package org.modewright.ui.editor.pages;

import java.util.Set;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
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
    private final SashForm parts;
    private final SpacePage space;
    private final PropertyForm form;

    public SpaceTab(Composite parent, EditorContext context) {
        this.context = context;
        parts = new SashForm(parent, SWT.HORIZONTAL);
        space = new SpacePage(parts, context.session(), context::model);
        form = new PropertyForm(parts, context);
        parts.setWeights(70, 30);
    }

    /** The drawing. */
    public SpacePage space() {
        return space;
    }

    @Override
    public String title() {
        return Messages.Page_space;
    }

    @Override
    public Control control() {
        return parts;
    }

    @Override
    public void modelChanged() {
        space.modelChanged();
        form.select(context.session().selection().elementIds());
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
    public void setFocus() {
        space.setFocus();
    }
}
