package broadside.web;

import broadside.assess.About;
import io.javalin.http.Context;
import java.util.Locale;
import java.util.Map;
import org.thymeleaf.TemplateEngine;
import org.thymeleaf.templatemode.TemplateMode;
import org.thymeleaf.templateresolver.ClassLoaderTemplateResolver;

/** Writes pages: one template and one view record each. Names of templates are words of this program, never input. */
final class Pages {

    /** The line that stands on every page. */
    static final String CAUTION = broadside.sheet.SheetMaker.PRELIMINARY;

    private final TemplateEngine engine;
    private final About about;

    Pages(About about) {
        ClassLoaderTemplateResolver resolver = new ClassLoaderTemplateResolver(Pages.class.getClassLoader());
        resolver.setPrefix("templates/");
        resolver.setSuffix(".html");
        resolver.setTemplateMode(TemplateMode.HTML);
        resolver.setCharacterEncoding("UTF-8");
        this.engine = new TemplateEngine();
        this.engine.setTemplateResolver(resolver);
        this.about = about;
    }

    /** What the frame around every page shows; {@code caution} is empty where the page itself begins with it. */
    public record Frame(String title, String caution, String made) { }

    Frame frame(String title) {
        return new Frame(title, CAUTION, about.line());
    }

    /** The page as text; {@code view} is the only thing that the template can read. */
    String text(String template, Frame frame, Object view) {
        return engine.process(template, new org.thymeleaf.context.Context(Locale.ENGLISH, Map.of("frame", frame, "page", view)));
    }

    void show(Context ctx, int status, String template, String title, Object view) {
        show(ctx, status, template, frame(title), view);
    }

    void show(Context ctx, int status, String template, Frame frame, Object view) {
        ctx.status(status).contentType("text/html; charset=utf-8").result(text(template, frame, view));
    }
}
