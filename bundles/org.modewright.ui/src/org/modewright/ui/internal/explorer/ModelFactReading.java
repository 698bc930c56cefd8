package org.modewright.ui.internal.explorer;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.osgi.util.NLS;
import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditStatus;
import org.modewright.model.ModelFileException;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.Numbers;
import org.modewright.workspace.ModelFiles;
import org.modewright.workspace.RunRegistry;
import org.modewright.workspace.RunStoreException;

/** Gathers what the explorer says about a model. */
final class ModelFactReading {

    private static final int TITLE = 0;
    private static final int SIZE = 1;
    private static final int RESULT = 2;

    private final RunRegistry registry;

    ModelFactReading(RunRegistry registry) {
        this.registry = registry;
    }

    List<ModelFact> read(IFile file) {
        List<ModelFact> facts = new ArrayList<>();
        try {
            addModel(facts, file, ModelFiles.load(file));
        } catch (ModelFileException broken) {
            facts.add(new ModelFact(file, SIZE, broken.reason(), Images.ERROR));
        }
        addResult(facts, file);
        return facts;
    }

    private static void addModel(List<ModelFact> facts, IFile file, StructuralModel model) {
        if (model.getTitle() != null && !model.getTitle().isBlank()) {
            facts.add(new ModelFact(file, TITLE, model.getTitle(), Images.INFORMATION));
        }
        String size = NLS.bind(Messages.Explorer_size, new Object[] {
            Numbers.counted(model.getNodes().size(), Messages.Explorer_node, Messages.Explorer_nodes),
            Numbers.counted(model.getMembers().size(), Messages.Explorer_member, Messages.Explorer_members),
            model.getUnits().getLiteral()});
        facts.add(new ModelFact(file, SIZE, size, Images.SHAPE));
    }

    private void addResult(List<ModelFact> facts, IFile file) {
        try {
            facts.add(registry.lastRun(file).map(run -> result(file, run.result()))
                    .orElseGet(() -> new ModelFact(file, RESULT, Messages.Explorer_noResult, Images.NOT_JUDGED)));
        } catch (RunStoreException damaged) {
            facts.add(new ModelFact(file, RESULT, damaged.getMessage(), Images.WARNING));
        }
    }

    private static ModelFact result(IFile file, AuditResult result) {
        String modes = Numbers.counted(result.modal().modes().size(), Messages.Explorer_mode, Messages.Explorer_modes);
        return new ModelFact(file, RESULT, NLS.bind(word(result.status()), modes),
                result.status() == AuditStatus.PASSED ? Images.PASSED : Images.FAILED);
    }

    private static String word(AuditStatus status) {
        return switch (status) {
            case PASSED -> Messages.Explorer_passed;
            case NOT_PASSED -> Messages.Explorer_notPassed;
            case UNSTABLE -> Messages.Explorer_unstable;
            case INCOMPLETE -> Messages.Explorer_incomplete;
        };
    }
}
