package org.kappatrail.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.cli.Run;

/** The page of the invented site in a real browser, used as its readers use it. */
@Tag("slow")
class PageInBrowserTest {
  private static final int ASSETS = 15;
  private static final String ROWS =
      "[...document.querySelectorAll('table.fleet tbody tr')].filter(row => !row.hidden)";

  @TempDir static Path folder;
  private static Path pack;
  private static Chromium browser;
  private Tab tab;

  @BeforeAll
  static void review() throws IOException {
    browser = Chromium.start();
    Run run =
        Run.of("review", "sample-history", "--out", folder.toString(), "--since", "2026-09-15");
    assertThat(run.code()).as(run.err()).isZero();
    pack = folder.resolve("2026-10-28");
  }

  @AfterAll
  static void end() throws IOException {
    if (browser != null) {
      browser.close();
    }
  }

  @BeforeEach
  void open() {
    tab = browser.open(pack.resolve("index.html"), 1400, 900);
  }

  @AfterEach
  void nothingIsComplainedOfAndNothingLoaded() {
    assertThat(tab.complaints()).isEmpty();
    assertThat(Set.copyOf(tab.requests()))
        .containsExactly(pack.resolve("index.html").toUri().toString());
    assertThat(tab.dialogs()).isZero();
    tab.close();
  }

  @Test
  void thePolicyOfThePageLetsNothingElseRunOrLoad() {
    String policy =
        tab.text("document.querySelector('meta[http-equiv=Content-Security-Policy]').content");
    assertThat(policy).contains("default-src 'none'").doesNotContain("unsafe");
    String blocked =
        tab.text(
            """
            new Promise(resolve => {
              const seen = [];
              document.addEventListener('securitypolicyviolation', event => {
                seen.push(event.effectiveDirective);
                if (seen.length === 3) resolve(seen.sort().join());
              });
              const script = document.createElement('script');
              script.textContent = 'window.ran = true';
              document.body.append(script);
              document.body.insertAdjacentHTML('beforeend', '<p style="color: red"></p>');
              const picture = new Image();
              picture.src = 'https://tarn-hollow.invalid/x.png';
              setTimeout(() => resolve(seen.sort().join()), 5000);
            })
            """);
    assertThat(blocked).isEqualTo("img-src,script-src-elem,style-src-attr");
    assertThat(tab.look("window.ran === undefined").asBoolean()).isTrue();
    // what was tried here is meant to be complained of
    tab.close();
    open();
  }

  @Test
  void sortsByNumberUpDownAndBack() {
    List<String> worstFirst = assets();
    String head = "table.fleet th:nth-of-type(4) button";
    assertThat(tab.text("document.querySelector('" + head + "').textContent")).isEqualTo("κ");
    tab.click(head);
    assertThat(kappas()).hasSize(ASSETS).isSorted();
    tab.click(head);
    assertThat(kappas()).hasSize(ASSETS).isSortedAccordingTo(Comparator.reverseOrder());
    assertThat(tab.text("document.querySelector('th[aria-sort]').ariaSort"))
        .isEqualTo("descending");
    tab.click(head);
    assertThat(assets()).isEqualTo(worstFirst);
    assertThat(tab.look("document.querySelector('th[aria-sort]') === null").asBoolean()).isTrue();
  }

  @Test
  void filtersByLevelVerdictAndArea() throws IOException {
    choose("level", "alarm");
    assertThat(assets())
        .containsExactlyInAnyOrder("SP-AG4", "PM-PRS", "SP-CRP", "SP-PGB", "PM-WGB");
    choose("verdict", "change-now");
    assertThat(assets()).containsExactlyInAnyOrder("SP-CRP", "PM-WGB");
    choose("area", "paper-machine");
    assertThat(assets()).containsExactly("PM-WGB");
    assertThat(tab.text("document.querySelector('#shown').textContent"))
        .isEqualTo("1 of 15 assets");
    choose("level", "");
    choose("verdict", "");
    List<String> registered =
        rows(Path.of("sample-history/assets.csv")).stream()
            .filter(row -> row.getField("area").equals("paper-machine"))
            .map(row -> row.getField("asset"))
            .toList();
    assertThat(assets()).containsExactlyInAnyOrderElementsOf(registered);
  }

  @Test
  void findsByAllWordsOfNameOilAndBearing() {
    tab.click("#find");
    tab.type("GEARBOX out");
    assertThat(assets()).containsExactlyInAnyOrder("SP-PGB", "PM-WGB", "PM-RGB");
    tab.type(" gear-320");
    assertThat(assets()).containsExactly("PM-WGB");
    tab.type(" no such thing");
    assertThat(assets()).isEmpty();
    assertThat(tab.text("document.querySelector('#shown').textContent"))
        .isEqualTo("0 of 15 assets");
  }

