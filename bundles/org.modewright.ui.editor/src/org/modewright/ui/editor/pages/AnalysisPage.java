package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.jface.dialogs.IDialogConstants;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.modewright.audit.RulePack;
import org.modewright.audit.RulePackException;
import org.modewright.audit.RulePacks;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.model.structure.UnitSystem;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.EditorPage;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.FeatureTexts;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.editor.fields.Fields;
import org.modewright.workspace.WorkspacePreferences;

/** Units and what holds for the whole structure, what is solved, and how it is judged; each with a short explanation. */
public final class AnalysisPage implements EditorPage {

    private record Row(FieldControl control, EObject object) {
    }

    private static final int WIDEST = 800;

    private final EditorContext context;
    private final ScrolledComposite scroller;
    private final List<Row> rows = new ArrayList<>();
    private Composite body;
    private Combo units;
    private Combo rulePack;
    private Label rulePackNote;
    private List<RulePack> packs = List.of();
    private UnitSystem shownUnits;

    public AnalysisPage(Composite parent, EditorContext context) {
        this.context = context;
        scroller = new ScrolledComposite(parent, SWT.V_SCROLL);
        scroller.setExpandHorizontal(true);
        scroller.setExpandVertical(true);
        scroller.addListener(SWT.Resize, event -> fit());
        rebuild();
    }

    private void rebuild() {
        if (body != null) {
            body.dispose();
        }
        rows.clear();
        shownUnits = context.model().getUnits();
        body = new Composite(scroller, SWT.NONE);
        GridLayout layout = new GridLayout(3, false);
        layout.marginWidth = 8;
        layout.horizontalSpacing = 8;
        layout.verticalSpacing = 4;
        body.setLayout(layout);
        title(Messages.Analysis_structure);
        addUnits();
        add(context.model(), false, Literals.STRUCTURAL_MODEL__NAME, Literals.STRUCTURAL_MODEL__TITLE, Literals.STRUCTURAL_MODEL__NOTES);
        add(context.model(), true, Literals.STRUCTURAL_MODEL__GRAVITY, Literals.STRUCTURAL_MODEL__MASS_FORMULATION,
                Literals.STRUCTURAL_MODEL__SHEAR_DEFORMATION);
        if (context.model().getAnalysis() != null) {
            title(Messages.Analysis_solve);
            add(context.model().getAnalysis(), true, Literals.ANALYSIS_SETTINGS__MODES, Literals.ANALYSIS_SETTINGS__BELOW);
        }
        if (context.model().getAudit() != null) {
            title(Messages.Analysis_judge);
            addRulePack();
            addDirections();
            add(context.model().getAudit(), true, Literals.AUDIT_SETTINGS__LOCAL_NODES, Literals.AUDIT_SETTINGS__COINCIDENCE);
        }
        scroller.setContent(body);
        refresh();
    }

