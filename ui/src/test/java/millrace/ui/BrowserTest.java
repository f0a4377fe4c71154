package millrace.ui;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import millrace.ui.mart.MartFixture;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.openqa.selenium.By;
import org.openqa.selenium.WebDriver;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.support.ui.ExpectedConditions;
import org.openqa.selenium.support.ui.WebDriverWait;
import org.springframework.boot.builder.SpringApplicationBuilder;
import org.springframework.context.ConfigurableApplicationContext;

/** Opens the pages in a browser and follows a count to its episode. */
class BrowserTest {
  private static final Path BROWSER = Path.of("/usr/bin/chromium");
  private static final Path DRIVER = Path.of("/usr/bin/chromedriver");

  @TempDir static Path folder;

  private static ConfigurableApplicationContext server;
  private static WebDriver browser;
  private static WebDriverWait wait;
  private static String root;

  @BeforeAll
  static void start() {
    assumeTrue(
        Files.isExecutable(BROWSER) && Files.isExecutable(DRIVER),
        "no " + BROWSER + " or " + DRIVER + ": install chromium and chromium-driver");
    Path mart = MartFixture.write(folder.resolve("mart"));
    server =
        new SpringApplicationBuilder(Dashboard.class)
            .run("--server.port=0", "--" + Dashboard.MART + "=" + mart);
    root = "http://127.0.0.1:" + server.getEnvironment().getProperty("local.server.port") + "/";
    ChromeOptions options = new ChromeOptions();
    options.setBinary(BROWSER.toFile());
    options.addArguments(
        "--headless=new",
        "--no-sandbox",
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
        "--window-size=1440,1000",
        "--user-data-dir=" + folder.resolve("browser"));
    ChromeDriverService service =
        new ChromeDriverService.Builder()
            .usingDriverExecutable(new File(DRIVER.toString()))
            .build();
    browser = new ChromeDriver(service, options);
    wait = new WebDriverWait(browser, Duration.ofSeconds(30));
  }

  @AfterAll
  static void stop() {
    if (browser != null) {
      browser.quit();
    }
    if (server != null) {
      server.close();
    }
  }

  @Test
  void followsACountToItsEpisode() {
    browser.get(root);
    heading("March 2031");
    charts(3);
    browser.findElement(By.partialLinkText("1 hospital-onset episode")).click();
    heading("Episodes");
    assertTrue(browser.getCurrentUrl().contains("month=2031-03"), browser.getCurrentUrl());
    wait.until(ExpectedConditions.elementToBeClickable(By.linkText("e-0-1"))).click();
    heading("Episode e-0-1");
    charts(1);
    assertTrue(browser.getPageSource().contains("not linked: first dose 2 hours before onset"));
    assertTrue(browser.getTitle().startsWith("Episode e-0-1"), browser.getTitle());
    browser.findElement(By.partialLinkText("show µmol/L")).click();
    wait.until(
        ExpectedConditions.textToBePresentInElementLocated(By.className("lead"), "170 µmol/L"));
  }

  @Test
  void saysWhatItDoesNotHave() throws Exception {
    for (String path : new String[] {"episodes/e-9-9", "nowhere"}) {
      browser.get(root + path);
      heading("There is no such page");
      assertFalse(browser.getPageSource().contains("Exception"));
      HttpRequest request = HttpRequest.newBuilder(URI.create(root + path)).build();
      assertEquals(
          404,
          HttpClient.newHttpClient()
              .send(request, HttpResponse.BodyHandlers.discarding())
              .statusCode());
    }
    browser.get(root + "month?m=2031-99");
    heading("This address cannot be read");
  }

  private static void heading(String text) {
    wait.until(ExpectedConditions.textToBePresentInElementLocated(By.tagName("h1"), text));
  }

  private static void charts(int number) {
    wait.until(ExpectedConditions.numberOfElementsToBe(By.cssSelector(".chart svg"), number));
  }
}
