package dev.nearlimit.shortlist;

import dev.nearlimit.limits.InvalidLimitException;
import dev.nearlimit.limits.NormalApproximation;
import dev.nearlimit.limits.UncodedBinary;
import dev.nearlimit.shortlist.evaluation.CurveSearch;
import dev.nearlimit.shortlist.evaluation.ExactErrorRate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.BooleanSupplier;

/**
 * Spends simulation where the answer needs it. Contenders with an exact error rate are simulated only for their wrong
 * bits a failed frame, and only while in the running. Of the others, those
 * that fail bandwidth, latency or budget, or whose limit lies above the available Eb/N0, are dropped unsimulated; the
 * rest are bracketed coarsely, climbing no higher than the available Eb/N0, where a few dozen frame errors drop those
 * that miss it; and only those whose interval reaches the best one's are refined. If nothing meets the requirement,
 * everything is bracketed further, so that the answer can say what comes closest.
 *
 * <p>Contenders are taken in their given order and decisions depend on counts alone, so that the same seed gives the same
 * shortlist.
 */
final class Contest {
    /** Contenders that may come to be refined, for the estimate of the work to do only. */
    private static final int EXPECTED_REFINEMENTS = 5;

    /** Work of a refinement against a coarse step, for the same estimate. */
    private static final double REFINEMENT_WORK = 3;

    /** How far beyond the available Eb/N0 a contender is followed that may just miss it [dB]. */
    private static final double BEYOND_REACH_DB = 0.5;

    private final List<Standing> standings;
    private final Demands demands;
    private final ShortlistObserver observer;
    private final BooleanSupplier cancelled;
    private double workDone;
    private double workExpected;
    private double fractionShown;

    Contest(List<Standing> standings, Demands demands, ShortlistObserver observer, BooleanSupplier cancelled) {
        this.standings = standings;
        this.demands = demands;
        this.observer = observer;
        this.cancelled = cancelled;
    }

    void run() {
        List<Standing> open = new ArrayList<>();
        for (Standing standing : standings) {
            if (!settleWithoutSimulation(standing)) {
                open.add(standing);
            }
        }
        workExpected = open.size() + REFINEMENT_WORK * EXPECTED_REFINEMENTS;
        for (Standing standing : open) {
            if (cancelled.getAsBoolean()) {
                break;
            }
            step("bracketing " + standing.contender().describe(), 1);
            bracketWithinReach(standing);
        }
        decideTheUndecided();
        if (winners().isEmpty()) {
            lookForTheClosest();
        } else {
            refineTheBest();
        }
        show("done", 1);
    }

    private boolean settleWithoutSimulation(Standing standing) {
        Contender contender = standing.contender();
        boolean fits = demands.metWithoutErrorRates(contender, standing.carriages());
        Optional<ExactErrorRate> exact =
                ExactErrorRate.of(contender.fit().code(), contender.choice().decoder());
        if (exact.isPresent()) {
            double needed = exact.get().neededEbn0Db(contender.fit().codewordFerTarget())
                    + contender.fit().fillerDb();
            boolean inTheRunning = fits && needed <= demands.leftDb();
            if (inTheRunning) {
                show("measuring " + contender.describe(), 0);
            }
            standing.setCurve(
                    inTheRunning
                            ? standing.search().exact(exact.get())
                            : CurveSearch.unmeasured(
                                    exact.get(), contender.fit().codewordFerTarget()));
            if (!inTheRunning) {
                standing.drop("needed Eb/N0 from the exact error rate; nothing simulated");
            }
            return true;
        }
        if (!fits) {
            standing.drop("dropped unsimulated: it fails another demand whatever its Eb/N0");
            return true;
        }
        double limitDb = contender.provenLimitDb();
        if (limitDb > demands.leftDb()) {
            standing.drop(String.format(
                    Locale.ROOT,
                    "dropped unsimulated: no code of its rate and length reaches the target below %.2f dB",
                    limitDb));
            return true;
        }
        if (CurveSearch.outOfReach(contender.fit().codewordFerTarget())) {
            standing.drop("not simulated: so low an error rate cannot be shown by simulation");
            return true;
        }
        return false;
    }

    /** Brackets up to the available Eb/N0; a little beyond, if a few dozen errors there cannot tell. */
    private void bracketWithinReach(Standing standing) {
        double reachDb = demands.leftDb() - standing.contender().fit().fillerDb();
        bracket(standing, reachDb);
        if (!standing.curve().complete()) {
            return;
        }
        String where = "at";
        if (!standing.curve().found() && !standing.search().missesForSure(standing.curve())) {
            bracket(standing, reachDb + BEYOND_REACH_DB);
            where = "beyond";
        }
        if (standing.curve().complete() && !standing.curve().found()) {
            standing.drop(String.format(
                    Locale.ROOT,
                    "dropped after %d frame errors %s the available Eb/N0",
                    standing.curve().nearNeeded().counts().frameErrors(),
                    where));
        }
    }

