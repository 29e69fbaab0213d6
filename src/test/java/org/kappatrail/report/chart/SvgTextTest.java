package org.kappatrail.report.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import org.junit.jupiter.api.Test;

class SvgTextTest {
  private static final String HEAD =
      """
      <?xml version="1.0" encoding="UTF-8" standalone="no"?>
      <!DOCTYPE svg PUBLIC "-//W3C//DTD SVG 1.1//EN" "http://www.w3.org/Graphics/SVG/1.1/DTD/svg11.dtd">
      <svg height="50px" version="1.1" viewBox="0 0 90 50" width="90px" xmlns="http://www.w3.org/2000/svg">
      """;

  @Test
  void coordinatesAreRoundedToAHundredthOfAPixel() throws IOException {
    assertThat(
            compact(
                "<path d=\"M7.028169014,-102.67548 L-0.001,2.5E-4 L8,9.1234\""
                    + " style=\"fill:rgb(1,2,3);stroke:none;\"/>"))
        .contains("d=\"M7.03,-102.68 L0,2.5E-4 L8,9.12\"");
  }

  @Test
  void stylesBecomeAttributesAndColoursHexadecimal() throws IOException {
    assertThat(
            compact(
                "<line style=\"fill:none;stroke:rgb(217,220,223);stroke-width:0.6;"
                    + "stroke-miterlimit:10;stroke-linecap:square;\" x1=\"0\" x2=\"9\" y1=\"1\""
                    + " y2=\"1\"/>"))
        .contains(
            "<line stroke=\"#d9dcdf\" stroke-width=\"0.6\" x1=\"0\" x2=\"9\" y1=\"1\" y2=\"1\"/>")
        .doesNotContain("style");
  }

  @Test
  void whatPaintsNothingIsLeftOut() throws IOException {
    assertThat(
            compact(
                "<line style=\"fill:none;stroke:rgb(0,0,0);stroke-opacity:0;\" x1=\"0\" x2=\"9\"/>"
                    + "<line style=\"fill:none;stroke:rgb(0,0,0);stroke-width:0;\" x1=\"0\"/>"
                    + "<rect style=\"fill:none;stroke:none;\" width=\"3\"/>"))
        .doesNotContain("<line", "<rect");
  }

  @Test
  void clipsAreKeptAndNumbered() throws IOException {
    assertThat(
            compact(
                "<defs><clipPath id=\"clip-77\"><rect width=\"5\"/></clipPath></defs>"
                    + "<circle r=\"2\" style=\"fill:rgb(0,0,0);clip-path:url(#clip-77);\"/>"))
        .contains("<clipPath id=\"clip1\"><rect width=\"5\"/>")
        .contains("clip-path=\"url(#clip1)\"");
  }

  @Test
  void textStaysTextAndKeepsItsNumbers() throws IOException {
    assertThat(
            compact(
                "<text style=\"fill:rgb(0,0,0);font-family:&quot;DejaVu Sans&quot;;"
                    + "font-size:17px;\" x=\"1\">&lt;b&gt; 0.123456 &amp; more</text>"))
        .contains("font-family=\"DejaVu Sans, sans-serif\"")
        .contains(
            "<text fill=\"#000000\" font-size=\"17\" x=\"1\">&lt;b&gt; 0.123456 &amp; more</text>");
  }

  private static String compact(String content) throws IOException {
    return SvgText.compact(HEAD + content + "</svg>");
  }
}
