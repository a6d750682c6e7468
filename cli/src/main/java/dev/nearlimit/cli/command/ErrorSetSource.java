package dev.nearlimit.cli.command;

import dev.nearlimit.algebra.distance.LightWords;
import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.input.ErrorSetFile;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.simulation.importance.ErrorSet;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.IntStream;

/**
 * Where sets of positions come from: {@code lightest}, the code's words of minimum weight; {@code weight:10}, its words
 * up to that weight; or the path of a file.
 *
 * @param text as the user typed it
 */
record ErrorSetSource(String text) {
    private static final Pattern UP_TO_WEIGHT = Pattern.compile("weight:(\\d{1,9})");

    /**
     * The sets for a code.
     *
     * @throws InputException if the file cannot be used, or no word is that light
     * @throws dev.nearlimit.algebra.weight.InfeasibleEnumerationException if the code has too many words
     */
    List<ErrorSet> sets(Code code) {
        if (text.equals("lightest")) {
            return sets(LightWords.lightest(code));
        }
        Matcher upToWeight = UP_TO_WEIGHT.matcher(text);
        if (upToWeight.matches()) {
            BitMatrix words = LightWords.upToWeight(code, Integer.parseInt(upToWeight.group(1)));
            if (words.rows() == 0) {
                throw new InputException(
                        code.designator() + " has no word of weight " + upToWeight.group(1) + " or less but zero");
            }
            return sets(words);
        }
        try {
            return ErrorSetFile.read(Path.of(text), code.n());
        } catch (InvalidPathException e) {
            throw new InputException("--sets is '" + text + "', expected lightest, weight:W or the path of a file");
        }
    }

    private static List<ErrorSet> sets(BitMatrix words) {
        return IntStream.range(0, words.rows())
                .mapToObj(r -> ErrorSet.of(words.onesOfRow(r)))
                .toList();
    }
}
