package broadside.web;

import static broadside.web.Browsers.begin;
import static broadside.web.Browsers.checkPdf;
import static broadside.web.Browsers.gone;
import static broadside.web.Browsers.image;
import static broadside.web.Browsers.press;
import static broadside.web.Browsers.type;
import static broadside.web.Browsers.violations;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.support.ui.Select;
import org.openqa.selenium.support.ui.WebDriverWait;

/** A real browser does what a user does, with scripts and without. */
class BrowserTest {

    /** Long pages, or pages like others, whose structure is the same at every width: scanned once. */
    private static final List<String> LONG = List.of("checks", "edition", "publication", "sign full", "blade", "banner", "side by side");
    private static ChromeDriver scripted;
    private static ChromeDriver plain;

    @BeforeAll
    static void start() throws IOException {
        scripted = Browsers.start(true);
        plain = Browsers.start(false);
    }

    @AfterAll
    static void stop() {
        Browsers.stop(scripted, plain);
    }

    @Test
    void a_sign_in_metres_with_a_mistake_that_is_mended() {
        begin(scripted, "en-1991-1-4/2005", "metric", "A sign on posts");
        type(scripted, "site.basic-speed", "26");
        new Select(scripted.findElement(By.id("site.averaging"))).selectByVisibleText("3 s gust");
        scripted.findElement(By.id("site.terrain-II")).click();
        type(scripted, "items[0].boards[0].width", "3");
        type(scripted, "items[0].boards[0].height", "2");
        type(scripted, "items[0].boards[0].clearance", "2,5");
        type(scripted, "items[0].posts.count", "1");
        scripted.findElement(By.id("items[0].held-by-own-posts")).click();
        press(scripted, "Work out");
        assertThat(scripted.getTitle()).startsWith("Error: ");
        assertThat(scripted.switchTo().activeElement().getDomAttribute("class")).isEqualTo("problems");
        WebElement line = scripted.findElement(By.cssSelector(".problems a"));
        assertThat(line.getText()).contains("is about");
        line.click();
        assertThat(scripted.switchTo().activeElement().getDomAttribute("id")).isEqualTo("site.averaging");
        assertThat(scripted.findElement(By.id("items[0].boards[0].clearance")).getDomProperty("value")).isEqualTo("2,5");
        new Select(scripted.findElement(By.id("site.averaging"))).selectByVisibleText("10 min mean");
        press(scripted, "Work out");
        assertThat(scripted.findElement(By.cssSelector(".answer")).getText()).contains("kN");
        new WebDriverWait(scripted, Duration.ofSeconds(5)).until(d -> image(scripted, "figure img"));
        checkPdf(scripted, "PDF on A4 paper");
        scripted.findElement(By.linkText("Change what it is")).click();
        assertThat(scripted.findElement(By.id("items[0].boards[0].width")).getDomProperty("value")).isEqualTo("3");
    }

    @Test
    void the_back_button_brings_the_answers_back() {
        begin(scripted, "en-1991-1-4/2005", "metric", "A sign on posts");
        type(scripted, "site.basic-speed", "27");
        new Select(scripted.findElement(By.id("site.averaging"))).selectByVisibleText("10 min mean");
        scripted.findElement(By.id("site.terrain-II")).click();
        type(scripted, "items[0].boards[0].width", "3.2");
        type(scripted, "items[0].boards[0].clearance", "2");
        type(scripted, "items[0].posts.count", "1");
        scripted.findElement(By.id("items[0].held-by-own-posts")).click();
        press(scripted, "Work out");
        assertThat(scripted.getTitle()).startsWith("Error: ");
        type(scripted, "items[0].boards[0].height", "1.4");
        press(scripted, "Work out");
        assertThat(scripted.findElement(By.cssSelector(".answer")).getText()).contains("kN");
        scripted.navigate().back();
        new WebDriverWait(scripted, Duration.ofSeconds(10)).until(d -> !d.findElements(By.id("items[0].boards[0].width")).isEmpty());
        assertThat(scripted.findElement(By.id("items[0].boards[0].width")).getDomProperty("value")).isEqualTo("3.2");
        assertThat(scripted.findElement(By.id("site.basic-speed")).getDomProperty("value")).isEqualTo("27");
        scripted.navigate().back();
        new WebDriverWait(scripted, Duration.ofSeconds(10)).until(d -> !d.findElements(By.id("items[0].boards[0].width")).isEmpty());
        assertThat(scripted.findElement(By.id("items[0].boards[0].width")).getDomProperty("value")).isEqualTo("3.2");
    }

    @Test
    void a_hoarding_in_feet_and_inches_without_scripts() {
        begin(plain, "asce-7/16", "us", "A site hoarding");
        type(plain, "site.basic-speed", "115");
        new Select(plain.findElement(By.id("site.averaging"))).selectByVisibleText("3 s gust");
        plain.findElement(By.id("site.terrain-C")).click();
        type(plain, "items[0].length", "120 ft");
        type(plain, "items[0].height", "8'6");
        type(plain, "items[0].posts.spacing", "1,500");
        press(plain, "Draw it again");
        assertThat(plain.findElement(By.id("items[0].height-reading")).getText()).isEqualTo("= 2.591 m (8 ft 6 in)");
        press(plain, "Work out");
        assertThat(plain.getTitle()).startsWith("Error: ");
        press(plain, "1.5 ft");
        assertThat(plain.findElement(By.id("items[0].posts.spacing")).getDomProperty("value")).isEqualTo("1.5 ft");
        type(plain, "items[0].posts.spacing", "8");
        plain.findElement(By.xpath("//summary[.='It has a gate']")).click();
        press(plain, "Add a gate");
        type(plain, "items[0].gates[0].from", "40");
        type(plain, "items[0].gates[0].width", "16 ft");
        plain.findElement(By.id("items[0].held-by-own-posts")).click();
        press(plain, "Work out");
        assertThat(plain.findElement(By.cssSelector(".answer")).getText()).contains("kip ft");
        checkPdf(plain, "PDF on Letter paper");
    }

