package org.modewright.audit;

import java.util.ArrayList;
import java.util.List;

/** Lists of numbers in sentences. */
public final class Words {

    private Words() {
    }

    /** Ascending numbers with their runs joined: "3–8", "3, 5 and 7–9". */
    public static String numbers(List<Integer> numbers) {
        List<String> runs = new ArrayList<>();
        int from = 0;
        for (int to = 1; to <= numbers.size(); to++) {
            if (to == numbers.size() || numbers.get(to) != numbers.get(to - 1) + 1) {
                runs.addAll(run(numbers, from, to));
                from = to;
            }
        }
        int last = runs.size() - 1;
        return last < 1 ? String.join("", runs) : String.join(", ", runs.subList(0, last)) + " and " + runs.get(last);
    }

    private static List<String> run(List<Integer> numbers, int from, int to) {
        String first = Integer.toString(numbers.get(from));
        String last = Integer.toString(numbers.get(to - 1));
        return switch (to - from) {
            case 1 -> List.of(first);
            case 2 -> List.of(first, last);
            default -> List.of(first + "–" + last);
        };
    }
}
