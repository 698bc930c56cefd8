package org.modewright.ui.editor;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** The pages of the editor. What is not shown is not brought up to date before it comes to the top: a large model has large pages. */
final class Pages {

    private final List<EditorPage> all = new ArrayList<>();
    private final Set<EditorPage> outdated = new HashSet<>();
    private EditorPage top;

    void add(EditorPage page) {
        all.add(page);
        top = top == null ? page : top;
    }

    void clear() {
        all.clear();
        outdated.clear();
        top = null;
    }

    /** The page on top; null while there is none. */
    EditorPage top() {
        return top;
    }

    /** Says which page has come to the top. */
    void shown(int index, Set<String> selected) {
        top = all.get(index);
        if (outdated.remove(top)) {
            top.modelChanged();
        }
        top.select(selected);
    }

    void modelChanged() {
        outdated.addAll(all);
        outdated.remove(top);
        if (top != null) {
            top.modelChanged();
        }
    }

    void findingsChanged() {
        outdated.addAll(all);
        outdated.remove(top);
        if (top != null) {
            top.findingsChanged();
        }
    }

    /** Index of the page of a kind; -1 if there is none. */
    int indexOf(Class<? extends EditorPage> kind) {
        for (int i = 0; i < all.size(); i++) {
            if (kind.isInstance(all.get(i))) {
                return i;
            }
        }
        return -1;
    }

    /** Index of the page that shows an object itself, preferably the one on top; -1 if there is none. */
    int indexThatReveals(String id) {
        if (top != null && top.reveals(id)) {
            return all.indexOf(top);
        }
        for (int i = all.size() - 1; i >= 0; i--) {
            if (all.get(i).reveals(id)) {
                return i;
            }
        }
        return -1;
    }
}
