package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import org.openqa.selenium.By;
import org.openqa.selenium.WebDriverException;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.support.ui.WebDriverWait;

/** A real browser and what a user does with it. */
final class Browsers {

    private static final File BROWSER = new File("/usr/bin/chromium");
    private static final File DRIVER = new File("/usr/bin/chromedriver");

    private static final String SCANNER = scanner();

    /** A browser that runs scripts or does not; the tests are left out where there is none. */
    static ChromeDriver start(boolean scripts) throws IOException {
        boolean there = BROWSER.canExecute() && DRIVER.canExecute();
        if (!there) {
            System.out.println("The browser tests are left out: " + BROWSER + " or " + DRIVER + " is not installed.");
        }
        assertThat(there || !"true".equals(System.getenv("CI"))).as("a browser where every change is tested").isTrue();
        assumeThat(there).isTrue();
        return browser(scripts);
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

    static void stop(ChromeDriver... drivers) {
        for (ChromeDriver driver : drivers) {
            if (driver != null) {
                driver.quit();
            }
        }
    }

    static void type(ChromeDriver driver, String id, String text) {
        WebElement box = driver.findElement(By.id(id));
        box.clear();
        box.sendKeys(text);
    }

    /** Presses a button that leads to another page, and waits for that page. */
    static void press(ChromeDriver driver, String words) {
        WebElement before = driver.findElement(By.tagName("html"));
        driver.findElements(By.cssSelector("button:not([aria-hidden])")).stream().filter(b -> b.getText().startsWith(words)).findFirst().orElseThrow().click();
        new WebDriverWait(driver, Duration.ofSeconds(10)).until(d -> gone(before));
        new WebDriverWait(driver, Duration.ofSeconds(10)).until(d -> !d.findElements(By.tagName("footer")).isEmpty());
    }

    /** Whether an element belongs to a page that was left; the driver has more than one way to say so. */
    static boolean gone(WebElement element) {
        try {
            element.isEnabled();
            return false;
        } catch (WebDriverException left) {
            return true;
        }
    }

    static void begin(ChromeDriver driver, String code, String units, String kind) {
        driver.get(Pool.base() + "/");
        driver.findElement(By.cssSelector("input[name=code][value='" + code + "']")).click();
        driver.findElement(By.id("units-" + units)).click();
        press(driver, kind);
    }

    static void checkPdf(ChromeDriver driver, String words) {
        String link = driver.findElement(By.linkText(words)).getDomAttribute("href");
        byte[] pdf = Pool.bytes(link).body();
        assertThat(new String(pdf, 0, 5, StandardCharsets.US_ASCII)).isEqualTo("%PDF-");
    }

    /** Whether an image was loaded. */
    static boolean image(ChromeDriver driver, String css) {
        return Boolean.TRUE.equals(driver.executeScript("const i = document.querySelector(arguments[0]); return !!i && i.complete && i.naturalWidth > 0;", css));
    }

    /** What the scanner finds wrong with the page, by its rule and the first place. */
    @SuppressWarnings("unchecked")
    static List<String> violations(ChromeDriver driver) {
        driver.executeScript(SCANNER);
        Object answer = driver.executeAsyncScript("const done = arguments[arguments.length - 1];"
            + "axe.run(document, {resultTypes: ['violations']}).then(r => done(r.violations.map(v => v.id + ' ' + v.nodes[0].html)), e => done([String(e)]));");
        return (List<String>) answer;
    }

    private static String scanner() {
        try (InputStream in = Browsers.class.getResourceAsStream("/axe.min.js")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Browsers() { }
}