  @Test
  void opensTheAssetOfARow() {
    tab.click("table.fleet tbody tr:nth-of-type(3) a");
    String asset = assets().get(2);
    tab.waitFor("location.hash !== ''");
    tab.waitFor("Math.abs(document.querySelector(location.hash).getBoundingClientRect().top) < 60");
    assertThat(tab.text("document.querySelector(location.hash + ' h2 bdi').textContent"))
        .isEqualTo(asset);
    assertThat(tab.text("document.querySelector(location.hash + ' .story').textContent"))
        .contains("κ");
  }

  @Test
  void aPointUnderThePointerTellsItsSampleAsTheTablesHaveIt() throws IOException {
    NamedCsvRecord row =
        rows(pack.resolve("kappa-history.csv")).stream()
            .filter(item -> item.getField("asset").equals("SP-CRP"))
            .filter(item -> item.getField("bearing").equals("DE"))
            .filter(item -> item.getField("sampled_at").startsWith("2026-08"))
            .findFirst()
            .orElseThrow();
    String kappa = new BigDecimal(row.getField("kappa")).round(new MathContext(3)).toPlainString();
    tab.point("#a-SP-CRP rect[aria-label^='" + row.getField("sample") + "']");
    tab.waitFor("!document.querySelector('#tip').hidden");
    assertThat(tab.text("document.querySelector('#tip').textContent"))
        .contains(row.getField("sample"))
        .contains("κ " + kappa)
        .contains(row.getField("level"))
        .contains(decimals(row.getField("temperature_c"), 1) + " °C (log)")
        .contains("ν40 " + decimals(row.getField("viscosity_40c_cst"), 2));
    assertThat(inside("#tip")).isTrue();
    tab.point("h1");
    tab.waitFor("document.querySelector('#tip').hidden");
  }

  @Test
  void everythingCanBeDoneByKeyboard() {
    tabTo("document.activeElement.id === 'find'", 60);
    tab.type("winder");
    assertThat(assets()).containsExactly("PM-WGB");
    tabTo("document.activeElement.textContent === 'κ'", 20);
    tab.press("Enter");
    assertThat(tab.text("document.querySelector('th[aria-sort]').ariaSort")).isEqualTo("ascending");
    tabTo("document.activeElement.matches('td.name a')", 20);
    tab.press("Enter");
    tab.waitFor("location.hash === '#a-PM-WGB'");
    tabTo("document.activeElement.matches('.spot')", 20);
    String last = tab.text("document.querySelector('#tip b').textContent");
    tab.press("ArrowLeft");
    String before = tab.text("document.querySelector('#tip b').textContent");
    assertThat(before).isNotEqualTo(last);
    assertThat(tab.text("document.activeElement.getAttribute('aria-label')")).startsWith(before);
    tab.press("End");
    assertThat(tab.text("document.querySelector('#tip b').textContent")).isEqualTo(last);
    tab.press("Escape");
    assertThat(tab.look("document.querySelector('#tip').hidden").asBoolean()).isTrue();
    assertThat(tab.look("document.activeElement.matches(':focus-visible')").asBoolean()).isTrue();
  }

  @Test
  void aTableIsCopiedAsTheShownRows() throws IOException {
    choose("level", "alarm");
    String csv =
        tab.text(
            """
            new Promise(resolve => {
              navigator.clipboard.writeText = async text => resolve(text);
              document.querySelector('button[aria-label="copy table fleet as CSV"]').click();
            })
            """);
    List<CsvRecord> records;
    try (CsvReader<CsvRecord> reader = CsvReader.builder().ofCsvRecord(csv)) {
      records = reader.stream().toList();
    }
    assertThat(records).hasSize(1 + 5);
    assertThat(records.get(0).getFields()).startsWith("asset", "bearing").contains("verdict");
    assertThat(records.get(1).getField(0)).isEqualTo("SP-AG4 Chest agitator 4");
    assertThat(records.get(1).getFields())
        .as("no value starts like a formula")
        .noneMatch(field -> field.matches("[=@].*|[+-].*[^0-9.].*"));
  }

  @Test
  void printsWithEveryAssetOnAPageOfItsOwn() {
    byte[] pdf = tab.pdf();
    String text = new String(pdf, StandardCharsets.ISO_8859_1);
    assertThat(text).startsWith("%PDF-");
    long pages = Pattern.compile("/Type\\s*/Page\\b").matcher(text).results().count();
    assertThat(pages).isBetween(ASSETS + 1L, 80L);
  }

