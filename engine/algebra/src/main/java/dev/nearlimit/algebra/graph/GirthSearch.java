package dev.nearlimit.algebra.graph;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;
import java.util.OptionalInt;

/**
 * Breadth-first search for a shortest cycle. Nodes are numbered bits first, then checks.
 *
 * <p>In a search from one root, levels are finished in order, and the first edge that leads to a node already reached (and
 * is not the edge to the parent) closes a walk through the root of length 2 (level + 1), where level is that of the edge's
 * nearer end: the graph has no edge within a level, since levels alternate between bits and checks. No later edge closes a
 * shorter walk, and any such walk contains a cycle of at most its length.
 */
final class GirthSearch {
    private static final int NOT_REACHED = -1;

    private final SparseBitMatrix bits;
    private final SparseBitMatrix checks;
    private final int[] level;
    private final int[] parent;
    private final int[] queue;
    private int shortest = Integer.MAX_VALUE;

    GirthSearch(SparseBitMatrix bits, SparseBitMatrix checks) {
        this.bits = bits;
        this.checks = checks;
        int nodes = bits.rows() + checks.rows();
        this.level = new int[nodes];
        this.parent = new int[nodes];
        this.queue = new int[nodes];
        Arrays.fill(level, NOT_REACHED);
    }

    OptionalInt girth() {
        for (int bit = 0; bit < bits.rows() && shortest > 4; bit++) {
            int reached = searchFrom(bit);
            for (int i = 0; i < reached; i++) {
                level[queue[i]] = NOT_REACHED;
            }
        }
        return shortest == Integer.MAX_VALUE ? OptionalInt.empty() : OptionalInt.of(shortest);
    }

    /** Lowers {@code shortest} if a shorter cycle passes through the root; returns how many nodes are in the queue. */
    private int searchFrom(int root) {
        int tail = 0;
        queue[tail++] = root;
        level[root] = 0;
        parent[root] = NOT_REACHED;
        for (int head = 0; head < tail; head++) {
            int node = queue[head];
            int closed = 2 * (level[node] + 1);
            if (closed >= shortest) {
                return tail;
            }
            boolean isBit = node < bits.rows();
            SparseBitMatrix side = isBit ? bits : checks;
            int row = isBit ? node : node - bits.rows();
            int offset = isBit ? bits.rows() : 0;
            for (int i = 0; i < side.rowWeight(row); i++) {
                int next = side.column(row, i) + offset;
                if (level[next] == NOT_REACHED) {
                    level[next] = level[node] + 1;
                    parent[next] = node;
                    queue[tail++] = next;
                } else if (next != parent[node]) {
                    shortest = closed;
                    return tail;
                }
            }
        }
        return tail;
    }
}
