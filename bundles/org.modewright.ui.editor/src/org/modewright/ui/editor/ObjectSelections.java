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

    private static final int MOST = 200;

    private final List<ISelectionChangedListener> listeners = new CopyOnWriteArrayList<>();
    private ISelection selection = StructuredSelection.EMPTY;

    /** Publishes objects; of very many only the first, as the workbench asks each of them for every command that it might enable. */
    void publish(List<?> objects) {
        setSelection(new StructuredSelection(objects.subList(0, Math.min(MOST, objects.size()))));
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
