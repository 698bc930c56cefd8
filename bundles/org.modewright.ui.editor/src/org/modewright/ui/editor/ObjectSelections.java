package org.modewright.ui.editor;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.ISelectionChangedListener;
import org.eclipse.jface.viewers.ISelectionProvider;
import org.eclipse.jface.viewers.SelectionChangedEvent;
import org.eclipse.jface.viewers.StructuredSelection;

/** Tells the workbench which objects of the model are selected. */
final class ObjectSelections implements ISelectionProvider {

    private final List<ISelectionChangedListener> listeners = new CopyOnWriteArrayList<>();
    private ISelection selection = StructuredSelection.EMPTY;

    void publish(List<?> objects) {
        setSelection(new StructuredSelection(objects));
    }

    @Override
    public void addSelectionChangedListener(ISelectionChangedListener listener) {
        listeners.add(listener);
    }

    @Override
    public void removeSelectionChangedListener(ISelectionChangedListener listener) {
        listeners.remove(listener);
    }

    @Override
    public ISelection getSelection() {
        return selection;
    }

    @Override
    public void setSelection(ISelection newSelection) {
        selection = newSelection;
        SelectionChangedEvent event = new SelectionChangedEvent(this, newSelection);
        listeners.forEach(listener -> listener.selectionChanged(event));
    }
}
