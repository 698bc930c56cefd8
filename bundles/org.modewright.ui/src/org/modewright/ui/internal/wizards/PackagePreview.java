package org.modewright.ui.internal.wizards;

import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.layout.TableColumnLayout;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.ColumnWeightData;
import org.eclipse.jface.viewers.ColumnViewerToolTipSupport;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.modewright.exchange.Imported;
import org.modewright.exchange.Problem;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.widgets.EmptyState;
import org.modewright.ui.widgets.Numbers;

/** What is in a package, or everything that is wrong with it. */
final class PackagePreview extends Composite {

    private record Count(String kind, int number) {
    }

    private final StackLayout stack = new StackLayout();
    private final EmptyState nothing;
    private final Composite content;
    private final Label summary;
    private final TableViewer counts;
    private final TableViewer warnings;
    private final Composite faults;
    private final TableViewer problems;

    PackagePreview(Composite parent) {
        super(parent, SWT.BORDER);
        setLayout(stack);
        nothing = new EmptyState(this);
        nothing.show(Messages.Import_empty, null, null);
        content = new Composite(this, SWT.NONE);
        GridLayoutFactory.fillDefaults().margins(4, 4).numColumns(2).applyTo(content);
        summary = new Label(content, SWT.WRAP);
        GridDataFactory.fillDefaults().span(2, 1).grab(true, false).applyTo(summary);
        counts = table(content, "import.counts");
        warnings = table(content, "import.warnings");
        createContentColumns();
        faults = new Composite(this, SWT.NONE);
        GridLayoutFactory.fillDefaults().applyTo(faults);
        problems = table(faults, "import.problems");
        createProblemColumns();
        clear();
    }

    void clear() {
        show(nothing);
    }

    void showProblems(List<Problem> list) {
        problems.setInput(list);
        show(faults);
    }

    void showContent(Imported imported) {
        StructuralModel model = imported.model();
        String title = model.getTitle() == null || model.getTitle().isBlank() ? model.getName() : model.getTitle();
        summary.setText(NLS.bind(Messages.Import_summary, title, model.getUnits().getLiteral()));
        counts.setInput(counts(model));
        warnings.setInput(imported.warnings().isEmpty() ? List.of(Messages.Import_noWarnings) : imported.warnings());
        show(content);
    }

    private void show(Composite top) {
        stack.topControl = top;
        layout(true, true);
    }

    private static List<Count> counts(StructuralModel model) {
        return StructurePackage.Literals.STRUCTURAL_MODEL.getEAllContainments().stream().filter(EReference::isMany)
                .map(kind -> new Count(words(kind.getName()), ((List<?>) model.eGet(kind)).size()))
                .filter(count -> count.number() > 0).toList();
    }

    /** "rigidFloors" as "Rigid floors". */
    private static String words(String feature) {
        String spaced = feature.replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(Locale.ROOT);
        return Character.toUpperCase(spaced.charAt(0)) + spaced.substring(1);
    }

    private void createContentColumns() {
        TableColumnLayout layout = (TableColumnLayout) counts.getTable().getParent().getLayout();
        column(counts, layout, Messages.Import_kind, 60, SWT.LEFT, item -> ((Count) item).kind());
        column(counts, layout, Messages.Import_number, 40, SWT.RIGHT, item -> Numbers.count(((Count) item).number()));
        column(warnings, (TableColumnLayout) warnings.getTable().getParent().getLayout(), Messages.Import_remarks, 100, SWT.LEFT,
                Object::toString);
    }

    private void createProblemColumns() {
        TableColumnLayout layout = (TableColumnLayout) problems.getTable().getParent().getLayout();
        column(problems, layout, Messages.Import_columnFile, 22, SWT.LEFT, item -> ((Problem) item).file());
        column(problems, layout, Messages.Import_columnRow, 9, SWT.RIGHT, item -> row((Problem) item));
        column(problems, layout, Messages.Import_columnColumn, 13, SWT.LEFT, item -> ((Problem) item).column());
        column(problems, layout, Messages.Import_columnValue, 14, SWT.LEFT, item -> ((Problem) item).value());
        column(problems, layout, Messages.Import_columnText, 60, SWT.LEFT, item -> ((Problem) item).text());
    }

    private static String row(Problem problem) {
        return problem.row() > 0 ? Numbers.count(problem.row()) : "";
    }

    private static TableViewer table(Composite parent, String id) {
        Composite holder = new Composite(parent, SWT.NONE);
        holder.setLayout(new TableColumnLayout());
        GridDataFactory.fillDefaults().grab(true, true).applyTo(holder);
        TableViewer viewer = new TableViewer(holder, SWT.FULL_SELECTION | SWT.V_SCROLL | SWT.H_SCROLL);
        viewer.setContentProvider(ArrayContentProvider.getInstance());
        viewer.getTable().setHeaderVisible(true);
        ColumnViewerToolTipSupport.enableFor(viewer);
        viewer.getTable().setData(UiIds.WIDGET_ID, id);
        return viewer;
    }

    private static void column(TableViewer viewer, TableColumnLayout layout, String header, int weight, int style,
            Function<Object, String> text) {
        TableViewerColumn column = new TableViewerColumn(viewer, style);
        column.getColumn().setText(header);
        layout.setColumnData(column.getColumn(), new ColumnWeightData(weight, 40));
        column.setLabelProvider(new ColumnLabelProvider() {
            @Override
            public String getText(Object element) {
                return text.apply(element);
            }

            @Override
            public String getToolTipText(Object element) {
                return text.apply(element);
            }
        });
    }
}
