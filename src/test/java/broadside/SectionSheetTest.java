package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.support.Catalogue;
import broadside.support.Section;
import broadside.table.TableLibrary;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** The properties of a section as the sheet prints them can be worked out again from what the sheet prints. */
class SectionSheetTest {

    private static final Catalogue CATALOGUE = new Catalogue(TableLibrary.shipped());

    @Test
    void everyFormulaOfASectionGivesItsValue() {
        for (String designation : List.of("CHS 114.3x3.6", "CHS 168.3x6.4", "SHS 100x5 hot", "SHS 95x7 cold", "RHS 120x80x8 cold", "RHS 200x120x12", "PIPE 4 STD", "PIPE 2 XS",
            "HSS 4x4x1/4", "TIMBER 100x100", "TIMBER 4x6", "TUBE 60x3", "TUBE 50x50x3")) {
            Section section = CATALOGUE.find(designation).orElseThrow();
            Trace sheet = new Trace();
            CATALOGUE.record(section, sheet);
            Map<String, Double> known = new HashMap<>();
            sheet.givens().forEach(g -> known.put(g.symbol(), g.value()));
            Set<String> names = new HashSet<>();
            for (Step step : sheet.steps()) {
                assertThat(names.add(step.name())).as("%s: %s stands twice", designation, step.name()).isTrue();
                assertThat(step.place()).isNotBlank();
                Map<String, Double> inputs = new HashMap<>();
                step.inputs().forEach(i -> {
                    assertThat(known.get(i.symbol())).as("%s: %s of %s", designation, i.symbol(), step.name()).isEqualTo(i.value());
                    inputs.put(i.symbol(), i.value());
                });
                if (step.way() == Step.Way.RELATION) {
                    assertThat(Formula.value(step.formula(), inputs)).as("%s: %s", designation, step.formula()).isCloseTo(step.value(), within(1e-9 * Math.abs(step.value())));
                }
                assertThat(known.put(step.symbol(), step.value())).as("%s: %s stands for two things", designation, step.symbol()).isNull();
            }
            assertThat(names).contains("section-area", "section-inertia", "section-modulus-elastic", "section-modulus-plastic", "section-torsion-inertia",
                "section-torsion-modulus", "section-mass");
            assertThat(names.contains("section-inertia/weak")).isEqualTo(section.depth() != section.width());
        }
    }
}
