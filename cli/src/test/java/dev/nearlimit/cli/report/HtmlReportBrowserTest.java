package dev.nearlimit.cli.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Opens the page in a real browser and looks at what its scripts drew. */
class HtmlReportBrowserTest {
    @TempDir
    Path folder;

    /** The whole sample's page, opened once for the tests that only look at it. */
    private static HeadlessBrowser.Page wholeSample;

    private HeadlessBrowser.Page wholeSample() throws IOException, InterruptedException {
        if (wholeSample == null) {
            wholeSample = open(SampleResults.whole(), "");
        }
        return wholeSample;
    }

    private HeadlessBrowser.Page open(JsonNode results, String lastScript) throws IOException, InterruptedException {
        Path file = folder.resolve("report.html");
        HtmlReport.write(results, file);
        if (!lastScript.isEmpty()) {
            String page = Files.readString(file);
            int end = page.lastIndexOf("</body>");
            Files.writeString(
                    file, page.substring(0, end) + "<script>" + lastScript + "</script>" + page.substring(end));
        }
        return HeadlessBrowser.findOrSkip().open(file, Files.createDirectory(folder.resolve("browser")));
    }

    private static void assertNoErrors(HeadlessBrowser.Page page) {
        assertEquals(List.of(), page.console());
        assertFalse(page.dom().contains("data-script-errors=\""), "a script failed");
    }

    /** The SVG inside the chart of that name. */
    private static String svg(String chart, HeadlessBrowser.Page page) {
        Matcher matcher = Pattern.compile("<div class=\"chart " + chart + "\".*?(<svg.*?</svg>)", Pattern.DOTALL)
                .matcher(page.dom());
        assertTrue(matcher.find(), () -> "no picture in the chart " + chart);
        return matcher.group(1);
    }

    private static List<String> all(String regex, String text) {
        Matcher matcher = Pattern.compile(regex, Pattern.DOTALL).matcher(text);
        List<String> found = new ArrayList<>();
        while (matcher.find()) {
            found.add(matcher.group(1));
        }
        return found;
    }

    private static List<String> words(String svg) {
        return all("<text[^>]*>([^<]*)</text>", svg);
    }

    /** Colours of the lines that join a scheme's points. */
    private static List<String> curves(String svg) {
        return all("<path d=\"M[^\"]*\" fill=\"none\" stroke=\"(#[0-9a-f]{6})\" stroke-width=\"2\"", svg);
    }

    @Test
    void drawsBothChartsWithoutErrors() throws IOException, InterruptedException {
        HeadlessBrowser.Page page = wholeSample();

        assertNoErrors(page);
        String rates = svg("error-rates", page);
        assertEquals(5, curves(rates).size());
        assertEquals(5, new HashSet<>(curves(rates)).size(), "each curve has a colour of its own");
        List<String> words = words(rates);
        assertTrue(
                words.containsAll(List.of(
                        "Eb/N0 [dB]",
                        "FER",
                        "10\u207b\u00b3",
                        "Shannon \u22120.20",
                        "modulation \u22120.07",
                        "finite length (est.) 1.08",
                        "available 5.18",
                        "target FER 10\u207b\u00b3",
                        "uncoded BER")),
                () -> "" + words);
        assertFalse(words.stream().anyMatch(word -> word.startsWith("hard decision")), "a limit of others");
        String efficiency = svg("efficiency", page);
        assertTrue(words(efficiency).containsAll(List.of("Eb/N0 [dB]", "information bits per real dimension")));
        // Each capacity curve joins many points, which no other path on the chart does.
        assertEquals(
                3,
                all("<path d=\"M([^\"]*(?:L[^L\"]*){20,})\" fill=\"none\"", efficiency)
                        .size());
        assertEquals(
                8, all("transform=\"(matrix\\(6\\.5,0,0,6\\.5)", efficiency).size(), "markers of ranked schemes");
    }

