package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.modewright.audit.Finding;
import org.modewright.model.edit.Labels;
import org.modewright.model.structure.Identified;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.editor.fields.Fields;
import org.modewright.ui.widgets.ThemeColours;

/**
 * The properties of what is selected: a labelled field for each, several objects of one kind edited together. Enter or leaving a field
 * sets it, Escape takes back what was typed; what is wrong is said below the field while it is typed.
 */
final class PropertyForm {

    private final EditorContext context;
    private final ScrolledComposite scroller;
    private Composite body;
    private Label findings;
    private final List<FieldControl> controls = new ArrayList<>();
    private List<EObject> objects = List.of();
    private String shown = "";

    PropertyForm(Composite parent, EditorContext context) {
        this.context = context;
        scroller = new ScrolledComposite(parent, SWT.V_SCROLL);
        scroller.setExpandHorizontal(true);
        scroller.setExpandVertical(true);
        scroller.setData(UiIds.WIDGET_ID, "editor.form");
        scroller.addListener(SWT.Resize, event -> fit());
        show(List.of());
    }

    Composite control() {
        return scroller;
    }

    /** Shows the objects with these ids. */
    void select(Set<String> ids) {
        List<EObject> chosen = new ArrayList<>();
        for (String id : ids) {
            Identified object = context.object(id);
            if (object != null) {
                chosen.add(object);
            }
        }
        show(chosen);
    }

    /** Shows objects; their fields are kept while the same objects, with the same choices and units, are shown. */
    void show(List<? extends EObject> chosen) {
        objects = List.copyOf(chosen);
        List<Field> fields = sameKind() ? Fields.of(context.fields(), kind(), objects.get(0)) : List.of();
        String now = identity(fields);
        if (now.equals(shown)) {
            refresh();
            return;
        }
        shown = now;
        rebuild(fields);
    }

    private String identity(List<Field> fields) {
        StringBuilder identity = new StringBuilder();
        objects.forEach(object -> identity.append(System.identityHashCode(object)).append(' '));
        fields.forEach(field -> identity.append(field.label()).append(field.choices().hashCode()));
        return identity.append('.').toString();
    }

    private boolean sameKind() {
        return !objects.isEmpty() && objects.stream().allMatch(object -> object.eClass() == kind());
    }

    private EClass kind() {
        return objects.get(0).eClass();
    }

    private void rebuild(List<Field> fields) {
        scroller.setRedraw(false);
        try {
            if (body != null) {
                body.dispose();
            }
            controls.clear();
            body = new Composite(scroller, SWT.NONE);
            GridLayout layout = new GridLayout(2, false);
            layout.marginWidth = 8;
            layout.marginHeight = 8;
            layout.verticalSpacing = 4;
            layout.horizontalSpacing = 8;
            body.setLayout(layout);
            addTitle();
            for (Field field : fields) {
                if (objects.size() == 1 || !isName(field, fields)) {
                    controls.add(FieldControl.create(body, field, context));
                }
            }
            scroller.setContent(body);
            refresh();
        } finally {
            scroller.setRedraw(true);
        }
    }

    /** The name stands first and belongs to one object. */
    private static boolean isName(Field field, List<Field> fields) {
        return field == fields.get(0);
    }

    private void addTitle() {
        Label title = new Label(body, SWT.WRAP);
        title.setText(title().replace("&", "&&"));
        title.setFont(org.eclipse.jface.resource.JFaceResources.getFontRegistry().getBold(org.eclipse.jface.resource.JFaceResources.DIALOG_FONT));
        title.setLayoutData(wide());
        title.setData(UiIds.WIDGET_ID, "editor.form.title");
        findings = new Label(body, SWT.WRAP);
        findings.setForeground(ThemeColours.failed(findings));
        findings.setLayoutData(wide());
    }

    private static GridData wide() {
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1);
        data.widthHint = 120;
        return data;
    }

    private String title() {
        if (objects.isEmpty()) {
            return Messages.Form_nothing;
        }
        if (objects.size() == 1) {
            return Labels.of(objects.get(0));
        }
        return sameKind() ? NLS.bind(Messages.Form_many, objects.size(), Tables.word(kind()))
                : NLS.bind(Messages.Form_mixed, objects.size()) + ". " + Messages.Form_kinds;
    }

    private void refresh() {
        controls.forEach(control -> control.show(objects));
        String text = objects.size() == 1 && objects.get(0) instanceof Identified object ? reasons(object) : "";
        findings.setText(text.replace("&", "&&"));
        ((GridData) findings.getLayoutData()).exclude = text.isEmpty();
        findings.setVisible(!text.isEmpty());
        fit();
    }

    private String reasons(Identified object) {
        List<String> lines = new ArrayList<>();
        for (Finding finding : context.findings(object.getId())) {
            lines.add(finding.text() + " " + finding.remedy());
        }
        return String.join("\n", lines);
    }

    private void fit() {
        if (body == null || body.isDisposed()) {
            return;
        }
        body.layout(true, true);
        int width = scroller.getClientArea().width;
        scroller.setMinSize(body.computeSize(Math.max(1, width), SWT.DEFAULT));
    }
}
