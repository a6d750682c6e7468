package dev.nearlimit.cli.requirement;

import java.util.List;
import java.util.Map;

/** A piece of a YAML file that knows where it stands; lines and columns count from 1. */
sealed interface YamlNode {
    int line();

    int column();

    /** What it is, in words for a message. */
    String kind();

    /** Named fields in the order of the file. */
    record Mapping(Map<String, Field> fields, int line, int column) implements YamlNode {
        @Override
        public String kind() {
            return "a group of fields";
        }
    }

    /** A field of a mapping; the place is that of its name. */
    record Field(YamlNode value, int line, int column) {}

    /** A list. */
    record Sequence(List<YamlNode> items, int line, int column) implements YamlNode {
        @Override
        public String kind() {
            return "a list";
        }
    }

    /** A single value as it was written; empty where nothing stands. */
    record Scalar(String text, int line, int column) implements YamlNode {
        @Override
        public String kind() {
            return text.isEmpty() ? "nothing" : "'" + text + "'";
        }
    }
}
