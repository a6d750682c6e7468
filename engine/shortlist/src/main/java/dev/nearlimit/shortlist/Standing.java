package dev.nearlimit.shortlist;

import dev.nearlimit.shortlist.evaluation.CurveSearch;
import dev.nearlimit.shortlist.evaluation.ErrorCurve;
import java.util.List;

/**
 * How far a contender came: its search, what is known of it by now, and why it was not taken further. Mutable, and known
 * to the run of one shortlist alone.
 */
final class Standing {
    private final Contender contender;
    private final List<Carriage> carriages;
    private final CurveSearch search;
    private ErrorCurve curve;
    private String note = "";

    Standing(Contender contender, List<Carriage> carriages, CurveSearch search) {
        this.contender = contender;
        this.carriages = List.copyOf(carriages);
        this.search = search;
    }

    Contender contender() {
        return contender;
    }

    /** One carriage a permitted modulation. */
    List<Carriage> carriages() {
        return carriages;
    }

    CurveSearch search() {
        return search;
    }

    /** What is known of the error rates; null as long as nothing was sought. */
    ErrorCurve curve() {
        return curve;
    }

    void setCurve(ErrorCurve curve) {
        this.curve = curve;
    }

    String note() {
        return note;
    }

    void drop(String why) {
        this.note = why;
    }

    /** Needed Eb/N0 per payload bit [dB], filler charged; NaN where it is not known. */
    double neededDb() {
        return curve == null || !curve.found()
                ? Double.NaN
                : curve.neededDb() + contender.fit().fillerDb();
    }

    double neededLowDb() {
        return curve == null
                ? Double.NaN
                : curve.neededLowDb() + contender.fit().fillerDb();
    }

    double neededHighDb() {
        return curve == null
                ? Double.NaN
                : curve.neededHighDb() + contender.fit().fillerDb();
    }
}
