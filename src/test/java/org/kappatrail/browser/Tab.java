package org.kappatrail.browser;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Base64;
import java.util.List;
import java.util.Map;

/** A tab that a reader looks at: looks, clicks, points, types, prints. */
public final class Tab implements AutoCloseable {
  private static final long PATIENCE_MS = 30_000;

  /** What the keyboard sends: key, code. */
  private static final Map<String, Integer> CODES =
      Map.of(
          "Tab",
          9,
          "Enter",
          13,
          "Escape",
          27,
          "End",
          35,
          "Home",
          36,
          "ArrowLeft",
          37,
          "ArrowUp",
          38,
          "ArrowRight",
          39,
          "ArrowDown",
          40);

  private final DevTools tools;
  private final String session;
  private final String target;

  Tab(DevTools tools, String session, String target) {
    this.tools = tools;
    this.session = session;
    this.target = target;
  }

  void prepare(int width, int height) {
    for (String domain : List.of("Page", "Runtime", "Network", "Log", "Accessibility")) {
      call(domain + ".enable", Map.of());
    }
    resize(width, height);
  }

  public void resize(int width, int height) {
    call(
        "Emulation.setDeviceMetricsOverride",
        Map.of("width", width, "height", height, "deviceScaleFactor", 1, "mobile", false));
  }

  public void dark(boolean dark) {
    call(
        "Emulation.setEmulatedMedia",
        Map.of(
            "features",
            List.of(Map.of("name", "prefers-color-scheme", "value", dark ? "dark" : "light"))));
  }

  public void withoutScripts() {
    call("Emulation.setScriptExecutionDisabled", Map.of("value", true));
  }

  /** Opens a file and waits until it is complete and painted. */
  public void go(Path file) {
    call("Page.navigate", Map.of("url", file.toUri().toString()));
    waitFor("document.readyState === 'complete' && location.href !== 'about:blank'");
  }

  /** Value of an expression. */
  public JsonNode look(String expression) {
    JsonNode reply =
        call(
            "Runtime.evaluate",
            Map.of("expression", expression, "returnByValue", true, "awaitPromise", true));
    if (reply.has("exceptionDetails")) {
      throw new IllegalStateException(expression + ": " + reply.get("exceptionDetails"));
    }
    return reply.get("result").path("value");
  }

  public String text(String expression) {
    return look(expression).asText();
  }

  public List<String> texts(String expression) {
    List<String> found = new ArrayList<>();
    look(expression).forEach(item -> found.add(item.asText()));
    return found;
  }

  /** Waits until an expression is true. */
  public void waitFor(String expression) {
    long end = System.nanoTime() + PATIENCE_MS * 1_000_000;
    while (!look(expression).asBoolean()) {
      if (System.nanoTime() > end) {
        throw new IllegalStateException("never true: " + expression);
      }
      pause();
    }
  }

  private static void pause() {
    try {
      Thread.sleep(20);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }

  /** Clicks in the middle of what a selector finds. */
  public void click(String selector) {
    double[] at = middle(selector);
    for (String kind : List.of("mousePressed", "mouseReleased")) {
      call(
          "Input.dispatchMouseEvent",
          Map.of(
              "type",
              kind,
              "x",
              at[0],
              "y",
              at[1],
              "button",
              "left",
              "buttons",
              1,
              "clickCount",
              1));
    }
  }

  /** Points at the middle of what a selector finds. */
  public void point(String selector) {
    double[] at = middle(selector);
    call("Input.dispatchMouseEvent", Map.of("type", "mouseMoved", "x", at[0], "y", at[1]));
  }

  private double[] middle(String selector) {
    String element = "document.querySelector(" + quoted(selector) + ")";
    String painted =
        "new Promise(done => requestAnimationFrame(() => requestAnimationFrame(done)))";
    // twice, as what comes into view may find its height only then
    for (int i = 0; i < 2; i++) {
      look(element + ".scrollIntoView({block: 'center', behavior: 'instant'})");
      look(painted);
    }
    JsonNode box =
        look(
            "(() => { const r = "
                + element
                + ".getBoundingClientRect(); return [r.left + r.width / 2, r.top + r.height / 2]; })()");
    return new double[] {box.get(0).asDouble(), box.get(1).asDouble()};
  }

  /** Presses a key of a name, such as Tab. */
  public void press(String key) {
    int code = CODES.getOrDefault(key, 0);
    String text = key.equals("Enter") ? "\r" : "";
    call(
        "Input.dispatchKeyEvent",
        Map.of(
            "type",
            text.isEmpty() ? "rawKeyDown" : "keyDown",
            "key",
            key,
            "code",
            key,
            "windowsVirtualKeyCode",
            code,
            "text",
            text));
    call(
        "Input.dispatchKeyEvent",
        Map.of("type", "keyUp", "key", key, "code", key, "windowsVirtualKeyCode", code));
  }

  /** Types text where the focus is. */
  public void type(String text) {
    call("Input.insertText", Map.of("text", text));
  }

  /** The page as PDF. */
  public byte[] pdf() {
    JsonNode reply =
        call("Page.printToPDF", Map.of("printBackground", true, "preferCSSPageSize", true));
    return Base64.getDecoder().decode(reply.get("data").asText());
  }

  /** What was written to the console, thrown, or logged by the browser. */
  public List<String> complaints() {
    List<String> found = new ArrayList<>();
    for (String event :
        List.of("Runtime.exceptionThrown", "Runtime.consoleAPICalled", "Log.entryAdded")) {
      tools.events(session, event).forEach(item -> found.add(event + " " + item));
    }
    return found;
  }

  /** Addresses that were asked for. */
  public List<String> requests() {
    return tools.events(session, "Network.requestWillBeSent").stream()
        .map(event -> event.path("request").path("url").asText())
        .toList();
  }

  /** Dialogs that were opened. */
  public int dialogs() {
    return tools.events(session, "Page.javascriptDialogOpening").size();
  }

  /** Nodes that a screen reader meets. */
  public List<JsonNode> accessible() {
    List<JsonNode> nodes = new ArrayList<>();
    call("Accessibility.getFullAXTree", Map.of()).get("nodes").forEach(nodes::add);
    return nodes.stream().filter(node -> !node.path("ignored").asBoolean()).toList();
  }

  /** A text as a script writes it. */
  public static String quoted(String text) {
    return '"' + text.replace("\\", "\\\\").replace("\"", "\\\"").replace("\n", "\\n") + '"';
  }

  private JsonNode call(String method, Map<String, ?> parameters) {
    return tools.call(session, method, parameters);
  }

  @Override
  public void close() {
    tools.call("", "Target.closeTarget", Map.of("targetId", target));
  }
}
