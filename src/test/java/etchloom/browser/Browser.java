package etchloom.browser;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Base64;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.openqa.selenium.By;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.json.Json;
import org.openqa.selenium.logging.LogEntry;
import org.openqa.selenium.logging.LogType;
import org.openqa.selenium.logging.LoggingPreferences;

/** One headless Chromium for all tests of this run; {@link NeedsBrowser} ends it with the run. */
public final class Browser {
  private static final List<String> BROWSERS =
      List.of("/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome");
  private static final List<String> DRIVERS =
      List.of("/usr/bin/chromedriver", "/usr/lib/chromium-browser/chromedriver");
  private static final String WHAT_TO_INSTALL =
      "no Chromium here; on Debian: apt-get install chromium chromium-driver";

  /** Held, so that its level stays: no wish to hear that Chromium is newer than Selenium. */
  private static final Logger SELENIUM = Logger.getLogger("org.openqa.selenium");

  private static Browser only;

  private final ChromeDriver driver;

  private Browser(ChromeDriver driver) {
    this.driver = driver;
  }

  /** What to install, where the browser or its driver is missing. */
  static Optional<String> missing() {
    return found(BROWSERS).isPresent() && found(DRIVERS).isPresent()
        ? Optional.empty()
        : Optional.of(WHAT_TO_INSTALL);
  }

  private static Optional<Path> found(List<String> places) {
    return places.stream().map(Path::of).filter(Files::isExecutable).findFirst();
  }

  /** Starts it at the first call. */
  public static synchronized Browser get() {
    if (only == null) {
      only = new Browser(start());
    }
    return only;
  }

  /** Ends it, if it was started. */
  public static synchronized void end() {
    if (only != null) {
      only.driver.quit();
      only = null;
    }
  }

  private static ChromeDriver start() {
    if (missing().isPresent()) {
      throw new AssertionError(WHAT_TO_INSTALL);
    }
    SELENIUM.setLevel(Level.SEVERE);
    ChromeOptions o = new ChromeOptions();
    o.setBinary(found(BROWSERS).orElseThrow().toString());
    o.addArguments(
        "--headless=new",
        "--no-sandbox",
        "--disable-gpu",
        "--disable-dev-shm-usage",
        "--disable-background-networking",
        "--disable-component-update",
        "--no-first-run",
        "--lang=en",
        "--window-size=1200,900");
    LoggingPreferences logs = new LoggingPreferences();
    logs.enable(LogType.BROWSER, Level.ALL);
    logs.enable(LogType.PERFORMANCE, Level.ALL);
    o.setCapability(ChromeOptions.LOGGING_PREFS, logs);
    System.setProperty("webdriver.chrome.driver", found(DRIVERS).orElseThrow().toString());
    return new ChromeDriver(o);
  }

  /** For what this class has no method of its own. */
  public ChromeDriver driver() {
    return driver;
  }

  /** Opens a page afresh and forgets what was logged before. */
  public void open(URI page) {
    driver.get("about:blank");
    driver.manage().logs().get(LogType.BROWSER);
    driver.manage().logs().get(LogType.PERFORMANCE);
    driver.get(page.toString());
  }

  public Object run(String script, Object... arguments) {
    return driver.executeScript(script, arguments);
  }

  public WebElement find(String css) {
    return driver.findElement(By.cssSelector(css));
  }

  public List<WebElement> findAll(String css) {
    return driver.findElements(By.cssSelector(css));
  }

  /** Warnings and errors in the console since the last call or {@link #open}. */
  public List<String> consoleComplaints() {
    return driver.manage().logs().get(LogType.BROWSER).getAll().stream()
        .filter(e -> e.getLevel().intValue() >= Level.WARNING.intValue())
        .map(LogEntry::getMessage)
        .toList();
  }

  /** Addresses asked for since the last call or {@link #open}; those inside the page left out. */
  public List<String> requests() {
    List<String> out = new ArrayList<>();
    for (LogEntry e : driver.manage().logs().get(LogType.PERFORMANCE)) {
      Map<?, ?> message = (Map<?, ?>) map(e.getMessage()).get("message");
      if ("Network.requestWillBeSent".equals(message.get("method"))) {
        Map<?, ?> request = (Map<?, ?>) ((Map<?, ?>) message.get("params")).get("request");
        String url = (String) request.get("url");
        if (!url.startsWith("data:") && !url.startsWith("blob:")) {
          out.add(url);
        }
      }
    }
    return out;
  }

  private static Map<?, ?> map(String json) {
    return new Json().toType(json, Map.class);
  }

  /** The system's choice of colours: {@code light} or {@code dark}. */
  public void scheme(String name) {
    driver.executeCdpCommand(
        "Emulation.setEmulatedMedia",
        Map.of("features", List.of(Map.of("name", "prefers-color-scheme", "value", name))));
  }

  /** Size of the view, CSS pixels; narrower than a window can be. */
  public void size(int width, int height) {
    driver.executeCdpCommand(
        "Emulation.setDeviceMetricsOverride",
        Map.of("width", width, "height", height, "deviceScaleFactor", 1, "mobile", false));
  }

  /** Everything on the page as one picture, PNG. */
  public byte[] wholePage() {
    Map<String, Object> shot =
        driver.executeCdpCommand(
            "Page.captureScreenshot", Map.of("format", "png", "captureBeyondViewport", true));
    return Base64.getDecoder().decode((String) shot.get("data"));
  }

  /**
   * What the accessibility checker axe-core finds wrong, all its rules on.
   *
   * @return one line for each rule broken, with the first places
   */
  public List<String> violations() {
    driver.executeScript(axe());
    Object found =
        driver.executeAsyncScript(
            "const done = arguments[arguments.length - 1];"
                + "axe.run(document, {resultTypes: ['violations']})"
                + ".then(r => done(r.violations.map(v => v.id + ': ' + v.help + ' '"
                + " + v.nodes.slice(0, 4).map(n => n.html.slice(0, 160)"
                + " + ' ' + n.failureSummary).join(' | '))),"
                + " e => done(['axe: ' + e]));");
    return ((List<?>) found).stream().map(Objects::toString).toList();
  }

  private static String axe() {
    try (InputStream in = Browser.class.getResourceAsStream("/axe.min.js")) {
      return new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
