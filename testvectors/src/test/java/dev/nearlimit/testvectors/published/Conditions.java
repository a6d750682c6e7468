package dev.nearlimit.testvectors.published;

import java.util.HashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The numbers in the conditions of a row: {@code R=1/2}, {@code n=128 k=64 FER=0.0001}. */
final class Conditions {
    private static final Pattern PAIR = Pattern.compile("(\\w+)=([0-9./e+-]+)");

    private final PublishedValue row;
    private final Map<String, String> values = new HashMap<>();

    Conditions(PublishedValue row) {
        this.row = row;
        Matcher pair = PAIR.matcher(row.conditions());
        while (pair.find()) {
            values.put(pair.group(1), pair.group(2));
        }
    }

    double number(String name) {
        String text = values.get(name);
        if (text == null) {
            throw new IllegalArgumentException(row + " (" + row.file() + " line " + row.line() + ") states no " + name);
        }
        String[] parts = text.split("/");
        double number = Double.parseDouble(parts[0]);
        return parts.length == 1 ? number : number / Double.parseDouble(parts[1]);
    }

    int integer(String name) {
        return Math.toIntExact((long) number(name));
    }
}
