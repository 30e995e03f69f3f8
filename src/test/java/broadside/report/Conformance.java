package broadside.report;

import java.io.ByteArrayInputStream;
import java.util.List;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.PDFAValidator;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.ValidationResult;

/** Asks veraPDF whether a PDF keeps a standard. */
final class Conformance {

    /** Returns the rules that the PDF breaks, one line each; none when it keeps the standard. */
    static List<String> failures(byte[] pdf, PDFAFlavour flavour) throws Exception {
        VeraGreenfieldFoundryProvider.initialise();
        try (PDFAParser parser = Foundries.defaultInstance().createParser(new ByteArrayInputStream(pdf), flavour);
             PDFAValidator validator = Foundries.defaultInstance().createValidator(flavour, false)) {
            ValidationResult result = validator.validate(parser);
            List<String> failures = result.getTestAssertions().stream()
                .map(a -> a.getRuleId().getClause() + "-" + a.getRuleId().getTestNumber() + " " + a.getMessage()
                    + " at " + a.getLocation().getContext()).distinct().toList();
            return result.isCompliant() || !failures.isEmpty() ? failures : List.of("refused without a reason");
        }
    }

    private Conformance() { }
}
