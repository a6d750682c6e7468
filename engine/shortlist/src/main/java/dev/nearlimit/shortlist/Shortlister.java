package dev.nearlimit.shortlist;

import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.shortlist.evaluation.CurveSearch;
import dev.nearlimit.shortlist.evaluation.PayloadFit;
import dev.nearlimit.shortlist.requirement.Candidate;
import dev.nearlimit.shortlist.requirement.Requirement;
import dev.nearlimit.shortlist.result.OperatingPoint;
import dev.nearlimit.shortlist.result.SchemeResult;
import dev.nearlimit.shortlist.result.ShortlistResult;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BooleanSupplier;

/**
 * Does the job: fits every candidate to the payload, finds what each needs with as few frames as the answer takes, and
 * ranks the schemes by needed Eb/N0 among those that meet every demand.
 */
public final class Shortlister {
    private final SimulatedMeters meters;

    /** @param meters makes the simulations that count errors */
    public Shortlister(SimulatedMeters meters) {
        this.meters = meters;
    }

    /**
     * Answers a requirement.
     *
     * @param observer follows the work
     * @param cancelled asked now and then; once true, the run ends early with what it has, marked incomplete
     */
    public ShortlistResult run(Requirement requirement, ShortlistObserver observer, BooleanSupplier cancelled) {
        Demands demands = new Demands(requirement);
        List<Standing> standings = standings(requirement, meters);
        Contest contest = new Contest(standings, demands, observer, cancelled);
        contest.run();
        List<SchemeResult> ranked = rank(standings, demands);
        OperatingPoint point = new OperatingPoint(
                requirement.name(),
                LinkBudget.lines(requirement.link()),
                demands.leftDb(),
                Verdict.of(ranked, contest.complete()),
                ranked,
                ReferenceCurveMaker.make());
        return new ShortlistResult(meters.seed(), List.of(point), contest.complete(), meters.framesSimulated());
    }

    /** One standing a code and decoder; a pair that candidates name twice counts once. */
    static List<Standing> standings(Requirement requirement, MeterFactory meters) {
        Map<String, Standing> byName = new LinkedHashMap<>();
        for (Candidate candidate : requirement.candidates()) {
            PayloadFit fit = PayloadFit.of(candidate.code(), requirement.payload());
            for (DecoderChoice choice : candidate.decoders()) {
                Contender contender = Contender.of(candidate.family(), fit, choice);
                byName.computeIfAbsent(
                        contender.describe() + " " + choice.quantiser().designator(),
                        name -> standing(contender, requirement, meters));
            }
        }
        return new ArrayList<>(byName.values());
    }

    private static Standing standing(Contender contender, Requirement requirement, MeterFactory meters) {
        List<Carriage> carriages = new ArrayList<>();
        for (Modulation modulation : requirement.link().modulations()) {
            carriages.add(Carriage.of(contender.fit(), modulation, requirement.link()));
        }
        PayloadFit fit = contender.fit();
        return new Standing(
                contender,
                carriages,
                new CurveSearch(meters.meter(contender), fit.code().k(), fit.codewordFerTarget()));
    }

    static List<SchemeResult> rank(List<Standing> standings, Demands demands) {
        SchemeAssembler assembler = new SchemeAssembler(demands);
        List<Ranking.Row> rows = new ArrayList<>();
        for (Standing standing : standings) {
            for (Carriage carriage : standing.carriages()) {
                rows.add(new Ranking.Row(assembler.assemble(standing, carriage), demands.missDb(standing, carriage)));
            }
        }
        return Ranking.rank(rows);
    }
}
