package dev.nearlimit.cli.simulate;

import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.simulation.BlockOrigins;

/**
 * What a run cost; depends on the machine, and so stands apart from the results.
 *
 * @param kernel which kernels did the arithmetic
 * @param n code bits a frame
 * @param blocks where the blocks of frames came from
 * @param kept whether blocks are kept in a journal that outlives the run
 */
record Performance(String kernel, int threads, int n, double elapsedS, BlockOrigins blocks, boolean kept) {
    private static final double MEGA = 1e6;

    /** Of the frames that were computed: what the journal had says nothing about this machine. */
    private double framesPerS() {
        return blocks.framesComputed() / elapsedS;
    }

    private double codedMbPerS() {
        return framesPerS() * n / MEGA;
    }

    /** In words, as the last lines of a table. */
    String closingLine() {
        String line = "Took " + Numbers.duration(elapsedS) + " on " + threads
                + (threads == 1 ? " thread (" : " threads (")
                + kernel + " kernels): " + Numbers.engineering(framesPerS()) + " frames/s, "
                + Numbers.fixed(codedMbPerS(), codedMbPerS() < 10 ? 2 : 0) + " Mb/s of code bits."
                + (kept ? " " + fromJournal() : "");
        return String.join("\n", TextTable.wrap(line, TextTable.WIDTH)) + "\n";
    }

    private String fromJournal() {
        return "Of " + (blocks.found() + blocks.computed()) + " blocks of frames " + blocks.found()
                + " came from the journal.";
    }

    void put(ObjectNode cost) {
        cost.put("kernel", kernel);
        cost.put("threads", threads);
        JsonText.put(cost, "codedMbPerS", codedMbPerS());
        JsonText.put(cost, "framesPerS", framesPerS());
        JsonText.put(cost, "elapsedS", elapsedS);
        cost.put("blocksComputed", blocks.computed());
        cost.put("blocksFromJournal", blocks.found());
    }
}
