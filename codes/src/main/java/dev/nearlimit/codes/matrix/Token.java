package dev.nearlimit.codes.matrix;

import java.util.ArrayList;
import java.util.List;

/**
 * A word of a line with its place.
 *
 * @param text the word, without blanks
 * @param column its first character in the line, counted from 1
 */
record Token(String text, int column) {
    /** The words of a line, at most {@code most} and one more that shows that there are too many. */
    static List<Token> split(String line, int most) {
        List<Token> tokens = new ArrayList<>();
        int at = 0;
        while (tokens.size() <= most) {
            while (at < line.length() && line.charAt(at) <= ' ') {
                at++;
            }
            if (at == line.length()) {
                break;
            }
            int start = at;
            while (at < line.length() && line.charAt(at) > ' ') {
                at++;
            }
            tokens.add(new Token(line.substring(start, at), start + 1));
        }
        return tokens;
    }

    String quoted() {
        return MatrixFormatException.quoted(text);
    }
}
