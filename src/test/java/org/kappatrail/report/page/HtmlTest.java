package org.kappatrail.report.page;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class HtmlTest {

  @ParameterizedTest
  @CsvSource(
      quoteCharacter = '`',
      value = {
        "<img src=x onerror=alert(1)>| &lt;img src=x onerror=alert(1)&gt;",
        "a\"b'c&amp;| a&quot;b&#39;c&amp;amp;",
        "\u202Egnp.elif| gnp.elif",
        "\u0645\u0636\u062E\u0629 7| \u0645\u0636\u062E\u0629 7",
        "a\u0000b\u009Bc| a\uFFFDb\uFFFDc"
      },
      delimiter = '|')
  void textStaysText(String text, String written) {
    assertThat(Html.escape(text)).isEqualTo(written);
    assertThat(new Html().element("td class=\"n\"", text).toString())
        .isEqualTo("<td class=\"n\">" + written + "</td>");
  }
}
