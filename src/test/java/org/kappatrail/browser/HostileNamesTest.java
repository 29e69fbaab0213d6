package org.kappatrail.browser;

import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.cli.Run;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.SAXException;

/** Names that try to be markup, formulas, very long or of the other direction are text. */
@Tag("slow")
class HostileNamesTest {
  private static final Set<String> DRAWN =
      Set.of("svg", "g", "defs", "clipPath", "rect", "circle", "ellipse", "line", "path", "text");

  @TempDir static Path folder;
  private static Path pack;

  @BeforeAll
  static void review() throws IOException {
    HostileSite.write(folder.resolve("history"));
    Run run =
        Run.of(
            "review",
            folder.resolve("history").toString(),
            "--out",
            folder.resolve("out").toString());
    assertThat(run.code()).as(run.err()).isZero();
    pack = folder.resolve("out/2026-06-10");
  }

  @Test
  void thePageHoldsThemAsText() throws IOException {
    String html = Files.readString(pack.resolve("index.html"));
    assertThat(html)
        .doesNotContain("<img", "<b>28", "<i>", "<svg onload", "<script>window", "]]>")
        .doesNotContain("\u202E")
        .contains("&lt;img src=x onerror=alert(1)&gt;")
        .contains("&lt;script&gt;window.ran = 1&lt;/script&gt;");
    assertThat(html.split("<script", -1)).as("the page's own script alone").hasSize(2);
  }

  @Test
  void chartsAreLawfulXmlOfShapesAndTextAlone()
      throws IOException, ParserConfigurationException, SAXException {
    List<Path> charts;
    try (Stream<Path> files = Files.list(pack.resolve("charts"))) {
      charts = files.filter(file -> file.toString().endsWith(".svg")).sorted().toList();
    }
    assertThat(charts).hasSizeGreaterThan(HostileSite.ASSETS.size());
    List<String> texts = new ArrayList<>();
    for (Path chart : charts) {
      Document document =
          DocumentBuilderFactory.newDefaultInstance().newDocumentBuilder().parse(chart.toFile());
      NodeList elements = document.getElementsByTagName("*");
      for (int i = 0; i < elements.getLength(); i++) {
        Element element = (Element) elements.item(i);
        assertThat(element.getTagName()).isIn(DRAWN);
        for (int k = 0; k < element.getAttributes().getLength(); k++) {
          String name = element.getAttributes().item(k).getNodeName();
          assertThat(name).doesNotStartWith("on").isNotIn("style", "href", "xlink:href");
        }
        if (element.getTagName().equals("text")) {
          texts.add(element.getTextContent());
        }
      }
    }
    assertThat(texts)
        .anyMatch(text -> text.startsWith(HostileSite.MARKUP + " ·"))
        .anyMatch(text -> text.startsWith(HostileSite.FORMULA + " ·"))
        .anyMatch(text -> text.startsWith("roll roll roll") && text.endsWith("…"))
        .anyMatch(text -> text.startsWith(HostileSite.shown(HostileSite.LEFTWARD)))
        .noneMatch(text -> text.contains("\u202E"));
  }

  @Test
  void aSpreadsheetRunsNothingOfTheTables() throws IOException {
    try (CsvReader<NamedCsvRecord> reader =
        CsvReader.builder().ofNamedCsvRecord(pack.resolve("kappa-history.csv"))) {
      assertThat(reader.stream().map(row -> row.getField("asset")))
          .contains("'" + HostileSite.FORMULA, HostileSite.MARKUP)
          .noneMatch(asset -> asset.startsWith("="));
    }
  }

  @Test
  void aBrowserShowsThemAndRunsNothing() throws IOException {
    try (Chromium browser = Chromium.start();
        Tab tab = browser.open(pack.resolve("index.html"), 800, 900)) {
      assertThat(
              tab.texts(
                  "[...document.querySelectorAll('table.fleet td.name a bdi')].map(a => a.textContent)"))
          .containsExactlyInAnyOrderElementsOf(
              HostileSite.ASSETS.stream().map(HostileSite::shown).toList());
      assertThat(tab.text("document.querySelector('h1').textContent"))
          .isEqualTo("<script>window.ran = 1</script>: oil film review");
      assertThat(
              tab.texts(
                  "[...document.querySelectorAll('select[data-filter=area] option')].map(o => o.textContent)"))
          .containsExactly("any", HostileSite.AREA);
      assertThat(tab.look("document.querySelectorAll('img, iframe, object, b b').length").asInt())
          .isZero();
      tab.point("section.asset rect[role=option]");
      tab.waitFor("!document.querySelector('#tip').hidden");
      assertThat(tab.text("document.querySelector('#tip b').textContent")).startsWith("<b>");
      tab.click("#find");
      tab.type("=cmd|'");
      assertThat(tab.text("document.querySelector('#shown').textContent"))
          .isEqualTo("1 of 4 assets");
      assertThat(csv(tab)).contains("'=cmd|' /C calc'!A0").doesNotContain("\n=");
      assertThat(tab.look("document.documentElement.scrollWidth").asInt())
          .isEqualTo(tab.look("document.documentElement.clientWidth").asInt());
      assertThat(tab.look("window.ran === undefined").asBoolean()).isTrue();
      assertThat(tab.dialogs()).isZero();
      assertThat(tab.complaints()).isEmpty();
      assertThat(tab.requests()).containsExactly(pack.resolve("index.html").toUri().toString());
    }
  }

  private static String csv(Tab tab) {
    return tab.text(
        """
        new Promise(resolve => {
          navigator.clipboard.writeText = async text => resolve(text);
          document.querySelector('button[aria-label="copy table fleet as CSV"]').click();
        })
        """);
  }
}
