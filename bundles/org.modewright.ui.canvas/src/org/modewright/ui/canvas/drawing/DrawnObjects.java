package org.modewright.ui.canvas.drawing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.modewright.model.structure.Identified;
import org.modewright.render.Pick;
import org.modewright.render.PrimitiveKind;

/**
 * Which primitive stands for which object. Members, links and springs have numbers from 0 among the lines, signs from 0 among the
 * markers; floors have negative numbers, so that they are drawn and outlined but never picked.
 */
final class DrawnObjects {

    private static final int FIRST_FLOOR = -2;

    private final List<String> lines = new ArrayList<>();
    private final List<String> markers = new ArrayList<>();
    private final List<String> floors = new ArrayList<>();
    private final Map<String, Identified> objects = new HashMap<>();

    int line(Identified object) {
        return add(object, lines);
    }

    int marker(Identified object) {
        return add(object, markers);
    }

    int floor(Identified object) {
        return FIRST_FLOOR - add(object, floors);
    }

    private int add(Identified object, List<String> ids) {
        objects.put(object.getId(), object);
        ids.add(object.getId());
        return ids.size() - 1;
    }

    Identified object(String id) {
        return id == null ? null : objects.get(id);
    }

    /** The id of the object that a primitive stands for; null if it stands for none. */
    String id(Pick pick) {
        return pick == null || pick.id() < 0 ? null : id(pick.kind(), pick.id());
    }

    /** The id of the object behind the number of a primitive; null if it stands for none. */
    String id(PrimitiveKind kind, int number) {
        if (kind == PrimitiveKind.MARKER) {
            return number < 0 ? null : markers.get(number);
        }
        if (kind != PrimitiveKind.MEMBER) {
            return null;
        }
        return number >= 0 ? lines.get(number) : number <= FIRST_FLOOR ? floors.get(FIRST_FLOOR - number) : null;
    }

    /** Ids of the objects behind the numbers of primitives, each once. */
    Set<String> ids(int[] lineNumbers, int[] markerNumbers) {
        Set<String> ids = new LinkedHashSet<>();
        for (int number : lineNumbers) {
            ids.add(lines.get(number));
        }
        for (int number : markerNumbers) {
            ids.add(markers.get(number));
        }
        return ids;
    }
}
