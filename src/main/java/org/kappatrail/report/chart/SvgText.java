package org.kappatrail.report.chart;

import java.io.IOException;
import java.io.StringReader;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.xml.XMLConstants;
import javax.xml.parsers.DocumentBuilder;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.w3c.dom.Element;
import org.w3c.dom.NamedNodeMap;
import org.w3c.dom.Node;
import org.w3c.dom.Text;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;

/**
 * Rewrites the vector writer's SVG: coordinates to a hundredth of a pixel, styles as plain
 * attributes (so that a page may forbid inline styles and recolour by attribute), nothing that
 * paints nothing. A quarter of the size, and the same picture.
 */
final class SvgText {
  private static final Set<String> GEOMETRY =
      Set.of(
          "x",
          "y",
          "x1",
          "y1",
          "x2",
          "y2",
          "cx",
          "cy",
          "rx",
          "ry",
          "r",
          "width",
          "height",
          "d",
          "points",
          "transform");
  private static final Pattern LONG_NUMBER = Pattern.compile("-?\\d+\\.\\d{3,}(E-?\\d+)?");
  private static final Pattern RGB = Pattern.compile("rgb\\((\\d+),(\\d+),(\\d+)\\)");
  private static final Pattern CLIP = Pattern.compile("url\\(#(.*)\\)");
  private static final Pattern FONT = Pattern.compile("\"?([^\",]*)\"?.*");

  /** What every element inherits from the root, so that it need not be repeated. */
  private static final Map<String, String> INHERITED =
      Map.of("fill", "none", "stroke", "none", "stroke-linecap", "square");

  private final StringBuilder out = new StringBuilder();
  private final Map<String, String> clips = new LinkedHashMap<>();
  private String font = "";

  private SvgText() {}

  /** The same picture in less text. */
  static String compact(String svg) throws IOException {
    SvgText text = new SvgText();
    text.root(parse(svg));
    return text.out.toString();
  }

  private static Element parse(String svg) throws IOException {
    try {
      DocumentBuilderFactory factory = DocumentBuilderFactory.newDefaultInstance();
      factory.setFeature(XMLConstants.FEATURE_SECURE_PROCESSING, true);
      factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
      DocumentBuilder builder = factory.newDocumentBuilder();
      return builder.parse(new InputSource(new StringReader(svg))).getDocumentElement();
    } catch (ParserConfigurationException | SAXException e) {
      throw new IOException("the chart's own SVG cannot be read again", e);
    }
  }

