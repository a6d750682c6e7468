package dev.nearlimit.cli.requirement;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import dev.nearlimit.cli.failure.InputException;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Parses a YAML file into nodes that keep their places, which the library's own trees do not. */
final class YamlFile {
    /** A requirement is a page of text; anything of this size is something else. */
    private static final long MOST_BYTES = 1 << 20;

    private final String name;
    private final JsonParser parser;

    private YamlFile(String name, JsonParser parser) {
        this.name = name;
        this.parser = parser;
    }

    /**
     * Reads a file whose top level is a mapping.
     *
     * @param path the file as the user named it
     * @throws InputException if it cannot be read or is no such YAML
     */
    static YamlNode.Mapping read(Path path) {
        String name = path.toString();
        String text = text(path, name);
        try (JsonParser parser = new YAMLFactory().createParser(text)) {
            YamlFile file = new YamlFile(name, parser);
            JsonToken first = parser.nextToken();
            if (first == null) {
                throw new InputException("the file is empty, expected a requirement", name, 1, 0);
            }
            YamlNode root = file.node(first);
            if (parser.nextToken() != null) {
                throw file.at("found a second document, expected one requirement a file");
            }
            if (root instanceof YamlNode.Mapping mapping) {
                return mapping;
            }
            throw new InputException(
                    "found " + root.kind() + ", expected fields such as 'link:'", name, root.line(), root.column());
        } catch (JsonProcessingException e) {
            JsonLocation place = e.getLocation();
            String problem = e.getOriginalMessage().lines().findFirst().orElse("no YAML");
            throw new InputException(
                    "no valid YAML: " + problem,
                    name,
                    place == null ? 0 : place.getLineNr(),
                    place == null ? 0 : place.getColumnNr());
        } catch (IOException e) {
            throw new InputException("cannot be read: " + e.getMessage(), name, 0, 0);
        }
    }

    private static String text(Path path, String name) {
        try {
            if (Files.isDirectory(path)) {
                throw new InputException("is a folder, expected a requirement file", name, 0, 0);
            }
            if (Files.size(path) > MOST_BYTES) {
                throw new InputException(
                        "has " + Files.size(path) + " bytes, a requirement has at most " + MOST_BYTES, name, 0, 0);
            }
            return Files.readString(path, StandardCharsets.UTF_8);
        } catch (NoSuchFileException e) {
            throw new InputException("there is no such file", name, 0, 0);
        } catch (CharacterCodingException e) {
            throw new InputException("is no UTF-8 text", name, 0, 0);
        } catch (IOException e) {
            throw new InputException("cannot be read: " + e.getMessage(), name, 0, 0);
        }
    }

    private YamlNode node(JsonToken token) throws IOException {
        JsonLocation place = parser.currentTokenLocation();
        int line = place.getLineNr();
        int column = place.getColumnNr();
        return switch (token) {
            case START_OBJECT -> new YamlNode.Mapping(fields(), line, column);
            case START_ARRAY -> new YamlNode.Sequence(items(), line, column);
            case VALUE_NULL -> new YamlNode.Scalar("", line, column);
            default -> new YamlNode.Scalar(parser.getText().strip(), line, column);
        };
    }

    private Map<String, YamlNode.Field> fields() throws IOException {
        Map<String, YamlNode.Field> fields = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String field = parser.currentName();
            JsonLocation place = parser.currentTokenLocation();
            YamlNode value = node(parser.nextToken());
            YamlNode.Field previous =
                    fields.put(field, new YamlNode.Field(value, place.getLineNr(), place.getColumnNr()));
            if (previous != null) {
                throw new InputException(
                        "field '" + field + "' stands here again, first on line " + previous.line(),
                        name,
                        place.getLineNr(),
                        place.getColumnNr());
            }
        }
        return fields;
    }

    private List<YamlNode> items() throws IOException {
        List<YamlNode> items = new ArrayList<>();
        for (JsonToken token = parser.nextToken(); token != JsonToken.END_ARRAY; token = parser.nextToken()) {
            items.add(node(token));
        }
        return items;
    }

    private InputException at(String message) {
        JsonLocation place = parser.currentTokenLocation();
        return new InputException(message, name, place.getLineNr(), place.getColumnNr());
    }
}
