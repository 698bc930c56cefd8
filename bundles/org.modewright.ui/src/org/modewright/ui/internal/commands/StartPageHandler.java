package org.modewright.ui.internal.commands;

import org.eclipse.core.commands.AbstractHandler;
import org.eclipse.core.commands.ExecutionEvent;
import org.eclipse.core.commands.ExecutionException;
import org.eclipse.ui.handlers.HandlerUtil;
import org.modewright.ui.internal.start.StartPage;

/** Opens the start page. */
public final class StartPageHandler extends AbstractHandler {

    @Override
    public Object execute(ExecutionEvent event) throws ExecutionException {
        StartPage.open(HandlerUtil.getActiveWorkbenchWindowChecked(event).getActivePage());
        return null;
    }
}
