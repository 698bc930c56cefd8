package org.modewright.ui.editor.commands;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.core.runtime.IConfigurationElement;
import org.eclipse.core.runtime.IExecutableExtension;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.ui.handlers.HandlerUtil;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.StructureEditor;

/** Runs one of the acts of the Structure menu in the active structure editor. */
public final class ActHandler extends AbstractHandler implements IExecutableExtension {

    private Act act;

    @Override
    public void setInitializationData(IConfigurationElement element, String property, Object data) {
        act = Act.valueOf((String) data);
    }

    @Override
    public Object execute(ExecutionEvent event) {
        if (HandlerUtil.getActiveEditor(event) instanceof StructureEditor editor && editor.model() != null) {
            try {
                act.run(editor);
            } catch (IllegalArgumentException refused) {
                MessageDialog.openInformation(editor.shell(), Messages.Act_refused, refused.getMessage());
            }
        }
        return null;
    }
}