    private static void bracket(Standing standing, double giveUpDb) {
        standing.setCurve(standing.search().coarse(startDb(standing.contender()), giveUpDb));
    }

    /** A little below what the best codes of this length need, where errors are plentiful. */
    private static double startDb(Contender contender) {
        int n = contender.fit().code().n();
        int k = contender.fit().code().k();
        double ownLimit =
                Math.max(-1.5, contender.provenLimitDb()) - contender.fit().fillerDb();
        try {
            return Math.max(
                    ownLimit,
                    NormalApproximation.leastEbn0Db(n, k, contender.fit().codewordFerTarget()) - 0.5);
        } catch (InvalidLimitException e) {
            // No such limit for so short a code; its capacity is start enough.
            return ownLimit;
        }
    }

    /** Two decibels above what sending the same bits uncoded needs: a code that is worse is not worth a search. */
    private static double giveUpDb(Contender contender) {
        // A payload error rate just below one half of a single bit still stands for some Eb/N0.
        double bitErrorRate = Math.min(
                0.4,
                contender.fit().codewordFerTarget() / contender.fit().code().k());
        return UncodedBinary.ebn0DbForBitErrorRate(bitErrorRate) + 2;
    }

    private List<Standing> winners() {
        return standings.stream()
                .filter(standing -> standing.neededDb() <= demands.leftDb())
                .filter(standing -> demands.metWithoutErrorRates(standing.contender(), standing.carriages()))
                .sorted(Comparator.comparingDouble(Standing::neededDb))
                .toList();
    }

    /** Refines those whose coarse interval contains the available Eb/N0, so that it does not decide on few errors. */
    private void decideTheUndecided() {
        for (Standing standing : standings) {
            if (cancelled.getAsBoolean()) {
                return;
            }
            if (isCoarse(standing)
                    && standing.neededLowDb() <= demands.leftDb()
                    && demands.leftDb() <= standing.neededHighDb()) {
                step("deciding on " + standing.contender().describe(), REFINEMENT_WORK);
                standing.setCurve(standing.search().refined());
            }
        }
    }

    private static boolean isCoarse(Standing standing) {
        return standing.curve() != null
                && standing.curve().found()
                && standing.curve().stage().equals("coarse");
    }

    /** Refines from the best downwards, as long as an interval reaches that of the best refined so far. */
    private void refineTheBest() {
        double bestHigh = Double.POSITIVE_INFINITY;
        int refined = 0;
        for (Standing standing : winners()) {
            if (cancelled.getAsBoolean()) {
                return;
            }
            boolean couldWin = standing.neededLowDb() <= bestHigh;
            if (couldWin && isCoarse(standing)) {
                step("refining " + standing.contender().describe(), REFINEMENT_WORK);
                standing.setCurve(standing.search().refined());
                workExpected += ++refined >= EXPECTED_REFINEMENTS ? REFINEMENT_WORK : 0;
            } else if (isCoarse(standing)) {
                standing.drop("not refined: its interval lies above the best scheme's");
            }
            bestHigh = Math.min(bestHigh, standing.neededHighDb());
        }
    }

    private void lookForTheClosest() {
        List<Standing> unknown = standings.stream()
                .filter(standing ->
                        standing.curve() == null || !standing.curve().found())
                .filter(standing ->
                        !CurveSearch.outOfReach(standing.contender().fit().codewordFerTarget()))
                .toList();
        workExpected = workDone + unknown.size();
        for (Standing standing : unknown) {
            if (cancelled.getAsBoolean()) {
                return;
            }
            step(
                    "nothing meets the requirement yet; bracketing "
                            + standing.contender().describe(),
                    1);
            bracket(standing, giveUpDb(standing.contender()));
        }
    }

    private void step(String what, double work) {
        show(what, workDone / Math.max(workExpected, workDone + work));
        workDone += work;
    }

    private void show(String what, double fraction) {
        fractionShown = Math.max(fractionShown, Math.min(1, fraction));
        observer.progress(what, fractionShown);
    }

    /** Whether every curve that was begun is complete. */
    boolean complete() {
        return !cancelled.getAsBoolean()
                && standings.stream().map(Standing::curve).allMatch(curve -> curve == null || curve.complete());
    }
}
