package org.treadwarm.physics.network;

import java.util.Arrays;
import java.util.Comparator;

/**
 * The reverse Cuthill-McKee numbering of a graph, which keeps neighbours close.
 *
 * <p>Source: E. Cuthill and J. McKee, "Reducing the bandwidth of sparse symmetric matrices", 1969; reversed after A. George.
 */
final class Ordering {
    private Ordering() {}

    /** The new position of each node. */
    static int[] reverseCuthillMcKee(int size, int[] from, int[] to) {
        int[][] neighbours = neighbours(size, from, to);
        Integer[] byDegree = new Integer[size];
        for (int i = 0; i < size; i++) {
            byDegree[i] = i;
        }
        Arrays.sort(byDegree, Comparator.comparingInt(i -> neighbours[i].length));
        int[] order = new int[size];
        boolean[] seen = new boolean[size];
        int filled = 0;
        for (int start : byDegree) {
            if (!seen[start]) {
                seen[start] = true;
                order[filled++] = start;
                for (int next = filled - 1; next < filled; next++) {
                    for (int neighbour : neighbours[order[next]]) {
                        if (!seen[neighbour]) {
                            seen[neighbour] = true;
                            order[filled++] = neighbour;
                        }
                    }
                }
            }
        }
        int[] position = new int[size];
        for (int i = 0; i < size; i++) {
            position[order[i]] = size - 1 - i;
        }
        return position;
    }

    /** The neighbours of each node, those with fewest neighbours first. */
    private static int[][] neighbours(int size, int[] from, int[] to) {
        int[] degree = new int[size];
        for (int link = 0; link < from.length; link++) {
            degree[from[link]]++;
            degree[to[link]]++;
        }
        int[][] neighbours = new int[size][];
        for (int i = 0; i < size; i++) {
            neighbours[i] = new int[degree[i]];
        }
        int[] filled = new int[size];
        for (int link = 0; link < from.length; link++) {
            neighbours[from[link]][filled[from[link]]++] = to[link];
            neighbours[to[link]][filled[to[link]]++] = from[link];
        }
        for (int[] list : neighbours) {
            insertionSortBy(degree, list);
        }
        return neighbours;
    }

    private static void insertionSortBy(int[] key, int[] list) {
        for (int i = 1; i < list.length; i++) {
            int node = list[i];
            int j = i - 1;
            while (j >= 0 && key[list[j]] > key[node]) {
                list[j + 1] = list[j];
                j--;
            }
            list[j + 1] = node;
        }
    }
}