  private void root(Element root) {
    String width = root.getAttribute("width").replace("px", "");
    String height = root.getAttribute("height").replace("px", "");
    out.append("<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"")
        .append(width)
        .append("\" height=\"")
        .append(height)
        .append("\" viewBox=\"0 0 ")
        .append(width)
        .append(' ')
        .append(height)
        .append("\" fill=\"none\" stroke=\"none\" stroke-linecap=\"square\"")
        .append(" font-size=\"12\"");
    font = firstFont(root);
    if (!font.isEmpty()) {
      out.append(" font-family=\"").append(escape(font)).append(", sans-serif\"");
    }
    out.append(">\n");
    children(root);
    out.append("</svg>\n");
  }

  private static String firstFont(Element root) {
    var texts = root.getElementsByTagName("text");
    for (int i = 0; i < texts.getLength(); i++) {
      String family = styles((Element) texts.item(i)).get("font-family");
      if (family != null) {
        return plainFont(family);
      }
    }
    return "";
  }

  private static String plainFont(String family) {
    Matcher matcher = FONT.matcher(family.strip());
    return matcher.matches() ? matcher.group(1) : family;
  }

  private void children(Element parent) {
    for (Node node = parent.getFirstChild(); node != null; node = node.getNextSibling()) {
      if (node instanceof Element element) {
        element(element);
      } else if (node instanceof Text && parent.getTagName().equals("text")) {
        out.append(escape(node.getTextContent()));
      }
    }
  }

  private void element(Element element) {
    Map<String, String> attributes = attributes(element);
    String name = element.getTagName();
    boolean holdsOthers = Set.of("g", "defs", "clipPath").contains(name);
    boolean clip = element.getParentNode() instanceof Element parent && isClip(parent);
    if (!holdsOthers && !clip && paintsNothing(attributes)) {
      return;
    }
    String radius = attributes.getOrDefault("rx", "");
    if (name.equals("ellipse") && radius.equals(attributes.get("ry"))) {
      name = "circle";
      attributes.remove("rx");
      attributes.remove("ry");
      attributes.put("r", radius);
    }
    out.append('<').append(name);
    attributes.forEach(
        (key, value) ->
            out.append(' ').append(key).append("=\"").append(escape(value)).append('"'));
    if (element.hasChildNodes()) {
      out.append('>');
      children(element);
      out.append("</").append(name).append(">\n");
    } else {
      out.append("/>\n");
    }
  }

  private static boolean isClip(Element element) {
    return element.getTagName().equals("clipPath");
  }

  private static boolean paintsNothing(Map<String, String> attributes) {
    boolean filled = attributes.containsKey("fill") && !"0".equals(attributes.get("fill-opacity"));
    boolean drawn =
        attributes.containsKey("stroke")
            && !"0".equals(attributes.get("stroke-opacity"))
            && !"0".equals(attributes.get("stroke-width"));
    return !filled && !drawn;
  }

  private Map<String, String> attributes(Element element) {
    Map<String, String> found = new TreeMap<>();
    NamedNodeMap given = element.getAttributes();
    for (int i = 0; i < given.getLength(); i++) {
      String name = given.item(i).getNodeName();
      String value = given.item(i).getNodeValue();
      if (GEOMETRY.contains(name)) {
        found.put(name, shorter(value));
      } else if (name.equals("id")) {
        found.put(name, clip(value));
      } else if (!name.equals("style")) {
        found.put(name, value);
      }
    }
    styles(element).forEach((name, value) -> style(found, name, value));
    return found;
  }

  private void style(Map<String, String> found, String name, String value) {
    if (value.equals(INHERITED.get(name)) || name.equals("stroke-miterlimit")) {
      return;
    }
    switch (name) {
      case "font-family" -> {
        if (!plainFont(value).equals(font)) {
          found.put(name, plainFont(value) + ", sans-serif");
        }
      }
      case "fill", "stroke" -> found.put(name, colour(value));
      case "clip-path" -> {
        Matcher matcher = CLIP.matcher(value);
        found.put(name, matcher.matches() ? "url(#" + clip(matcher.group(1)) + ")" : value);
      }
      case "font-size" -> found.put(name, value.replace("px", ""));
      default -> found.put(name, shorter(value));
    }
  }

  private static Map<String, String> styles(Element element) {
    Map<String, String> found = new LinkedHashMap<>();
    for (String part : element.getAttribute("style").split(";", -1)) {
      int colon = part.indexOf(':');
      if (colon > 0) {
        found.put(part.substring(0, colon).strip(), part.substring(colon + 1).strip());
      }
    }
    return found;
  }

  private String clip(String id) {
    return clips.computeIfAbsent(id, unknown -> "clip" + (clips.size() + 1));
  }

  private static String colour(String value) {
    Matcher rgb = RGB.matcher(value);
    return rgb.matches()
        ? String.format(
            Locale.ROOT,
            "#%02x%02x%02x",
            Integer.parseInt(rgb.group(1)),
            Integer.parseInt(rgb.group(2)),
            Integer.parseInt(rgb.group(3)))
        : value;
  }

  private static String shorter(String value) {
    return LONG_NUMBER
        .matcher(value)
        .replaceAll(
            match -> {
              BigDecimal rounded =
                  new BigDecimal(match.group()).setScale(2, RoundingMode.HALF_EVEN);
              return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
            });
  }

  private static String escape(String text) {
    return text.replace("&", "&amp;")
        .replace("<", "&lt;")
        .replace(">", "&gt;")
        .replace("\"", "&quot;");
  }
}
