package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
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
import org.openqa.selenium.WebDriverException;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.support.ui.Select;
import org.openqa.selenium.support.ui.WebDriverWait;

/** A real browser does what a user does, with scripts and without. */
class BrowserTest {

    private static final File BROWSER = new File("/usr/bin/chromium");
    private static final File DRIVER = new File("/usr/bin/chromedriver");

    /** Long pages whose structure is the same at every width: scanned once. */
    private static final List<String> LONG = List.of("checks", "edition", "publication", "sign full");
    private static final String SCANNER = scanner();

    private static ChromeDriver scripted;
    private static ChromeDriver plain;

    @BeforeAll
    static void start() throws IOException {
        boolean there = BROWSER.canExecute() && DRIVER.canExecute();
        if (!there) {
            System.out.println("The browser tests are left out: " + BROWSER + " or " + DRIVER + " is not installed.");
        }
        assertThat(there || !"true".equals(System.getenv("CI"))).as("a browser where every change is tested").isTrue();
        assumeThat(there).isTrue();
        scripted = browser(true);
        plain = browser(false);
    }

    private static ChromeDriver browser(boolean scripts) throws IOException {
        ChromeOptions options = new ChromeOptions();
        options.setBinary(BROWSER);
        options.addArguments("--headless=new", "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking",
            "--disable-component-update", "--disable-sync", "--user-data-dir=" + Files.createTempDirectory("browser"));
        if (!scripts) {
            options.setExperimentalOption("prefs", Map.of("profile.managed_default_content_settings.javascript", 2));
        }
        ChromeDriver driver = new ChromeDriver(new ChromeDriverService.Builder().usingDriverExecutable(DRIVER).build(), options);
        driver.manage().timeouts().pageLoadTimeout(Duration.ofSeconds(20));
        return driver;
    }

    @AfterAll
    static void stop() {
        if (scripted != null) {
            scripted.quit();
        }
        if (plain != null) {
            plain.quit();
        }
    }

    private static void type(ChromeDriver driver, String id, String text) {
        WebElement box = driver.findElement(By.id(id));
        box.clear();
        box.sendKeys(text);
    }

    /** Presses a button that leads to another page, and waits for that page. */
    private static void press(ChromeDriver driver, String words) {
        WebElement before = driver.findElement(By.tagName("html"));
        driver.findElements(By.cssSelector("button:not([aria-hidden])")).stream().filter(b -> b.getText().startsWith(words)).findFirst().orElseThrow().click();
        new WebDriverWait(driver, Duration.ofSeconds(10)).until(d -> gone(before));
        new WebDriverWait(driver, Duration.ofSeconds(10)).until(d -> !d.findElements(By.tagName("footer")).isEmpty());
    }

    /** Whether an element belongs to a page that was left; the driver has more than one way to say so. */
    private static boolean gone(WebElement element) {
        try {
            element.isEnabled();
            return false;
        } catch (WebDriverException left) {
            return true;
        }
    }

    private static void begin(ChromeDriver driver, int code, String units, String kind) {
        driver.get(Pool.base() + "/");
        driver.findElement(By.id("code-" + code)).click();
        driver.findElement(By.id("units-" + units)).click();
        press(driver, kind);
    }

    private static void checkPdf(ChromeDriver driver, String words) {
        String link = driver.findElement(By.linkText(words)).getDomAttribute("href");
        byte[] pdf = Pool.bytes(link).body();
        assertThat(new String(pdf, 0, 5, StandardCharsets.US_ASCII)).isEqualTo("%PDF-");
    }

    @Test
    void a_sign_in_metres_with_a_mistake_that_is_mended() {
        begin(scripted, 1, "metric", "A sign on posts");
        type(scripted, "site.basic-speed", "26");
        new Select(scripted.findElement(By.id("site.averaging"))).selectByVisibleText("3 s gust");
        scripted.findElement(By.id("site.terrain-II")).click();
        type(scripted, "items[0].boards[0].width", "3");
        type(scripted, "items[0].boards[0].height", "2");
        type(scripted, "items[0].boards[0].clearance", "2,5");
        type(scripted, "items[0].posts.count", "1");
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
        begin(scripted, 1, "metric", "A sign on posts");
        type(scripted, "site.basic-speed", "27");
        new Select(scripted.findElement(By.id("site.averaging"))).selectByVisibleText("10 min mean");
        scripted.findElement(By.id("site.terrain-II")).click();
        type(scripted, "items[0].boards[0].width", "3.2");
        type(scripted, "items[0].boards[0].clearance", "2");
        type(scripted, "items[0].posts.count", "1");
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
        begin(plain, 0, "us", "A site hoarding");
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
        press(plain, "Work out");
        assertThat(plain.findElement(By.cssSelector(".answer")).getText()).contains("kip ft");
        checkPdf(plain, "PDF on Letter paper");
    }

    @Test
    void drawing_and_readings_follow_the_typing() {
        begin(scripted, 1, "us", "A sign on posts");
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

    /** Whether an image was loaded. */
    private static boolean image(ChromeDriver driver, String css) {
        return Boolean.TRUE.equals(driver.executeScript("const i = document.querySelector(arguments[0]); return !!i && i.complete && i.naturalWidth > 0;", css));
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

    /** What the scanner finds wrong with the page, by its rule and the first place. */
    @SuppressWarnings("unchecked")
    private static List<String> violations(ChromeDriver driver) {
        driver.executeScript(SCANNER);
        Object answer = driver.executeAsyncScript("const done = arguments[arguments.length - 1];"
            + "axe.run(document, {resultTypes: ['violations']}).then(r => done(r.violations.map(v => v.id + ' ' + v.nodes[0].html)), e => done([String(e)]));");
        return (List<String>) answer;
    }

    private static String scanner() {
        try (InputStream in = BrowserTest.class.getResourceAsStream("/axe.min.js")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
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
        pages.put("answer", "/answer?j=" + token);
        pages.put("answer uncovered", "/answer?j=" + uncovered);
        pages.put("tables", "/tables");
        pages.put("edition", "/tables/en-1991-1-4/2005");
        pages.put("checks", "/checks");
        pages.put("publication", "/checks/SIGN");
        pages.put("about", "/about");
        pages.put("message", "/nowhere");
        return pages;
    }
}
