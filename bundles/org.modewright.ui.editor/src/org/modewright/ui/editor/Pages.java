package org.modewright.ui.editor;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;

/**
 * The pages of the editor. A page is made when it comes to the top for the first time, and what is not shown is not brought up to date
 * before it comes to the top again: a large model has large pages.
 */
final class Pages {

    private static final class Slot {

        private final Class<? extends EditorPage> kind;
        private final Composite place;
        private final Function<Composite, EditorPage> maker;
        private EditorPage page;
        private boolean outdated;

        Slot(Class<? extends EditorPage> kind, Composite place, Function<Composite, EditorPage> maker) {
            this.kind = kind;
            this.place = place;
            this.maker = maker;
        }

        EditorPage page() {
            if (page == null) {
                page = maker.apply(place);
                place.layout(true, true);
            } else if (outdated) {
                page.modelChanged();
            }
            outdated = false;
            return page;
        }
    }

    private final List<Slot> slots = new ArrayList<>();
    private Slot top;

    /** Takes in a page; returns the control that its tab shows. */
    Composite add(Composite parent, Class<? extends EditorPage> kind, Function<Composite, EditorPage> maker) {
        Composite place = new Composite(parent, SWT.NONE);
        place.setLayout(new FillLayout());
        slots.add(new Slot(kind, place, maker));
        return place;
    }

    void clear() {
        slots.clear();
        top = null;
    }

    /** The page on top; null while there is none. */
    EditorPage top() {
        return top == null ? null : top.page();
    }

    /** Says which page has come to the top. */
    void shown(int index, Set<String> selected) {
        top = slots.get(index);
        top.page().select(selected);
    }

    void modelChanged() {
        outdate();
        if (top != null && top.page != null) {
            top.page.modelChanged();
        }
    }

    void findingsChanged() {
        outdate();
        if (top != null && top.page != null) {
            top.page.findingsChanged();
        }
    }

    private void outdate() {
        slots.forEach(slot -> slot.outdated = slot != top);
    }

    /** Index of the page of a kind; -1 if there is none. */
    int indexOf(Class<? extends EditorPage> kind) {
        for (int i = 0; i < slots.size(); i++) {
            if (slots.get(i).kind == kind) {
                return i;
            }
        }
        return -1;
    }
}
