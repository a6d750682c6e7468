package dev.nearlimit.codes.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.family.CodeFamily;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class CatalogueTest {
    private static final Catalogue CATALOGUE = Catalogue.standard();

    private static List<String> listed() {
        return CATALOGUE.listed();
    }

    private static String refusal(String designator) {
        return assertThrows(InvalidCodeException.class, () -> CATALOGUE.build(designator))
                .getMessage();
    }

    @ParameterizedTest
    @MethodSource("listed")
    void everyListedDesignatorBuildsAndRoundTrips(String designator) {
        Code code = CATALOGUE.build(designator);
        assertEquals(designator, code.designator());
        assertEquals(designator.split(":")[0], family(designator).name());
        assertFalse(code.source().isBlank());
    }

    private static CodeFamily family(String designator) {
        return CATALOGUE.families().stream()
                .filter(family -> designator.startsWith(family.name() + ":"))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void familiesHaveDistinctNamesAndSayTheirForm() {
        assertEquals(
                CATALOGUE.families().size(),
                CATALOGUE.families().stream().map(CodeFamily::name).distinct().count());
        for (CodeFamily family : CATALOGUE.families()) {
            assertTrue(family.form().startsWith(family.name() + ":"), family.form());
            assertEquals(family.name().toLowerCase(Locale.ROOT), family.name());
            assertFalse(family.listed().isEmpty(), family.name());
        }
    }

    @ParameterizedTest
    @CsvSource({
        "'Hamming: 7, 4 ','hamming:7,4'",
        "'BCH:063,051','bch:63,51'",
        "'LDPC-802.11N:648,1/2','ldpc-802.11n:648,1/2'",
        "'bch:63,51 +SHORTEN=03','bch:63,51+shorten=3'",
        "'golay:24,12+shorten=0','golay:24,12'",
    })
    void spellingIsMadeCanonical(String typed, String canonical) {
        Code code = CATALOGUE.build(typed);
        assertEquals(canonical, code.designator());
        assertEquals(code.generator(), CATALOGUE.build(canonical).generator());
    }

    @ParameterizedTest
    @CsvSource({
        "hamming:7|4,true",
        "HAMMING:x,true",
        "golay,true",
        "./hamming.mtx,false",
        "tables/a+b.csv,false",
        "polar:8,false",
        "'',false",
    })
    void familyPrefixesAreToldFromPaths(String designator, boolean known) {
        assertEquals(known, CATALOGUE.isKnownFamily(designator));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hammign:7,4|hamming",
                "haming:7,4|hamming",
                "bhc:15,7|bch",
                "reedmuller:1,3|reed-muller",
                "ldpc-802.11:648,1/2|ldpc-802.11n",
                "paritycheck:8|parity-check",
            })
    void mistypedFamiliesAreSuggested(String typed, String meant) {
        String message = refusal(typed);
        assertTrue(message.contains("did you mean '" + meant + "'?"), message);
    }

    @Test
    void unknownFamiliesListTheKnown() {
        assertEquals(
                "unknown code family 'turbo' (families: repetition, parity-check, hamming, hamming-extended, golay,"
                        + " reed-muller, bch, bch-extended, ldpc-802.11n)",
                refusal("turbo:6144"));
        assertTrue(refusal("").startsWith("unknown code family ''"), refusal(""));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "golay|code family 'golay' needs parameters: expected golay:n,k",
                "golay:|code family 'golay' needs parameters: expected golay:n,k",
                "golay:23,11|golay:23,11: expected golay:23,12 or golay:24,12",
                "hamming:7|hamming:7 has 1 parameter, expected hamming:n,k",
                "hamming:7,4,1|hamming:7,4,1 has 3 parameters, expected hamming:n,k",
                "hamming:7,four|hamming:7,four: k is 'four', expected a whole number (hamming:n,k)",
                "hamming:7,-4|hamming:7,-4: k is '-4', expected a whole number (hamming:n,k)",
                "hamming:9999999999,4|hamming:9999999999,4: n is '9999999999', expected a whole number (hamming:n,k)",
                "hamming:8,5|hamming:8,5: n is 8, but 3 checks tell apart at most 2^3-1 = 7 positions",
                "hamming:7,7|hamming:7,7: (7,7) has n-k = 0 and k = 7, expected n-k = 2 .. 14 and k >= 1",
                "hamming-extended:9,5|hamming-extended:9,5: without the overall parity bit, n is 8, but 3 checks tell apart at"
                        + " most 2^3-1 = 7 positions",
                "repetition:1|repetition:1: n is 1, expected 2 .. 4096",
                "parity-check:5000|parity-check:5000: n is 5000, expected 2 .. 4096",
                "reed-muller:3,3|reed-muller:3,3: order r is 3, expected 0 .. 2 (order m has no checks)",
                "reed-muller:1,20|reed-muller:1,20: m is 20, expected 1 .. 12",
                "bch:15,8|bch:15,8: k is 8, expected one of 11, 7, 5, 1 for n = 15",
                "bch-extended:32,20|bch-extended:32,20: k is 20, expected one of 26, 21, 16, 11, 6, 1 for n = 32",
                "bch:16,7|bch:16,7: n is 16, expected 2^m-1 with m = 3 .. 8; shorter codes by +shorten=s",
                "bch-extended:15,7|bch-extended:15,7: n is 15, expected 2^m with m = 3 .. 8; shorter codes by +shorten=s",
                "bch:0,0|bch:0,0: n is 0, expected 2^m-1 with m = 3 .. 8; shorter codes by +shorten=s",
                "bch-extended:0,0|bch-extended:0,0: n is 0, expected 2^m with m = 3 .. 8; shorter codes by +shorten=s",
                "ldpc-802.11n:640,1/2|ldpc-802.11n:640,1/2: n is 640, expected 648, 1296 or 1944",
                "ldpc-802.11n:648,7/8|ldpc-802.11n:648,7/8: rate is '7/8', expected 1/2, 2/3, 3/4 or 5/6",
                "ldpc-802.11n:648|ldpc-802.11n:648 has 1 parameter, expected ldpc-802.11n:n,rate",
                "hamming:7,4+shorten=4|hamming:7,4+shorten=4: the code has 4 information bits, expected to leave out 1 .. 3",
                "repetition:5+shorten=1|repetition:5+shorten=1: the code has 1 information bit, which leaves none to leave out",
                "hamming:7,4+shorten=x|modification '+shorten=x', expected +shorten=s with s a whole number",
                "hamming:7,4+shorten=1+shorten=1|modification '+shorten=1+shorten=1', expected +shorten=s with s a whole number",
                "hamming:7,4+shrten=1|unknown modification '+shrten=1', expected +shorten=s",
            })
    void badDesignatorsAreRefusedInOneLine(String designator, String message) {
        assertEquals(message, refusal(designator));
    }

    @ParameterizedTest
    @ValueSource(strings = {":", "+", "::", "bch:+", "hamming:,", "hamming: ,", "golay:23,12+", "ldpc-802.11n:,", "\0"})
    void fragmentsAreRefusedToo(String designator) {
        assertFalse(refusal(designator).contains("\n"));
    }
}
