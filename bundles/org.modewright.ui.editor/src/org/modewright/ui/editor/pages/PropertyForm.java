package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.modewright.audit.Finding;
import org.modewright.model.Names;
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

    private static final String FORM = "org.modewright.ui.editor.form";

    private final SideBySide parts;
    private final EditorContext context;
    private final String nothing;
    private final ScrolledComposite scroller;
    private Composite body;
    private Label title;
    private Label findings;
    private final List<FieldControl> controls = new ArrayList<>();
    private List<EObject> objects = List.of();
    private List<Object> shown = List.of();

    /** @param nothing what stands there while nothing is selected */
    PropertyForm(SideBySide parts, EditorContext context, String nothing) {
        this.parts = parts;
        this.context = context;
        this.nothing = nothing;
        scroller = new ScrolledComposite(parts.side(), SWT.V_SCROLL);
        scroller.setExpandHorizontal(true);
        scroller.setExpandVertical(true);
        scroller.setData(UiIds.WIDGET_ID, "editor.form");
        scroller.setData(FORM, this);
        scroller.addListener(SWT.Resize, event -> fit());
        parts.whenOpened(this::showNow);
        show(List.of());
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
        if (parts.isOpen()) {
            showNow();
        }
    }

    private void showNow() {
        List<Field> fields = sameKind() ? Fields.of(context.fields(), kind(), objects.get(0)) : List.of();
        List<Object> now = identity(fields);
        if (!now.equals(shown)) {
            rebuild(fields);
            shown = now;
        }
        refresh();
    }

    /** What the widgets depend on; the objects themselves may be others of the same kind. */
    private List<Object> identity(List<Field> fields) {
        List<Object> identity = new ArrayList<>();
        identity.add(fields.isEmpty() ? title() : kind());
        identity.add(objects.size() == 1);
        for (Field field : fields) {
            identity.add(field.label());
            identity.add(field.style() == Field.Style.CHOICE ? field.choices() : List.of());
        }
        return identity;
    }

    private boolean sameKind() {
        if (objects.isEmpty()) {
            return false;
        }
        EClass kind = kind();
        return objects.stream().allMatch(object -> object.eClass() == kind);
    }

    private EClass kind() {
        return objects.get(0).eClass();
    }

    private void rebuild(List<Field> fields) {
        scroller.setRedraw(false);
        try {
            scroller.setContent(null);
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
            addFields(fields);
            scroller.setContent(body);
        } finally {
            scroller.setRedraw(true);
        }
    }

    private void addFields(List<Field> fields) {
        Composite flags = null;
        for (Field field : fields) {
            if (field.style() == Field.Style.FLAG) {
                flags = flags == null ? flagRows() : flags;
                controls.add(FieldControl.flag(flags, field, context));
            } else if (objects.size() == 1 || !isName(field, fields)) {
                flags = null;
                controls.add(FieldControl.create(body, field, context));
            }
        }
    }

    /** Check boxes that follow each other stand side by side, as many as there is room for. */
    private Composite flagRows() {
        Composite rows = new Composite(body, SWT.NONE);
        RowLayout layout = new RowLayout(SWT.HORIZONTAL);
        layout.marginLeft = 0;
        layout.marginTop = 0;
        layout.marginBottom = 0;
        layout.pack = false;
        layout.spacing = 8;
        rows.setLayout(layout);
        rows.setLayoutData(wide());
        return rows;
    }

    /** The name stands first and belongs to one object. */
    private static boolean isName(Field field, List<Field> fields) {
        return field == fields.get(0);
    }

    private void addTitle() {
        title = new Label(body, SWT.WRAP);
        boolean some = !objects.isEmpty();
        if (some) {
            title.setFont(JFaceResources.getFontRegistry().getBold(JFaceResources.DIALOG_FONT));
        } else {
            title.setForeground(ThemeColours.secondaryText(title));
        }
        title.setLayoutData(wide());
        title.setData(UiIds.WIDGET_ID, "editor.form.title");
        findings = new Label(body, SWT.WRAP);
        findings.setForeground(ThemeColours.caution(findings));
        findings.setLayoutData(wide());
        findings.setData(UiIds.WIDGET_ID, "editor.form.findings");
    }

    private static GridData wide() {
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1);
        data.widthHint = 120;
        return data;
    }

    private String title() {
        if (objects.isEmpty()) {
            return nothing;
        }
        if (objects.size() == 1) {
            return Labels.of(objects.get(0));
        }
        return sameKind() ? NLS.bind(Messages.Form_many, objects.size(), Names.kind(kind()))
                : NLS.bind(Messages.Form_mixed, objects.size()) + ". " + Messages.Form_kinds;
    }

    private void refresh() {
        title.setText(title().replace("&", "&&"));
        controls.forEach(control -> control.show(objects));
        findingsChanged();
    }

    /** Shows what the live checks say about the object now. */
    void findingsChanged() {
        if (body == null || !parts.isOpen()) {
            return;
        }
        String text = objects.size() == 1 && objects.get(0) instanceof Identified object ? reasons(object) : "";
        findings.setText(text.replace("&", "&&"));
        ((GridData) findings.getLayoutData()).exclude = text.isEmpty();
        findings.setVisible(!text.isEmpty());
        fit();
    }

    /** Sets the focus into the first field. */
    void setFocus() {
        if (controls.isEmpty()) {
            scroller.setFocus();
        } else {
            controls.get(0).control().setFocus();
        }
    }

    private String reasons(Identified object) {
        List<String> lines = new ArrayList<>();
        for (Finding finding : context.findings(object.getId())) {
            lines.add("⚠ " + finding.text() + " " + finding.remedy());
        }
        return String.join("\n", lines);
    }

    /** Makes room around a control of a form whose text has changed; elsewhere asks for a new layout. */
    static void fitAround(Control control) {
        for (Composite parent = control.getParent(); parent != null; parent = parent.getParent()) {
            if (parent.getData(FORM) instanceof PropertyForm form) {
                form.fit();
                return;
            }
        }
        control.requestLayout();
    }

    private void fit() {
        if (scroller.getContent() == null) {
            return;
        }
        body.layout(true, true);
        int width = scroller.getClientArea().width;
        scroller.setMinSize(body.computeSize(Math.max(1, width), SWT.DEFAULT));
    }
}
