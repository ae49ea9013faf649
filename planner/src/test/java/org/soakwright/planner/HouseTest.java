package org.soakwright.planner;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** Who lives where, and which way the arrows run. */
@AnalyzeClasses(packages = "org.soakwright", importOptions = ImportOption.DoNotIncludeTests.class)
class HouseTest {
    @ArchTest
    static final ArchRule arrowsRunFromTheDoorsToThePhysics = layeredArchitecture()
            .consideringOnlyDependenciesInLayers()
            .layer("cli")
            .definedBy("org.soakwright.planner.cli..")
            .layer("report")
            .definedBy("org.soakwright.planner.report..")
            .layer("line")
            .definedBy("org.soakwright.planner.line..")
            .layer("batch")
            .definedBy("org.soakwright.planner.batch..")
            .layer("conditions")
            .definedBy("org.soakwright.planner.conditions..")
            .layer("recipes")
            .definedBy("org.soakwright.recipes..")
            .layer("solver")
            .definedBy("org.soakwright.solver..")
            .whereLayer("cli")
            .mayNotBeAccessedByAnyLayer()
            .whereLayer("report")
            .mayOnlyBeAccessedByLayers("cli")
            .whereLayer("line")
            .mayOnlyBeAccessedByLayers("report", "cli")
            .whereLayer("batch")
            .mayOnlyBeAccessedByLayers("line", "report", "cli")
            .whereLayer("conditions")
            .mayOnlyBeAccessedByLayers("batch", "line", "report", "cli")
            .whereLayer("recipes")
            .mayOnlyBeAccessedByLayers("conditions", "batch", "line", "report", "cli")
            .whereLayer("solver")
            .mayOnlyBeAccessedByLayers("conditions", "batch");

    @ArchTest
    static final ArchRule recipesAndSolverDoNotKnowEachOther = noClasses()
            .that()
            .resideInAPackage("org.soakwright.recipes..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.soakwright.solver..");

    @ArchTest
    static final ArchRule theSolverKnowsNoFileNoClockAndNoText = noClasses()
            .that()
            .resideInAPackage("org.soakwright.solver..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.io..", "java.nio..", "java.time..", "java.text..", "org.yaml..");

    @ArchTest
    static final ArchRule theShopKnowsNoRecipeNoFileAndNoClockOnAWall = noClasses()
            .that()
            .resideInAPackage("org.soakwright.planner.line.shop..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "org.soakwright.recipes..",
                    "org.soakwright.planner.batch..",
                    "org.soakwright.planner.conditions..",
                    "java.io..",
                    "java.nio..",
                    "java.time..");

    @ArchTest
    static final ArchRule insideTheSolverChainsStandOnStagesAndStagesOnShapes = layeredArchitecture()
            .consideringOnlyDependenciesInLayers()
            .layer("chain")
            .definedBy("org.soakwright.solver.chain..")
            .layer("stage")
            .definedBy("org.soakwright.solver.stage..")
            .layer("shape")
            .definedBy("org.soakwright.solver.shape..")
            .whereLayer("chain")
            .mayNotBeAccessedByAnyLayer()
            .whereLayer("stage")
            .mayOnlyBeAccessedByLayers("chain");

    @ArchTest
    static final ArchRule theModelOfARecipeDoesNotKnowHowItIsRead = noClasses()
            .that()
            .resideInAPackage("org.soakwright.recipes.model..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.soakwright.recipes.parsing..", "org.yaml..");

    @ArchTest
    static final ArchRule textKnowsNoRecipe = noClasses()
            .that()
            .resideInAPackage("org.soakwright.recipes.text..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("org.soakwright.recipes.parsing..", "org.soakwright.recipes.model..");

    @ArchTest
    static final ArchRule noPackageNeedsItself =
            slices().matching("org.soakwright.(**)").should().beFreeOfCycles();

    @ArchTest
    static final ArchRule onlyTheDoorMayEndTheProgram = noClasses()
            .that()
            .resideOutsideOfPackage("org.soakwright.planner.cli..")
            .should()
            .callMethod(System.class, "exit", int.class);

    @ArchTest
    static final ArchRule nothingDependsOnTests = classes()
            .that()
            .resideInAPackage("org.soakwright..")
            .should()
            .onlyDependOnClassesThat()
            .resideOutsideOfPackages("org.junit..", "com.tngtech..");
}
