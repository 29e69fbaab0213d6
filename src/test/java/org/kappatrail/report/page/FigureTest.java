package org.kappatrail.report.page;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringReader;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.junit.jupiter.api.Test;
import org.kappatrail.report.chart.Spot;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;

class FigureTest {
  private static final String SVG =
      "<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"90\" height=\"50\" viewBox=\"0 0 90 50\""
          + " fill=\"none\"><defs><clipPath id=\"clip1\"><rect width=\"5\"/></clipPath></defs>"
          + "<circle r=\"1\" clip-path=\"url(#clip1)\"/></svg>";
  private static final List<Spot> SPOTS =
      List.of(new Spot("a", 1, 2, 3.25, 40), new Spot("b", 11, 2, 3, 40));

  @Test
  void placesLieOverTheChartInItsOwnCoordinates() throws Exception {
    Html html = new Html();
    figure().withChoices(html, "a \"chart\"", "samples", i -> SPOTS.get(i).key() + "<\nκ");
    Element figure = parse(html);
    NodeList drawings = figure.getElementsByTagName("svg");
    assertThat(drawings.getLength()).isEqualTo(2);
    Element chart = (Element) drawings.item(0);
    Element places = (Element) drawings.item(1);
    assertThat(chart.getAttribute("aria-label")).isEqualTo("a \"chart\"");
    assertThat(places.getAttribute("viewBox"))
        .isEqualTo("0 0 90 50")
        .isEqualTo(chart.getAttribute("viewBox"));
    assertThat(chart.hasAttribute("width")).as("as wide as the page").isFalse();
    NodeList options = places.getElementsByTagName("rect");
    assertThat(options.getLength()).isEqualTo(2);
    Element first = (Element) options.item(0);
    assertThat(first.getAttribute("x")).isEqualTo("1");
    assertThat(first.getAttribute("width")).isEqualTo("3.2");
    assertThat(first.getAttribute("aria-label")).as("blanks by XML's rule").isEqualTo("a< κ");
    assertThat(first.getAttribute("tabindex")).as("one stop a chart").isEqualTo("-1");
    assertThat(((Element) options.item(1)).getAttribute("tabindex")).isEqualTo("0");
  }

  @Test
  void placesMayBeLinks() throws Exception {
    Html html = new Html();
    figure().withLinks(html, "the fleet", "bearings", i -> "#a-\"" + i, i -> "row " + i);
    NodeList links = parse(html).getElementsByTagName("a");
    assertThat(links.getLength()).isEqualTo(2);
    assertThat(((Element) links.item(1)).getAttribute("href")).isEqualTo("#a-\"1");
    assertThat(((Element) links.item(1)).getAttribute("aria-label")).isEqualTo("row 1");
  }

  @Test
  void clipsOfTwoChartsOnOnePageAreToldApart() {
    Html html = new Html();
    figure().withChoices(html, "", "", i -> "");
    assertThat(html.toString())
        .contains("id=\"P-1-clip1\"", "url(#P-1-clip1)")
        .doesNotContain("\"clip1", "#clip1");
  }

  private static Figure figure() {
    return new Figure(new Picture(() -> SVG, SPOTS), "P-1");
  }

  private static Element parse(Html html)
      throws ParserConfigurationException, SAXException, IOException {
    return DocumentBuilderFactory.newDefaultInstance()
        .newDocumentBuilder()
        .parse(new InputSource(new StringReader(html.toString())))
        .getDocumentElement();
  }
}
