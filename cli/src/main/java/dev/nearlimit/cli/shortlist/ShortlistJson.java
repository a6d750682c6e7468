package dev.nearlimit.cli.shortlist;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.VersionText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.shortlist.requirement.Link;
import dev.nearlimit.shortlist.requirement.Loss;
import dev.nearlimit.shortlist.requirement.Requirement;
import java.util.OptionalDouble;

/** The results file: everything that the report is drawn from. Field names are stable and carry their units. */
final class ShortlistJson {
    private static final ObjectMapper MAPPER = new ObjectMapper();

    private ShortlistJson() {}

    static ObjectNode of(ShortlistRun run) {
        ObjectNode root = JsonText.object();
        ObjectNode tool = root.putObject("tool");
        tool.put("name", "nearlimit");
        tool.put("version", VersionText.toolVersion());
        tool.put("jvm", VersionText.jvm());
        tool.put("kernel", VersionText.kernels());
        tool.put("command", run.command());
        root.put("seed", run.result().seed());
        root.put("complete", run.result().complete());
        root.set("requirement", requirement(run.requirement(), run.file()));
        root.set("operatingPoints", MAPPER.valueToTree(run.result().operatingPoints()));
        ArrayNode cautions = root.putArray("cautions");
        Cautions.ALL.forEach(cautions::add);
        ObjectNode performance = root.putObject("performance");
        performance.put("kernel", VersionText.kernels());
        performance.put("threads", run.threads());
        JsonText.put(performance, "elapsedS", run.elapsedS());
        performance.put("framesSimulated", run.result().framesSimulated());
        performance.put("blocksComputed", run.blocks().computed());
        performance.put("blocksFromJournal", run.blocks().found());
        return root;
    }

    private static ObjectNode requirement(Requirement requirement, String file) {
        Link link = requirement.link();
        ObjectNode node = JsonText.object();
        node.put("name", requirement.name());
        node.put("description", requirement.description());
        node.put("file", file);
        JsonText.put(node, "bandwidthHz", link.bandwidthHz());
        JsonText.put(node, "rollOff", link.rollOff());
        JsonText.put(node, "bitRateBps", link.bitRateBps());
        put(node, "cOverN0DbHz", link.cOverN0DbHz());
        put(node, "availableEbn0Db", link.availableEbn0Db());
        ArrayNode losses = node.putArray("losses");
        for (Loss loss : link.losses()) {
            ObjectNode entry = losses.addObject();
            entry.put("name", loss.name());
            JsonText.put(entry, "db", loss.db());
        }
        ArrayNode modulations = node.putArray("modulations");
        link.modulations().stream().map(Modulation::designator).forEach(modulations::add);
        node.put("payloadBits", requirement.payload().bits());
        JsonText.put(node, "payloadFer", requirement.payload().fer());
        put(node, "latencyS", requirement.latencyS());
        put(node, "operationsPerBit", requirement.operationsPerBit());
        return node;
    }

    private static void put(ObjectNode node, String field, OptionalDouble value) {
        JsonText.put(node, field, value.orElse(Double.NaN));
    }
}
