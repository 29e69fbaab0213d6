package org.kappatrail.report.page;

import java.util.Collections;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;

/** Names for files and page anchors made from asset names: safe everywhere, short, and distinct. */
public final class FileNames {
  private static final int LONGEST = 60;

  private FileNames() {}

  /** File name by asset, the same for the same list of assets. */
  public static Map<String, String> of(List<String> assets) {
    Map<String, String> names = new LinkedHashMap<>();
    Set<String> taken = new HashSet<>();
    for (String asset : assets) {
      String plain = asset.replaceAll("[^A-Za-z0-9._-]+", "-").replaceAll("^[.-]+", "");
      if (plain.length() > LONGEST) {
        plain = plain.substring(0, LONGEST);
      }
      if (plain.isEmpty()) {
        plain = "asset";
      }
      String name = plain;
      for (int n = 2; !taken.add(name.toLowerCase(Locale.ROOT)); n++) {
        name = plain + "-" + n;
      }
      names.put(asset, name);
    }
    return Collections.unmodifiableMap(names);
  }
}
