package dev.nearlimit.cli.requirement;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.family.CodeFamily;
import dev.nearlimit.codes.matrix.MatrixFile;
import dev.nearlimit.codes.matrix.MatrixLimits;
import dev.nearlimit.codes.matrix.MatrixRole;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.catalogue.DecoderCatalogue;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.shortlist.requirement.Candidate;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Reads the list of candidates: codes by designator, whole families, or the user's own matrices, each with decoders. */
final class CandidateReader {
    private final Catalogue catalogue = Catalogue.standard();
    private final FieldReader root;
    private final Path folder;

    /** @param folder where matrix files named by a relative path are looked for */
    CandidateReader(FieldReader root, Path folder) {
        this.root = root;
        this.folder = folder;
    }

    List<Candidate> read() {
        List<Candidate> candidates = new ArrayList<>();
        int index = 0;
        for (YamlNode item : root.list("candidates")) {
            FieldReader fields = root.item("candidates", index++, item);
            List<Named> codes = codes(fields, item);
            List<YamlNode> decoders = fields.list("decoders");
            if (decoders.isEmpty()) {
                throw fields.at(item, "field '" + fields.dotted("decoders") + "' is missing or empty");
            }
            List<DecoderChoice> choices = fields.values("decoders", DecoderDesignator::parse);
            fields.refuseUnknown();
            for (Named named : codes) {
                requireRedundancy(fields, item, named.code());
                for (int i = 0; i < choices.size(); i++) {
                    requireFit(fields, decoders.get(i), choices.get(i), named.code());
                }
                candidates.add(new Candidate(named.code(), named.family(), choices));
            }
        }
        return candidates;
    }

    /** A code with the name of its family. */
    private record Named(Code code, String family) {}

    private List<Named> codes(FieldReader fields, YamlNode item) {
        if (fields.has("code") == fields.has("family")) {
            throw fields.at(
                    item,
                    "a candidate needs exactly one of 'code' and 'family', found "
                            + (fields.has("code") ? "both" : "neither"));
        }
        return fields.has("family") ? family(fields) : List.of(code(fields));
    }

    private List<Named> family(FieldReader fields) {
        String wanted = fields.text("family");
        CodeFamily family = catalogue.families().stream()
                .filter(each -> each.name().equals(wanted))
                .findFirst()
                .orElseThrow(() -> fields.at(
                        fields.place("family"),
                        "unknown family '" + wanted + "'; known are "
                                + String.join(
                                        ", ",
                                        catalogue.families().stream()
                                                .map(CodeFamily::name)
                                                .toList())));
        return family.listed().stream()
                .map(designator -> new Named(catalogue.build(designator), family.name()))
                .toList();
    }

    private Named code(FieldReader fields) {
        String designator = fields.text("code");
        YamlNode place = fields.place("code");
        if (fields.has("matrix")) {
            MatrixRole role = role(fields);
            Path file = folder.resolve(designator);
            return new Named(
                    fields.located(place, () -> MatrixFile.readCode(file, role, MatrixLimits.standard())), "matrix");
        }
        boolean looksLikeFile = designator.contains("/") || designator.matches(".*\\.(mtx|csv)");
        if (looksLikeFile && !catalogue.isKnownFamily(designator)) {
            throw fields.at(place, designator + " looks like a matrix file: add matrix: generator or matrix: parity");
        }
        String family = designator.split(":", 2)[0];
        return new Named(fields.located(place, () -> catalogue.build(designator)), family);
    }

    private static MatrixRole role(FieldReader fields) {
        String text = fields.text("matrix");
        return switch (text) {
            case "generator" -> MatrixRole.GENERATOR;
            case "parity" -> MatrixRole.PARITY_CHECK;
            default ->
                throw fields.at(fields.place("matrix"), "matrix is '" + text + "', expected generator or parity");
        };
    }

    private static void requireRedundancy(FieldReader fields, YamlNode item, Code code) {
        if (code.k() == code.n()) {
            throw fields.at(
                    item,
                    code.designator() + " has no redundancy (n = k = " + code.n() + "), so that it corrects nothing");
        }
    }

    private static void requireFit(FieldReader fields, YamlNode place, DecoderChoice choice, Code code) {
        DecoderFamily family =
                DecoderCatalogue.standard().family(choice.decoder().family());
        family.objection(code).ifPresent(why -> {
            throw fields.at(place, "decoder " + family.name() + " does not fit " + code.designator() + ": " + why);
        });
    }
}
