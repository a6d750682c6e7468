package dev.nearlimit.shortlist.evaluation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.shortlist.requirement.Payload;
import org.junit.jupiter.api.Test;

class PayloadFitTest {
    private static PayloadFit fit(String code, int bits, double fer) {
        return PayloadFit.of(Catalogue.standard().build(code), new Payload(bits, fer));
    }

    @Test
    void aLongerCodeIsShortenedToFit() {
        PayloadFit fit = fit("ldpc-802.11n:648,1/2", 320, 1e-3);
        assertEquals("ldpc-802.11n:648,1/2+shorten=4", fit.code().designator());
        assertEquals(1, fit.codewords());
        assertEquals(644, fit.bitsSent());
        assertEquals(320.0 / 644, fit.rate());
        assertEquals(0, fit.fillerDb());
        assertEquals(1e-3, fit.codewordFerTarget(), 1e-18);
    }

    @Test
    void aShorterCodeIsUsedSeveralTimesAndItsFillerIsCharged() {
        PayloadFit fit = fit("golay:23,12", 320, 1e-3);
        assertEquals(27, fit.codewords());
        assertEquals(621, fit.bitsSent());
        assertEquals(10 * Math.log10(324.0 / 320), fit.fillerDb(), 1e-12);
        // 27 codewords, each failing with this probability, lose one payload in a thousand.
        assertEquals(1e-3, 1 - Math.pow(1 - fit.codewordFerTarget(), 27), 1e-15);
    }

    @Test
    void aTinyTargetDoesNotVanish() {
        assertEquals(1e-16 / 27, fit("golay:23,12", 320, 1e-16).codewordFerTarget(), 1e-30);
    }

    @Test
    void aShortenedCodeIsShortenedFurther() {
        assertEquals(
                "ldpc-802.11n:648,1/2+shorten=24",
                fit("ldpc-802.11n:648,1/2+shorten=4", 300, 1e-3).code().designator());
    }
}