    private void title(String text) {
        Label title = new Label(body, SWT.NONE);
        title.setText(text);
        title.setFont(JFaceResources.getFontRegistry().getBold(JFaceResources.DIALOG_FONT));
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, 3, 1);
        data.verticalIndent = body.getChildren().length > 1 ? 8 : 0;
        title.setLayoutData(data);
    }

    private void add(EObject object, boolean explained, EStructuralFeature... features) {
        for (EStructuralFeature feature : features) {
            Field field = Fields.one(context.fields(), object, feature);
            FieldControl.Place place = FieldControl.Place.explained(explained ? FeatureTexts.help(feature) : null);
            rows.add(new Row(FieldControl.create(body, field, context, place), object));
        }
    }

    /** The directions stand in one row, as they are one question. */
    private void addDirections() {
        FieldControl.label(body, Messages.Analysis_directions);
        Composite row = new Composite(body, SWT.NONE);
        GridLayout layout = new GridLayout(3, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.horizontalSpacing = 12;
        row.setLayout(layout);
        row.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false, 2, 1));
        for (EStructuralFeature axis : List.of(Literals.AUDIT_SETTINGS__X, Literals.AUDIT_SETTINGS__Y, Literals.AUDIT_SETTINGS__Z)) {
            Field field = Fields.one(context.fields(), context.model().getAudit(), axis);
            rows.add(new Row(FieldControl.flag(row, field, context), context.model().getAudit()));
        }
    }

    private void addUnits() {
        FieldControl.label(body, FeatureTexts.label(Literals.STRUCTURAL_MODEL__UNITS));
        units = new Combo(body, SWT.READ_ONLY);
        units.setData(UiIds.WIDGET_ID, "analysis.units");
        units.setItems(Arrays.stream(UnitSystem.values()).map(UnitSystem::getLiteral).toArray(String[]::new));
        units.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, false, false));
        units.addListener(SWT.Selection, event -> unitsChosen());
        FieldControl.explain(body, FeatureTexts.help(Literals.STRUCTURAL_MODEL__UNITS));
    }

    private void unitsChosen() {
        UnitSystem chosen = UnitSystem.get(units.getText());
        UnitSystem now = context.model().getUnits();
        if (chosen == null || chosen == now) {
            return;
        }
        int answer = MessageDialog.open(MessageDialog.QUESTION, context.shell(), Messages.Units_title,
                NLS.bind(Messages.Units_question, now.getLiteral(), chosen.getLiteral()), SWT.NONE,
                Messages.Units_convert, Messages.Units_keep, IDialogConstants.CANCEL_LABEL);
        Command command = answer == 0 ? context.commands().convertUnits(chosen)
                : answer == 1 ? context.commands().set(context.model(), Literals.STRUCTURAL_MODEL__UNITS, chosen) : null;
        context.execute(command);
        refresh();
    }

    private void addRulePack() {
        FieldControl.label(body, FeatureTexts.label(Literals.AUDIT_SETTINGS__RULE_PACK));
        rulePack = new Combo(body, SWT.READ_ONLY);
        rulePack.setData(UiIds.WIDGET_ID, "analysis.rulePack");
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false, 2, 1);
        data.widthHint = 120;
        rulePack.setLayoutData(data);
        rulePack.addListener(SWT.Selection, event -> context.execute(context.commands().set(context.model().getAudit(),
                Literals.AUDIT_SETTINGS__RULE_PACK, packs.get(rulePack.getSelectionIndex()).id())));
        new Label(body, SWT.NONE);
        rulePackNote = FieldControl.explain(body, "");
        ((GridData) rulePackNote.getLayoutData()).horizontalSpan = 2;
        packs = rulePacks();
        rulePack.setItems(packs.stream().map(pack -> pack.title() + " (" + pack.id() + ")").toArray(String[]::new));
    }

    /** The built-in rule packs and the office's own; a folder of packs that cannot be read is reported by the run that needs it. */
    private static List<RulePack> rulePacks() {
        RulePacks builtIn = RulePacks.builtIn();
        try {
            return WorkspacePreferences.rulePackFolder().map(folder -> builtIn.with(folder)).orElse(builtIn).all();
        } catch (RulePackException unreadable) {
            return builtIn.all();
        }
    }

    private void refresh() {
        rows.forEach(row -> row.control.show(List.of(row.object)));
        units.setText(context.model().getUnits().getLiteral());
        if (rulePack != null && context.model().getAudit() != null) {
            showRulePack();
        }
        fit();
    }

    private void showRulePack() {
        String id = context.model().getAudit().getRulePack();
        rulePack.deselectAll();
        rulePackNote.setText(NLS.bind(Messages.Analysis_unknownPack, id));
        for (int i = 0; i < packs.size(); i++) {
            if (packs.get(i).id().equals(id)) {
                rulePack.select(i);
                rulePackNote.setText((packs.get(i).source() + ". " + packs.get(i).provenance()).replace("&", "&&"));
            }
        }
    }

    private void fit() {
        if (body != null && !body.isDisposed()) {
            body.layout(true, true);
            int width = Math.max(1, Math.min(WIDEST, scroller.getClientArea().width));
            scroller.setMinSize(body.computeSize(width, SWT.DEFAULT));
        }
    }

    @Override
    public Control control() {
        return scroller;
    }

    @Override
    public void modelChanged() {
        if (shownUnits != context.model().getUnits()) {
            rebuild();
        } else {
            refresh();
        }
    }

    @Override
    public void select(Set<String> ids) {
        // What holds for the whole structure does not depend on what is selected.
    }

    @Override
    public boolean reveals(String id) {
        return false;
    }

    @Override
    public void setFocus() {
        units.setFocus();
    }
}
