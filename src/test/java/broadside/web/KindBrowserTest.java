package broadside.web;

import static broadside.web.Browsers.begin;
import static broadside.web.Browsers.gone;
import static broadside.web.Browsers.press;
import static broadside.web.Browsers.type;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.time.Duration;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.support.ui.Select;
import org.openqa.selenium.support.ui.WebDriverWait;

/** A real browser on the forms of fences, panels on walls and blade signs: by keyboard, without scripts. */
class KindBrowserTest {

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
    void a_blade_sign_is_filled_in_by_keyboard_alone() {
        scripted.get(Pool.base() + "/");
        scripted.findElement(By.cssSelector("input[name=code][value='en-1991-1-4/2005']")).sendKeys(Keys.SPACE);
        WebElement start = scripted.findElement(By.tagName("html"));
        scripted.findElement(By.cssSelector("button.kind[value=projecting-sign]")).sendKeys(Keys.ENTER);
        new WebDriverWait(scripted, Duration.ofSeconds(10)).until(d -> gone(start));
        new WebDriverWait(scripted, Duration.ofSeconds(10)).until(d -> !d.findElements(By.id("site.basic-speed")).isEmpty());
        scripted.findElement(By.id("site.basic-speed")).sendKeys("26", Keys.TAB, "10 min mean", Keys.TAB);
        WebElement terrain = scripted.switchTo().activeElement();
        assertThat(terrain.getDomAttribute("name")).isEqualTo("site.terrain");
        terrain.sendKeys(Keys.ARROW_UP);
        assertThat(scripted.switchTo().activeElement().getDomAttribute("value")).isEqualTo("unknown");
        scripted.findElement(By.id("items[0].projection")).sendKeys("0.9", Keys.TAB, "2.4", Keys.TAB, "3", Keys.TAB, "100", Keys.TAB, "150");
        scripted.findElement(By.id("items[0].held-by-building-wall")).sendKeys(Keys.SPACE);
        scripted.findElement(By.id("items[0].brackets.count")).sendKeys("2", Keys.TAB, "1.8");
        new WebDriverWait(scripted, Duration.ofSeconds(5)).until(d -> d.findElement(By.cssSelector("[data-status]")).getText().startsWith("Preliminary"));
        assertThat(scripted.findElement(By.cssSelector("[data-status]")).getText()).contains("moment at the wall");
        WebElement before = scripted.findElement(By.tagName("html"));
        scripted.findElement(By.id("items[0].brackets.spacing")).sendKeys(Keys.ENTER);
        new WebDriverWait(scripted, Duration.ofSeconds(10)).until(d -> gone(before));
        new WebDriverWait(scripted, Duration.ofSeconds(10)).until(d -> !d.findElements(By.cssSelector(".answer")).isEmpty());
        assertThat(scripted.findElement(By.cssSelector(".answer")).getText()).contains("Moment at the wall");
    }

    @Test
    void a_fence_without_scripts_is_asked_what_it_is_fixed_to() {
        begin(plain, "en-1991-1-4/2005", "metric", "A banner fence");
        type(plain, "site.basic-speed", "26");
        new Select(plain.findElement(By.id("site.averaging"))).selectByVisibleText("10 min mean");
        plain.findElement(By.id("site.terrain-II")).click();
        plain.findElement(By.id("site.ground-nearby-flat")).click();
        type(plain, "items[0].panel-length", "3.45");
        type(plain, "items[0].panel-height", "2");
        type(plain, "items[0].panels", "40");
        plain.findElement(By.xpath("//summary[.='Blocks weigh it down']")).click();
        press(plain, "Add a block");
        type(plain, "items[0].blocks[0].mass", "25");
        type(plain, "items[0].blocks[0].lever", "0.6");
        press(plain, "Work out");
        WebElement line = plain.findElement(By.cssSelector(".problems a"));
        assertThat(line.getText()).isEqualTo("Choose what it is fixed to");
        line.click();
        plain.findElement(By.id("items[0].held-by-its-own-feet")).click();
        press(plain, "Work out");
        assertThat(plain.findElement(By.cssSelector(".answer")).getText()).contains("kN");
    }

    @Test
    void a_hill_near_by_opens_its_sizes_and_flat_ground_shuts_them() {
        begin(scripted, "en-1991-1-4/2005", "metric", "A panel on a wall");
        assertThat(scripted.findElement(By.id("site.topography.height")).isDisplayed()).isFalse();
        scripted.findElement(By.id("site.ground-nearby-hill")).click();
        assertThat(scripted.findElement(By.id("site.topography.height")).isDisplayed()).isTrue();
        scripted.findElement(By.id("site.ground-nearby-unknown")).click();
        assertThat(scripted.findElement(By.id("site.topography.height")).isDisplayed()).isFalse();
    }
}
