package org.wellwright.editor.edit;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.function.UnaryOperator;

/** Changed copies of lists, and names that are still free. */
public final class Lists {
    private Lists() {}

    /** With one item replaced. */
    public static <T> List<T> with(List<T> list, int index, UnaryOperator<T> change) {
        List<T> copy = new ArrayList<>(list);
        copy.set(index, change.apply(copy.get(index)));
        return copy;
    }

    /** With an item put in before an index. */
    public static <T> List<T> inserted(List<T> list, int index, T item) {
        List<T> copy = new ArrayList<>(list);
        copy.add(Math.max(0, Math.min(index, copy.size())), item);
        return copy;
    }

    /** With an item at the end. */
    public static <T> List<T> added(List<T> list, T item) {
        return inserted(list, list.size(), item);
    }

    /** Without one item. */
    public static <T> List<T> without(List<T> list, int index) {
        List<T> copy = new ArrayList<>(list);
        copy.remove(index);
        return copy;
    }

    /** With an item moved to another place; the same list if there is no such place. */
    public static <T> List<T> moved(List<T> list, int from, int to) {
        if (from < 0 || to < 0 || from >= list.size() || to >= list.size()) {
            return list;
        }
        List<T> copy = new ArrayList<>(list);
        copy.add(to, copy.remove(from));
        return copy;
    }

    /**
     * The wanted name, or with a number behind it if it is taken: "x", "x 2", "x 3"; {@code joint} stands before the
     * number.
     */
    public static String free(String wanted, String joint, Collection<String> taken) {
        if (!taken.contains(wanted)) {
            return wanted;
        }
        int number = 2;
        while (taken.contains(wanted + joint + number)) {
            number++;
        }
        return wanted + joint + number;
    }
}
