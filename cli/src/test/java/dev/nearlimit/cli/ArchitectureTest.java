package dev.nearlimit.cli;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** Keeps the arrows between the rooms as they are drawn, and side effects where they belong. */
@AnalyzeClasses(packages = "dev.nearlimit", importOptions = ImportOption.DoNotIncludeTests.class)
final class ArchitectureTest {
    private static final String ROOM = "dev.nearlimit.";

    @ArchTest
    static final ArchRule ARROWS = layeredArchitecture()
            .consideringOnlyDependenciesInAnyPackage("dev.nearlimit..")
            .layer("codes")
            .definedBy(ROOM + "codes..")
            .layer("numerics")
            .definedBy(ROOM + "numerics..")
            .layer("journal")
            .definedBy(ROOM + "journal..")
            .layer("limits")
            .definedBy(ROOM + "limits..")
            .layer("algebra")
            .definedBy(ROOM + "algebra..")
            .layer("decoders")
            .definedBy(ROOM + "decoders..")
            .layer("simulation")
            .definedBy(ROOM + "simulation..")
            .layer("shortlist")
            .definedBy(ROOM + "shortlist..")
            .layer("testvectors")
            .definedBy(ROOM + "testvectors..")
            .layer("cli")
            .definedBy(ROOM + "cli..")
            .whereLayer("codes")
            .mayNotAccessAnyLayer()
            .whereLayer("numerics")
            .mayNotAccessAnyLayer()
            .whereLayer("journal")
            .mayNotAccessAnyLayer()
            .whereLayer("limits")
            .mayOnlyAccessLayers("numerics")
            .whereLayer("algebra")
            .mayOnlyAccessLayers("codes", "limits", "journal", "numerics")
            .whereLayer("decoders")
            .mayOnlyAccessLayers("codes", "numerics")
            .whereLayer("simulation")
            .mayOnlyAccessLayers("decoders", "limits", "journal", "codes", "numerics")
            .whereLayer("shortlist")
            .mayOnlyAccessLayers("algebra", "simulation", "decoders", "limits", "journal", "codes", "numerics")
            .whereLayer("testvectors")
            .mayOnlyAccessLayers(
                    "shortlist", "algebra", "simulation", "decoders", "limits", "journal", "codes", "numerics")
            .whereLayer("cli")
            .mayNotBeAccessedByAnyLayer();

    @ArchTest
    static final ArchRule NO_CYCLES_BETWEEN_ROOMS =
            slices().matching(ROOM + "(*)..").should().beFreeOfCycles();

    @ArchTest
    static final ArchRule ONLY_THE_COMMAND_LINE_EXITS = noClasses()
            .that()
            .resideOutsideOfPackage(ROOM + "cli..")
            .should()
            .callMethod(System.class, "exit", int.class)
            .orShould()
            .callMethod(Runtime.class, "exit", int.class)
            .orShould()
            .callMethod(Runtime.class, "halt", int.class);

    @ArchTest
    static final ArchRule ONLY_THE_COMMAND_LINE_PRINTS = noClasses()
            .that()
            .resideOutsideOfPackage(ROOM + "cli..")
            .should()
            .accessField(System.class, "out")
            .orShould()
            .accessField(System.class, "err")
            .orShould()
            .callMethod(Throwable.class, "printStackTrace");

    @ArchTest
    static final ArchRule VECTORS_ONLY_BEHIND_THE_KERNELS = noClasses()
            .that()
            .resideOutsideOfPackages(ROOM + "numerics.kernels..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("jdk.incubator.vector..");
}