  @Test
  void atEightHundredPixelsNothingIsCutWithoutAHint() {
    tab.resize(800, 900);
    tab.waitFor("innerWidth === 800");
    assertThat(tab.look("document.documentElement.scrollWidth").asInt())
        .isEqualTo(tab.look("document.documentElement.clientWidth").asInt());
    tab.waitFor("document.querySelector('#fleet .scroll').classList.contains('wider')");
    assertThat(
            tab.texts(
                """
                (async () => {
                  const cut = [];
                  document.querySelectorAll('details').forEach(part => (part.open = true));
                  for (const box of document.querySelectorAll('.scroll')) {
                    box.scrollIntoView();
                    for (let i = 0; i < 3; i++) await new Promise(requestAnimationFrame);
                    if (box.scrollWidth > box.clientWidth + 1
                        && !(box.classList.contains('wider') && box.tabIndex === 0)) {
                      cut.push(box.textContent.slice(0, 60));
                    }
                  }
                  return cut;
                })()
                """))
        .isEmpty();
  }

  @Test
  void byNightPageAndChartsAreDarkAndByDayLight() {
    String paper =
        "[...document.querySelectorAll('.chart rect')].map(box => getComputedStyle(box).fill)"
            + ".find(fill => fill !== 'none') + ' '"
            + " + getComputedStyle(document.body).backgroundColor";
    assertThat(tab.text(paper)).isEqualTo("rgb(252, 251, 248) rgb(252, 251, 248)");
    tab.dark(true);
    assertThat(tab.text(paper)).isEqualTo("rgb(32, 36, 42) rgb(32, 36, 42)");
  }

  @Test
  void whatCanBeUsedHasANameForAScreenReader() {
    Set<String> usable =
        Set.of("button", "link", "searchbox", "combobox", "option", "listbox", "image", "region");
    List<JsonNode> nodes = tab.accessible();
    List<JsonNode> used = nodes.stream().filter(node -> usable.contains(role(node))).toList();
    assertThat(used.stream().map(PageInBrowserTest::role).distinct().sorted())
        .contains("button", "combobox", "image", "link", "option", "searchbox");
    assertThat(used)
        .filteredOn(node -> node.path("name").path("value").asText().isBlank())
        .as("without a name")
        .isEmpty();
    assertThat(tab.look("document.documentElement.lang").asText()).isEqualTo("en");
    assertThat(tab.look("document.querySelectorAll('h1').length").asInt()).isEqualTo(1);
  }

  @Test
  void withoutScriptsThePageIsStillWhole() {
    tab.close();
    tab = browser.open(pack.resolve("index.html"), 1400, 900);
    tab.withoutScripts();
    tab.go(pack.resolve("index.html"));
    assertThat(assets()).hasSize(ASSETS);
    assertThat(tab.look("document.querySelector('.controls').hidden").asBoolean()).isTrue();
    assertThat(tab.look("document.querySelectorAll('section.asset .chart').length").asInt())
        .isGreaterThanOrEqualTo(ASSETS);
  }

  private static String role(JsonNode node) {
    return node.path("role").path("value").asText();
  }

  private void tabTo(String goal, int most) {
    for (int i = 0; i < most; i++) {
      tab.press("Tab");
      if (tab.look(goal).asBoolean()) {
        return;
      }
    }
    throw new AssertionError("not reached with " + most + " presses of Tab: " + goal);
  }

  private void choose(String what, String value) {
    tab.look(
        "(() => { const s = document.querySelector('select[data-filter="
            + what
            + "]'); s.value = "
            + Tab.quoted(value)
            + "; s.dispatchEvent(new Event('change')); })()");
  }

  private List<String> assets() {
    return tab.texts(ROWS + ".map(row => row.cells[0].dataset.v)");
  }

  private List<Double> kappas() {
    return tab.texts(ROWS + ".map(row => row.cells[3].textContent)").stream()
        .map(Double::valueOf)
        .toList();
  }

  private boolean inside(String selector) {
    return tab.look(
            "(() => { const r = document.querySelector('"
                + selector
                + "').getBoundingClientRect(); return r.left >= 0 && r.top >= 0"
                + " && r.right <= innerWidth && r.bottom <= innerHeight; })()")
        .asBoolean();
  }

  private static String decimals(String number, int count) {
    return new BigDecimal(number).setScale(count, RoundingMode.HALF_EVEN).toPlainString();
  }

  private static List<NamedCsvRecord> rows(Path file) throws IOException {
    try (CsvReader<NamedCsvRecord> reader = CsvReader.builder().ofNamedCsvRecord(file)) {
      return reader.stream().toList();
    }
  }
}
