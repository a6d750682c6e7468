package dev.nearlimit.cli.shortlist;

import java.util.List;

/** What a reader must bear in mind; carried by every results file and report. */
final class Cautions {
    static final List<String> ALL = List.of(
            "Simulation alone does not qualify a safety-related link.",
            "Undetected errors and error floors below the simulated range are not excluded; a frame error rate is"
                    + " backed only down to the rates that were counted.",
            "The available Eb/N0 is as good as the link budget in the requirement; fading, interference and"
                    + " implementation losses that are not listed there are not in it.",
            "Transmit power, bandwidth and spectral masks are set by the radio regulator and the governing standard;"
                    + " final sign-off is for licensed or certified practice where it applies.",
            "The normal approximation is an estimate of the finite-length limit, not a bound; a gap to it can be"
                    + " negative.");

    private Cautions() {}
}
