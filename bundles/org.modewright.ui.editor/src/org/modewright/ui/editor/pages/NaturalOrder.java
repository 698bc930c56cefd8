package org.modewright.ui.editor.pages;

import java.util.Comparator;

/** Sorts names as people do: runs of digits by their number, so that N2 stands before N10; letters without regard to case. */
public final class NaturalOrder implements Comparator<String> {

    @Override
    public int compare(String first, String second) {
        int i = 0;
        int j = 0;
        while (i < first.length() && j < second.length()) {
            int endOfFirst = endOfDigits(first, i);
            int endOfSecond = endOfDigits(second, j);
            int order;
            if (endOfFirst > i && endOfSecond > j) {
                order = compareDigits(first.substring(i, endOfFirst), second.substring(j, endOfSecond));
                i = endOfFirst;
                j = endOfSecond;
            } else {
                order = Character.compare(Character.toLowerCase(first.charAt(i++)), Character.toLowerCase(second.charAt(j++)));
            }
            if (order != 0) {
                return order;
            }
        }
        int rest = Integer.compare(first.length() - i, second.length() - j);
        return rest != 0 ? rest : first.compareTo(second);
    }

    private static int endOfDigits(String text, int from) {
        int end = from;
        while (end < text.length() && text.charAt(end) >= '0' && text.charAt(end) <= '9') {
            end++;
        }
        return end;
    }

    /** Digits of any number without leading zeros: the longer one is the larger. */
    private static int compareDigits(String first, String second) {
        String one = first.replaceFirst("^0+(?=.)", "");
        String other = second.replaceFirst("^0+(?=.)", "");
        return one.length() != other.length() ? Integer.compare(one.length(), other.length()) : one.compareTo(other);
    }
}