    @Test
    void drawing_and_readings_follow_the_typing() {
        begin(scripted, "en-1991-1-4/2005", "us", "A sign on posts");
        assertThat(scripted.findElements(By.cssSelector("[data-drawing]"))).isEmpty();
        type(scripted, "items[0].boards[0].width", "8-6");
        type(scripted, "items[0].boards[0].height", "4");
        type(scripted, "items[0].boards[0].clearance", "3'");
        type(scripted, "items[0].posts.count", "1");
        new WebDriverWait(scripted, Duration.ofSeconds(5)).until(d -> image(scripted, "[data-drawing]"));
        assertThat(scripted.findElement(By.id("items[0].boards[0].width-reading")).getText()).isEqualTo("= 2.591 m (8 ft 6 in)");
        assertThat(scripted.findElement(By.cssSelector("[data-status]")).getText()).isEqualTo("The drawing shows the sizes typed so far.");
        WebElement before = scripted.findElement(By.tagName("html"));
        scripted.findElement(By.id("items[0].posts.count")).sendKeys(Keys.ENTER);
        new WebDriverWait(scripted, Duration.ofSeconds(10)).until(d -> gone(before));
        assertThat(scripted.getTitle()).startsWith("Error: ");
        assertThat(scripted.findElement(By.id("items[0].boards[0].width")).getDomProperty("value")).isEqualTo("8-6");
    }

    @Test
    void a_file_opens_without_scripts() throws IOException {
        Path file = Files.createTempFile("job", ".json");
        Files.writeString(file, Pool.SIGN);
        plain.get(Pool.base() + "/");
        plain.findElement(By.id("file")).sendKeys(file.toString());
        press(plain, "Open the file");
        assertThat(plain.getTitle()).isEqualTo("Test sign - Broadside");
    }

    @Test
    void every_page_is_accessible_wide_and_narrow() {
        List<String> found = new ArrayList<>();
        for (int width : new int[] {1280, 320}) {
            scripted.executeCdpCommand("Emulation.setDeviceMetricsOverride", Map.of("width", width, "height", 800, "deviceScaleFactor", 1, "mobile", false));
            pages().forEach((name, address) -> {
                scripted.get(Pool.base() + address);
                if (name.contains("wrong")) {
                    scripted.executeScript("document.querySelectorAll('input[type=text]').forEach(i => { i.value = 'no'; })");
                    press(scripted, "Work out");
                }
                scripted.executeScript("document.querySelectorAll('details').forEach(d => { d.open = true; })");
                if (width > 1000 || !LONG.contains(name)) {
                    violations(scripted).forEach(v -> found.add(name + " at " + width + ": " + v));
                }
                long wide = (Long) scripted.executeScript("return document.documentElement.scrollWidth");
                if (wide > width) {
                    found.add(name + " at " + width + " is " + wide + " wide");
                }
            });
        }
        scripted.executeCdpCommand("Emulation.clearDeviceMetricsOverride", Map.of());
        assertThat(found).isEmpty();
    }

    private static Map<String, String> pages() {
        Map<String, String> pages = new LinkedHashMap<>();
        String token = Token.of(broadside.job.JobText.read(Pool.SIGN.getBytes(StandardCharsets.UTF_8)));
        String uncovered = Token.of(broadside.job.JobText.read(Pool.SIGN.replace("2.5 m", "400 m").getBytes(StandardCharsets.UTF_8)));
        pages.put("start", "/");
        pages.put("sign", "/fill?kind=post-sign&code=asce-7/16");
        pages.put("sign full", "/fill?j=" + token);
        pages.put("sign wrong", "/fill?kind=post-sign&code=en-1991-1-4/2005");
        pages.put("hoarding wrong", "/fill?kind=hoarding&units=us");
        pages.put("fence wrong", "/fill?kind=banner-fence&code=en-1991-1-4/2005");
        pages.put("facade wrong", "/fill?kind=facade-panel&units=us&code=asce-7/16");
        pages.put("blade", "/fill?kind=projecting-sign&code=en-1991-1-4/2005");
        pages.put("banner", "/fill?kind=spanned-banner&units=us&code=asce-7/16");
        pages.put("side by side", "/side-by-side?j=" + token);
        pages.put("answer", "/answer?j=" + token);
        pages.put("answer uncovered", "/answer?j=" + uncovered);
        pages.put("card", "/card?j=" + token);
        pages.put("tables", "/tables");
        pages.put("edition", "/tables/en-1991-1-4/2005");
        pages.put("checks", "/checks");
        pages.put("publication", "/checks/SIGN");
        pages.put("mistakes", "/checks/mistakes-in-print");
        pages.put("about", "/about");
        pages.put("message", "/nowhere");
        return pages;
    }
}
