package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.simulation.importance.ErrorSet;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads a file of sets of positions: one set a line, its positions counted from 0, separated by blanks, tabs or commas.
 * Empty lines and what follows a {@code #} are passed over.
 */
public final class ErrorSetFile {
    /** A million positions; whoever has more has another kind of file. */
    private static final long MOST_BYTES = 1 << 23;

    private static final Pattern WORD = Pattern.compile("[^\\s,]+");
    private static final Pattern POSITION = Pattern.compile("\\d{1,9}");
    private static final int MOST_QUOTED = 24;

    private final String name;
    private final int n;
    private final List<ErrorSet> sets = new ArrayList<>();
    private final Map<ErrorSet, Integer> lineOf = new HashMap<>();

    private ErrorSetFile(String name, int n) {
        this.name = name;
        this.n = n;
    }

    /**
     * The sets of a file, in their order.
     *
     * @param path the file as the user named it
     * @param n length of the code: positions are 0 to n - 1
     * @throws InputException if the file cannot be read, or holds something else or no set
     */
    public static List<ErrorSet> read(Path path, int n) {
        ErrorSetFile file = new ErrorSetFile(path.toString(), n);
        List<String> lines = file.lines(path);
        for (int i = 0; i < lines.size(); i++) {
            file.take(lines.get(i), i + 1);
        }
        if (file.sets.isEmpty()) {
            throw file.wrong("found no set, expected one a line: positions counted from 0", 0, 0);
        }
        return file.sets;
    }

    private List<String> lines(Path path) {
        try {
            if (Files.isDirectory(path)) {
                throw wrong("is a folder, expected a file of sets of positions", 0, 0);
            }
            if (Files.size(path) > MOST_BYTES) {
                throw wrong("has " + Files.size(path) + " bytes, a file of sets at most " + MOST_BYTES, 0, 0);
            }
            return Files.readString(path, StandardCharsets.UTF_8).lines().toList();
        } catch (NoSuchFileException e) {
            throw wrong("found no such file, expected a file of sets of positions", 0, 0);
        } catch (CharacterCodingException e) {
            throw wrong("found bytes that are no text, expected a file of sets of positions", 0, 0);
        } catch (IOException e) {
            throw wrong("cannot be read: " + e.getMessage(), 0, 0);
        }
    }

    private void take(String line, int number) {
        int end = line.indexOf('#') < 0 ? line.length() : line.indexOf('#');
        Matcher words = WORD.matcher(line).region(0, end);
        Set<Integer> positions = new HashSet<>();
        while (words.find()) {
            int column = words.start() + 1;
            int position = position(words.group(), number, column);
            if (!positions.add(position)) {
                throw wrong("found position " + position + " twice in a set, expected each once", number, column);
            }
        }
        if (positions.isEmpty()) {
            return;
        }
        ErrorSet set =
                ErrorSet.of(positions.stream().mapToInt(Integer::intValue).toArray());
        Integer earlier = lineOf.putIfAbsent(set, number);
        if (earlier != null) {
            throw wrong("found the set of line " + earlier + " again, expected each once", number, 0);
        }
        sets.add(set);
    }

    private int position(String word, int line, int column) {
        if (!POSITION.matcher(word).matches() || Integer.parseInt(word) >= n) {
            String shown = word.length() > MOST_QUOTED ? word.substring(0, MOST_QUOTED) + ".." : word;
            throw wrong("found '" + shown + "', expected a position from 0 to " + (n - 1), line, column);
        }
        return Integer.parseInt(word);
    }

    private InputException wrong(String message, int line, int column) {
        return new InputException(message, name, line, column);
    }
}
