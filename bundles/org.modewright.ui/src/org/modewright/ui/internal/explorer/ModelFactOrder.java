package org.modewright.ui.internal.explorer;

import org.eclipse.jface.viewers.Viewer;
import org.eclipse.jface.viewers.ViewerComparator;

/** Keeps the lines below a model in their own order. */
public final class ModelFactOrder extends ViewerComparator {

    @Override
    public int compare(Viewer viewer, Object first, Object second) {
        return first instanceof ModelFact one && second instanceof ModelFact other ? Integer.compare(one.place(), other.place()) : 0;
    }
}
