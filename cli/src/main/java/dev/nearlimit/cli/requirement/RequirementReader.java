package dev.nearlimit.cli.requirement;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.shortlist.requirement.InvalidRequirementException;
import dev.nearlimit.shortlist.requirement.Link;
import dev.nearlimit.shortlist.requirement.Loss;
import dev.nearlimit.shortlist.requirement.Payload;
import dev.nearlimit.shortlist.requirement.Requirement;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Reads a requirement file. */
public final class RequirementReader {
    private final FieldReader root;

    private RequirementReader(FieldReader root) {
        this.root = root;
    }

    /**
     * Reads a requirement.
     *
     * @param file the file as the user named it; matrix files in it are looked for beside it
     * @throws InputException naming file, line and column, if anything is missing, unknown or out of range
     */
    public static Requirement read(Path file) {
        FieldReader root = new FieldReader(file.toString(), "", YamlFile.read(file));
        RequirementReader reader = new RequirementReader(root);
        try {
            return reader.requirement(
                    new CandidateReader(root, file.getParent() == null ? Path.of("") : file.getParent()));
        } catch (InvalidRequirementException e) {
            throw reader.at(e);
        }
    }

    private Requirement requirement(CandidateReader candidates) {
        String name = root.text("name");
        String description = root.optionalText("description").orElse("");
        Link link = link(root.group("link"));
        Payload payload = payload(root.group("payload"));
        OptionalDouble latencyS = root.optionalNumber("latencyS", "s");
        OptionalDouble operationsPerBit = root.optionalGroup("decoderBudget")
                .map(RequirementReader::operationsPerBit)
                .orElse(OptionalDouble.empty());
        Requirement requirement =
                new Requirement(name, description, link, payload, latencyS, operationsPerBit, candidates.read());
        root.refuseUnknown();
        return requirement;
    }

    private static Link link(FieldReader fields) {
        double bandwidthHz = fields.number("bandwidthHz", "Hz");
        double rollOff = fields.number("rollOff", "");
        double bitRateBps = fields.number("bitRateBps", "bit/s");
        OptionalDouble cOverN0DbHz = fields.optionalNumber("cOverN0DbHz", "dBHz");
        OptionalDouble availableEbn0Db = fields.optionalNumber("availableEbn0Db", "dB");
        List<Loss> losses = losses(fields);
        List<Modulation> modulations = fields.values("modulations", Modulation::of);
        fields.refuseUnknown();
        return new Link(bandwidthHz, rollOff, bitRateBps, cOverN0DbHz, availableEbn0Db, losses, modulations);
    }

    private static List<Loss> losses(FieldReader link) {
        List<Loss> losses = new ArrayList<>();
        for (YamlNode item : link.list("losses")) {
            FieldReader fields = link.item("losses", losses.size(), item);
            String name = fields.text("name");
            double db = fields.number("db", "dB");
            fields.refuseUnknown();
            try {
                losses.add(new Loss(name, db));
            } catch (InvalidRequirementException e) {
                throw fields.at(fields.place("db"), e.getMessage());
            }
        }
        return losses;
    }

    private static Payload payload(FieldReader fields) {
        int bits = fields.wholeNumber("bits", "bits");
        double fer = fields.number("fer", "payload error rate");
        fields.refuseUnknown();
        return new Payload(bits, fer);
    }

    private static OptionalDouble operationsPerBit(FieldReader budget) {
        OptionalDouble operations = budget.optionalNumber("operationsPerBit", "operations per information bit");
        budget.refuseUnknown();
        return operations;
    }

    /** Finds the place of the field that a requirement complains of: the field itself, or what of its path is there. */
    private InputException at(InvalidRequirementException e) {
        YamlNode place = root.place("");
        for (String name : e.field().split("\\.")) {
            if (place instanceof YamlNode.Mapping mapping && mapping.fields().containsKey(name)) {
                place = mapping.fields().get(name).value();
            }
        }
        return new InputException(e.getMessage(), root.file(), place.line(), place.column());
    }
}
