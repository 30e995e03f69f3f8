package broadside.web;

import broadside.assess.Assessor;
import broadside.crew.ActionLevels;
import broadside.job.JobReader;
import broadside.sheet.WindCard;
import io.javalin.http.Context;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import tools.jackson.databind.JsonNode;

/** The wind card: one page that holds all it needs, so that it works when it is saved or printed. */
final class CardDesk {

    private static final String LINK = "<link rel=\"stylesheet\" href=\"/card.css\">";
    private static final String STYLE = style();
    /** The style stands in the page itself, and only this style is allowed there. */
    private static final String POLICY = Guard.HEADERS.get("Content-Security-Policy") + "; style-src 'sha256-" + digest(STYLE) + "'";

    private final Pages pages;
    private final Assessor assessor;
    private final JobReader reader;
    private final Documents documents;
    private final ActionLevels levels;

    /** What the template reads. */
    public record View(WindCard card, String back) { }

    CardDesk(Pages pages, Assessor assessor, JobReader reader, Documents documents, ActionLevels levels) {
        this.pages = pages;
        this.assessor = assessor;
        this.reader = reader;
        this.documents = documents;
        this.levels = levels;
    }

    void show(Context ctx) {
        JsonNode job = Token.read(ctx.queryParam("j"));
        WindCard card = documents.card(assessor.withLimits(assessor.assess(reader.read(job).orThrow())), levels);
        ctx.header("Content-Security-Policy", POLICY);
        String page = pages.text("card", pages.frame(card.title()), new View(card, "/answer?j=" + Token.of(job)));
        ctx.contentType("text/html; charset=utf-8").result(page.replace(LINK, "<style>" + STYLE + "</style>"));
    }

    private static String style() {
        try (InputStream in = CardDesk.class.getResourceAsStream("/card.css")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String digest(String text) {
        try {
            return Base64.getEncoder().encodeToString(MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8)));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