    @Test
    void pointsStandWhereTheirValuesSay() throws IOException, InterruptedException {
        String rates = svg("error-rates", wholeSample());

        // The first scheme's fourth point lies at 2.06 dB and FER 1e-3, which is the target: marker and target line are
        // at the same height, and the marker is to the left of the rule at 5.18 dB and right of the one at 1.08 dB by
        // the
        // same scale.
        List<String> targets = all("<path d=\"M[0-9.]+ ([0-9.]+)L[^\"]*\"[^>]*stroke-dasharray=\"4,3\"", rates);
        assertEquals(1, targets.size());
        double available = Double.parseDouble(all("<path d=\"M([0-9.]+) [^\"]*\"[^>]*stroke-dasharray=\"8,4\"", rates)
                .get(0));
        List<String> limits = all("<path d=\"M([0-9.]+) [^\"]*\"[^>]*stroke-dasharray=\"2,3\"", rates);
        double finiteLength = Double.parseDouble(limits.get(limits.size() - 1));
        double pixelsPerDb = (available - finiteLength) / (5.18 - 1.08);
        double expectedX = finiteLength + pixelsPerDb * (2.06 - 1.08);
        List<String> heights = new ArrayList<>();
        Matcher markers = Pattern.compile("transform=\"matrix\\(5,0,0,5,([0-9.]+),([0-9.]+)\\)\"")
                .matcher(rates);
        while (markers.find()) {
            if (Math.abs(Double.parseDouble(markers.group(1)) - expectedX) < 0.5) {
                heights.add(markers.group(2));
            }
        }
        assertEquals(targets, heights);
    }

    @Test
    void sortsAndSwitches() throws IOException, InterruptedException {
        HeadlessBrowser.Page page = open(
                SampleResults.whole(),
                "const headings = Array.from(document.querySelectorAll('.ranked th button'));"
                        + "const margin = headings.find(b => b.textContent.startsWith('Margin'));"
                        + "margin.click();"
                        + "document.querySelector('[data-pick=all]').click();"
                        + "document.querySelector('.switch input[value=ber]').click();");

        assertNoErrors(page);
        List<Double> margins = all("(<tr class=\"(?:meets|fails)\">.*?</tr>)", page.dom()).stream()
                .map(row ->
                        Double.parseDouble(all("data-value=\"([^\"]*)\"", row).get(4)))
                .toList();
        assertEquals(8, margins.size());
        assertEquals(margins.stream().sorted().toList(), margins);
        assertTrue(page.dom().contains("aria-sort=\"ascending\"><button type=\"button\">Margin"));
        String rates = svg("error-rates", page);
        assertTrue(words(rates).contains("BER"));
        assertFalse(words(rates).contains("target FER 10\u207b\u00b3"), "the target is one of frames");
        // Exact curves of the sample are of FER alone, so only the five simulated ones are left.
        assertEquals(5, curves(rates).size());
    }

    @Test
    void drawsManySchemesAndHostileNames() throws IOException, InterruptedException {
        ObjectNode results = SampleResults.many();
        SampleResults.schemes(results)
                .forEach(scheme -> ((ObjectNode) scheme)
                        .put("code", "</script><script>throw 1</script><img src=x onerror=throw(2)>")
                        .put("family", "<img src=x onerror=throw(3)>"));

        HeadlessBrowser.Page page = open(
                results,
                "document.querySelector('[data-pick=all]').click();"
                        + "document.body.setAttribute('data-images', document.images.length);");

        assertNoErrors(page);
        assertEquals(32, curves(svg("error-rates", page)).size());
        assertTrue(page.dom().contains("aria-expanded=\"false\">show all 32</button>"), "long tables are folded");
        assertTrue(page.dom().contains("data-images=\"0\""), "a name became an image");
    }

    @Test
    void drawsWhatThereIsWhenFieldsAreMissing() throws IOException, InterruptedException {
        ObjectNode results = SampleResults.whole();
        ObjectNode point = (ObjectNode) results.at("/operatingPoints/0");
        point.remove(List.of("curves", "availableEbn0Db", "linkBudget"));
        SampleResults.schemes(results)
                .forEach(scheme -> ((ObjectNode) scheme)
                        .remove(List.of("limits", "codewordFerTarget", "family", "exactCurve", "neededEbn0DbLow")));
        results.remove("requirement");

        HeadlessBrowser.Page page = open(results, "");

        assertNoErrors(page);
        assertEquals(4, curves(svg("error-rates", page)).size());
        assertTrue(words(svg("efficiency", page)).contains("Eb/N0 [dB]"));
    }

    /** The other tests mean something only if a page that fails is seen to fail. */
    @Test
    void aFailingScriptIsNoticed() throws IOException, InterruptedException {
        HeadlessBrowser.Page page = open(SampleResults.whole(), "throw new Error('on purpose');");

        assertTrue(page.console().stream().anyMatch(line -> line.contains("on purpose")), () -> "" + page.console());
        assertTrue(page.dom().contains("data-script-errors=\"Uncaught Error: on purpose"));
    }
}
