package dev.nearlimit.codes.family;

import dev.nearlimit.codes.InvalidCodeException;

/** Reads the parameters of a designator and says what is wrong with them in the words of the family's form. */
final class Parameters {
    private Parameters() {}

    /**
     * The whole numbers of a list separated by commas.
     *
     * @param names one name a number, as the family's form has them
     */
    static int[] integers(CodeFamily family, String parameters, String... names) {
        String[] texts = texts(family, parameters, names.length);
        int[] values = new int[names.length];
        for (int i = 0; i < names.length; i++) {
            values[i] = integer(family, parameters, texts[i], names[i]);
        }
        return values;
    }

    /** The parts of a list separated by commas, trimmed; exactly {@code count} of them. */
    static String[] texts(CodeFamily family, String parameters, int count) {
        String[] texts = parameters.split(",", -1);
        if (texts.length != count || parameters.isBlank()) {
            int found = parameters.isBlank() ? 0 : texts.length;
            throw new InvalidCodeException(family.name() + ":" + parameters + " has " + found
                    + (found == 1 ? " parameter" : " parameters") + ", expected " + family.form());
        }
        for (int i = 0; i < count; i++) {
            texts[i] = texts[i].strip();
        }
        return texts;
    }

    static int integer(CodeFamily family, String parameters, String text, String name) {
        // Nine digits always fit an int and are more than any family takes.
        if (!text.matches("[0-9]{1,9}")) {
            throw new InvalidCodeException(family.name() + ":" + parameters + ": " + name + " is '" + text
                    + "', expected a whole number (" + family.form() + ")");
        }
        return Integer.parseInt(text);
    }

    /** A one-line refusal of parameters that were read but name no code of the family. */
    static InvalidCodeException refuse(CodeFamily family, String parameters, String reason) {
        return new InvalidCodeException(family.name() + ":" + parameters + ": " + reason);
    }
}
