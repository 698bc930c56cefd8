package org.modewright.ui.editor;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.stream.Collectors;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.widgets.Shell;
import org.modewright.model.Names;
import org.modewright.model.edit.commands.Deletion;

/** Asks before objects are deleted that others cannot be without. */
final class DeletionQuestion {

    private static final int NAMED = 8;

    private DeletionQuestion() {
    }

    /** Whether the user agrees; where nothing else goes there is no need to ask. */
    static boolean isAgreed(Shell shell, Collection<? extends EObject> objects, Deletion deletion) {
        return deletion.dependants().isEmpty() || MessageDialog.openQuestion(shell, Messages.Delete_title, text(objects, deletion));
    }

    private static String text(Collection<? extends EObject> objects, Deletion deletion) {
        String what = objects.size() == 1 ? Names.describe(objects.iterator().next()) : objects.size() + " objects";
        List<? extends EObject> others = List.copyOf(deletion.dependants());
        List<String> names = others.stream().limit(NAMED).map(Names::describe).collect(Collectors.toCollection(ArrayList::new));
        if (others.size() > NAMED) {
            names.add("…");
        }
        return NLS.bind(Messages.Delete_question, what) + NLS.bind(Messages.Delete_more, others.size(), String.join(", ", names));
    }
}
