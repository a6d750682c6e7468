package dev.nearlimit.cli.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ContainerNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.failure.InputException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HtmlReportTest {
    private static final String HOSTILE = "</script><script>alert(1)</script> & \"quotes\" 'n' {{style}} $1";

    /** The page of the whole sample, for tests that only look. */
    private static final String PAGE = HtmlReport.render(SampleResults.whole());

    /** The page's text as a reader sees it: without tags, scripts and styles, spaces made one. */
    private static String text(String page) {
        return unescape(page.replaceAll("(?s)<(script|style)\\b.*?</\\1>", "")
                        .replaceAll("<wbr>", "")
                        .replaceAll("</?(?:code|strong|span|abbr|b)\\b[^>]*>", "")
                        .replaceAll("<[^>]*>", " "))
                .replaceAll("[\\s\u00a0]+", " ");
    }

    private static String unescape(String html) {
        return html.replace("&lt;", "<")
                .replace("&gt;", ">")
                .replace("&quot;", "\"")
                .replace("&#39;", "'")
                .replace("&amp;", "&");
    }

    private static List<String> all(String regex, String page) {
        Matcher matcher = Pattern.compile(regex, Pattern.DOTALL).matcher(page);
        List<String> found = new ArrayList<>();
        while (matcher.find()) {
            found.add(matcher.group(1));
        }
        return found;
    }

    private static String table(String cssClass, String page) {
        return all("<table class=\"" + cssClass + "[^\"]*\">(.*?)</table>", page)
                .get(0);
    }

    private static List<String> rows(String table) {
        return all("<tr[^>]*>(.*?)</tr>", all("<tbody>(.*)</tbody>", table).get(0));
    }

    /** The page without the chart library and the embedded results, which hold text that is no markup of ours. */
    private static String ownMarkup(String page) {
        return page.replaceAll("(?s)<script\\b[^>]*>.*?</script>", "");
    }

    private static void assertContains(String expected, String text) {
        assertTrue(text.contains(expected), () -> "no \"" + expected + "\" in: " + text);
    }

    @Test
    void answersInWordsWhichSchemeWinsAndWhatItBeats() {
        String text = text(PAGE);

        assertContains(
                "\u2713 The requirement can be met ldpc-802.11n:648,1/2+shorten=68 decoded by"
                        + " sum-product over qpsk ranks first of the schemes"
                        + " that meet every demand: it needs Eb/N0 = 2.06 dB (95 % interval 2.02 to 2.10 dB, simulated) for"
                        + " a payload frame error rate of 10\u207b\u00b3 where 5.18 dB are available, which leaves 3.12 dB"
                        + " of margin. It stands 2.26 dB from the Shannon limit, 2.13 dB from the limit of its modulation"
                        + " and 0.98 dB from the limit at its length (estimated: normal approximation), and comes before"
                        + " ldpc-regular:512,3,6,7 by sum-product (2.64 dB) and bch:511,259 by bounded-distance (4.71 dB);"
                        + " its interval overlaps that of ldpc-802.11n:648,1/2+shorten=68 by min-sum (2.11 dB). In full:"
                        + " sum-product:iterations=30,schedule=layered,early-stop=true",
                text);
    }

    @Test
    void saysWhatComesClosestAndByHowMuchItMissesWhenNothingMeets() {
        String text = text(HtmlReport.render(SampleResults.nothingMeets()));

        assertContains(
                "\u2717 No scheme meets every demand What comes closest is ldpc-802.11n:648,1/2+shorten=68", text);
        assertContains("It misses available Eb/N0 1.20 dB (needs 3.12 dB more); it stands 2.26 dB from", text);
        assertFalse(text.contains("can be met"));
    }

    @Test
    void showsDemandsAndLinkBudget() {
        String page = PAGE;

        String demands = text(table("facts", page));
        assertContains("Occupied bandwidth, at most 5 kHz", demands);
        assertContains("Information bit rate 2.4 kbit/s", demands);
        assertFalse(demands.contains("Losses"), "losses stand in the budget already");
        assertContains("Payload frame error rate, at most 10\u207b\u00b3", demands);
        assertFalse(demands.contains("Available Eb/N0"), "a demand that is null is not shown");
        List<String> budget = rows(table("facts budget", page));
        assertEquals(5, budget.size());
        assertContains("loss: pointing and snow cover \u22120.80", text(budget.get(2)));
        assertContains("available Eb/N0 5.18", text(budget.get(4)));
    }

    @Test
    void showsLossesAmongTheDemandsWhereThereIsNoBudget() {
        ObjectNode results = SampleResults.whole();
        ((ObjectNode) results.at("/operatingPoints/0")).remove("linkBudget");

        assertContains(
                "Losses pointing and snow cover 0.80 dB, receiver implementation 0.42 dB",
                text(table("facts", HtmlReport.render(results))));
    }

    @Test
    void saysWhenTheRunWasCutShort() {
        ObjectNode results = SampleResults.whole();
        assertFalse(text(HtmlReport.render(results)).contains("interrupted"));

        results.put("complete", false);

        assertContains("Incomplete: the run was interrupted", text(HtmlReport.render(results)));
    }

    @Test
    void unfoldsSettingsOnlyWhereNamesAloneDoNotTellSchemesApart() {
        ObjectNode results = SampleResults.whole();
        assertFalse(table("ranked", HtmlReport.render(results)).contains("<details open>"));
        ObjectNode twin = SampleResults.scheme(results, 1).deepCopy();
        twin.put("decoder", "min-sum:iterations=5,scale=6/8,word=6").put("rank", 9);
        SampleResults.schemes(results).add(twin);

        List<String> open = all("<details open>(.*?)</details>", table("ranked", HtmlReport.render(results)));

        assertEquals(2, open.size());
        assertContains("iterations=20", text(open.get(0)));
        assertContains("iterations=5", text(open.get(1)));
    }

    @Test
    void showsDemandsThatItDoesNotKnow() {
        ObjectNode results = SampleResults.whole();
        ((ObjectNode) results.get("requirement"))
                .put("peakPowerW", 2.5)
                .putObject("decoder")
                .put("chips", 2);

        String demands = text(table("facts", HtmlReport.render(results)));
        assertContains("Peak Power W 2.5", demands);
        assertContains("Decoder Chips: 2", demands);
    }

    @Test
    void ranksSchemesWithValuesToSortBy() {
        List<String> rows = rows(table("ranked", PAGE));

        assertEquals(8, rows.size());
        String first = text(rows.get(0));
        assertContains("\u2713 meets", first);
        assertContains("2.06 s2.02\u2009\u2026\u20092.10", first.replace(" \u2009", "\u2009"));
        assertContains("256/580", first);
        assertContains("107 ms", first);
        assertContains("worst 3013", first);
        assertContains("log-linear between 2.06 and 2.56 dB, 212 frame errors", first);
        assertEquals(
                List.of("1.0", "2.06", "3.12"),
                all("data-value=\"([0-9.]+)\"", rows.get(0)).stream()
                        .filter(List.of("1.0", "2.06", "3.12")::contains)
                        .toList());
        String failing = text(rows.get(5));
        assertContains("\u2717 fails", failing);
        assertContains("\u22120.16", failing);
        assertContains(
                "title=\"available Eb/N0 5.18 dB: needs 0.16 dB more; operations per bit 2000: 2096 more\"",
                rows.get(5));
    }

    @Test
    void everyRowHasOneCellForEachHeading() {
        String table = table("ranked", PAGE);

        int headings = all("<th [^>]*aria-sort=(\"[a-z]+\")", table).size();
        assertEquals(15, headings);
        for (String row : rows(table)) {
            assertEquals(headings, all("(<t[hd]) ", row).size(), row);
        }
    }

    @Test
    void leavesOutTheHardDecisionColumnWhereNobodyDecidesHard() {
        ObjectNode results = SampleResults.whole();
        assertContains("Hard decision", text(table("ranked", HtmlReport.render(results))));

        SampleResults.schemes(results).forEach(s -> ((ObjectNode) s).putNull("gapToHardDecisionLimitDb"));

        assertFalse(text(table("ranked", HtmlReport.render(results))).contains("Hard decision"));
    }

    @Test
    void saysWhySchemesWereRejectedAndByHowMuch() {
        List<String> rows = rows(table("rejected", PAGE));

        assertEquals(5, rows.size());
        assertContains("bandwidth 5 kHz: needs 250 Hz more", text(rows.get(2)));
        assertContains("f4", text(rows.get(3)));
        assertContains("dropped after 32 frame errors at 5.18 dB: FER above 0.02 (95 %)", text(rows.get(3)));
        assertContains("screened", text(rows.get(4)));
    }

    @Test
    void listsSimulatedPointsWithTheirIntervals() {
        String points = table("points", PAGE);

        assertContains("3.25 20\u202f000 (incomplete) 0 0 0 to 1.8\u00d710\u207b\u2074", text(points));
    }

    @Test
    void saysHowToReproduceAndWhatTheFiguresDoNotSay() {
        ObjectNode results = SampleResults.whole();
        String text = text(HtmlReport.render(results));
        assertContains("Command nearlimit shortlist glacier-sensor.yaml --out report.html", text);
        assertContains("Seed 1 Tool nearlimit 0.1.0-SNAPSHOT Kernel plain Java OpenJDK 17.0.15", text);
        assertContains("Simulation alone does not qualify a safety-related link.", text);

        results.remove("cautions");

        String standing = text(HtmlReport.render(results));
        assertContains("does not qualify a link on which safety depends", standing);
        assertContains("floors below the rates that were simulated, are not ruled out", standing);
        assertContains("radio regulator", standing);
        assertContains("licensed or certified practice", standing);
    }

    @Test
    void showsTheBestSchemeOfEachOfTheBestCodesAtFirst() {
        String list = all("<div class=\"scheme-list\"[^>]*>(.*?)</div>", PAGE).get(0);

        // The second scheme is the first one's code with another decoder; the last two have no curve.
        assertEquals(
                List.of("0", "2", "3", "4", "5"),
                all("<input ([^>]*)>", list).stream()
                        .filter(input -> input.contains(" checked"))
                        .map(input -> all("value=\"(\\d+)\"", input).get(0))
                        .toList());
        assertEquals(2, all("(disabled)", list).size());
    }

    @Test
    void eachOperatingPointHasItsAnswerAndItsCharts() {
        ObjectNode results = SampleResults.whole();
        ObjectNode winter = (ObjectNode) SampleResults.nothingMeets().at("/operatingPoints/0");
        winter.put("name", "winter pass");
        ((ArrayNode) results.get("operatingPoints")).add(winter);

        String page = HtmlReport.render(results);

        String text = text(page);
        assertContains("summer pass \u2713 The requirement can be met", text);
        assertContains("winter pass \u2717 No scheme meets every demand", text);
        assertEquals(List.of("0", "1"), all("class=\"charts\" data-operating-point=\"(\\d)\"", page));
    }

    @Test
    void escapesWhateverStandsInNames() throws IOException {
        ObjectNode results = SampleResults.whole();
        putEverywhere(results, HOSTILE);

        String page = HtmlReport.render(results);

        assertFalse(page.contains("<script>alert"), "a name became a script");
        assertFalse(page.contains("</script><script>alert"));
        assertContains(HOSTILE.replaceAll("\\s+", " "), text(page));
        // One opening and one closing tag for each script that the template has.
        assertEquals(
                4,
                all("(<script)[ >]", ownMarkup(page) + String.join("", all("(<script[^>]*>)", page)))
                        .size());
        assertEquals(results, embedded(page));
    }

    /** Replaces each text in the results, except names of families and methods that steer the page. */
    private static void putEverywhere(JsonNode node, String text) {
        if (node instanceof ObjectNode object) {
            object.properties().forEach(field -> {
                if (field.getValue().isTextual()) {
                    object.put(field.getKey(), text);
                } else {
                    putEverywhere(field.getValue(), text);
                }
            });
        } else if (node instanceof ArrayNode array) {
            for (int i = 0; i < array.size(); i++) {
                if (array.get(i).isTextual()) {
                    array.set(i, text);
                } else {
                    putEverywhere(array.get(i), text);
                }
            }
        }
    }

    private static JsonNode embedded(String page) throws IOException {
        return new ObjectMapper()
                .readTree(all("<script type=\"application/json\" id=\"results\">(.*?)</script>", page)
                        .get(0));
    }

    @Test
    void carriesTheResultsThemselves() throws IOException {
        ObjectNode results = SampleResults.whole();

        assertEquals(results, embedded(HtmlReport.render(results)));
    }

    @Test
    void asksNothingOfAnyServer() {
        String page = PAGE;
        String own = ownMarkup(page);

        assertEquals(
                List.of(), all("(\\b(?:src|href|srcset|action|data|poster)\\s*=)", own.replaceAll("data-\\S+", "")));
        assertEquals(List.of(), all("(url\\s*\\(|@import)", own));
        assertFalse(own.contains("http:") || own.contains("https:"), "an address stands in the page");
        // What the page itself forbids the browser, in case a script tried.
        assertContains("default-src 'none'; script-src 'unsafe-inline'; style-src 'unsafe-inline'", own);
        // The chart library names XML name spaces and, in comments, its licence and its painter's; nothing loads them.
        assertEquals(
                List.of(),
                all("(https?://[^\"'\\s]+)", page).stream()
                        .filter(address -> !address.startsWith("http://www.w3.org/")
                                && !address.startsWith("http://www.apache.org/licenses/")
                                && !address.equals("https://github.com/ecomfe/zrender/blob/master/LICENSE.txt"))
                        .toList());
    }

    @Test
    void elementsAreNested() {
        String main = all("(<main>.*</main>)", HtmlReport.render(SampleResults.many()))
                .get(0);
        List<String> open = new ArrayList<>();
        Matcher tags = Pattern.compile("<(/?)([a-z0-9]+)[^>]*>").matcher(main);
        while (tags.find()) {
            String tag = tags.group(2);
            if (List.of("input", "wbr").contains(tag)) {
                continue;
            }
            if (tags.group(1).isEmpty()) {
                open.add(tag);
            } else {
                assertEquals(tag, open.remove(open.size() - 1));
            }
        }
        assertEquals(List.of(), open);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{}",
                "{\"operatingPoints\": []}",
                "{\"requirement\": {\"name\": \"bare\"}, \"operatingPoints\": [{}]}",
                "{\"operatingPoints\": [{\"schemes\": [{}]}]}",
                "{\"operatingPoints\": [{\"schemes\": [{\"rank\": 1, \"meets\": true}]}]}",
                "{\"operatingPoints\": [{\"schemes\": [{\"rank\": 1, \"meets\": false, \"fails\": [{}]}]}]}"
            })
    void toleratesResultsThatLackNearlyEverything(String results) throws IOException {
        assertContains("</html>", HtmlReport.render(new ObjectMapper().readTree(results)));
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
    void toleratesAnyFieldsMissing(long seed) {
        ObjectNode results = SampleResults.whole();
        Random random = new Random(seed);
        thin(results, random);

        assertContains("</html>", HtmlReport.render(results));
    }

    /** Drops a tenth of all fields and makes another tenth null. */
    private static void thin(ContainerNode<?> node, Random random) {
        if (node instanceof ObjectNode object) {
            List<String> names = new ArrayList<>();
            object.fieldNames().forEachRemaining(names::add);
            for (String name : names) {
                int draw = random.nextInt(10);
                if (draw == 0) {
                    object.remove(name);
                } else if (draw == 1) {
                    object.putNull(name);
                }
            }
        }
        for (JsonNode child : node) {
            if (child instanceof ContainerNode<?> container) {
                thin(container, random);
            }
        }
    }

    @Test
    void replacesAnEarlierPageAndLeavesNothingElse(@TempDir Path folder) throws IOException {
        Path target = Files.writeString(folder.resolve("report.html"), "an earlier page");

        HtmlReport.write(SampleResults.whole(), target);

        assertEquals(HtmlReport.render(SampleResults.whole()), Files.readString(target));
        try (Stream<Path> files = Files.list(folder)) {
            assertArrayEquals(new Object[] {target}, files.toArray());
        }
    }

    @Test
    void aFailureLeavesTheTargetAsItWas(@TempDir Path folder) throws IOException {
        Path target = Files.createDirectory(folder.resolve("report.html"));
        Files.writeString(target.resolve("kept.txt"), "kept");

        assertThrows(InputException.class, () -> HtmlReport.write(SampleResults.whole(), target));
        assertThrows(
                InputException.class,
                () -> HtmlReport.write(SampleResults.whole(), folder.resolve("absent/report.html")));

        assertEquals("kept", Files.readString(target.resolve("kept.txt")));
        try (Stream<Path> files = Files.list(folder)) {
            assertArrayEquals(new Object[] {target}, files.toArray());
        }
    }
}
