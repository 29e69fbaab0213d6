package org.kappatrail.intake;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.kappatrail.history.Sample;

/** A small history folder at Tarn Hollow with one asset, to put files into. */
record Folder(Path path) {
  static Folder in(Path path) throws IOException {
    Folder folder = new Folder(path);
    folder.put("assets.csv", "asset,oil\npress-1,TH-150\nfan-3,TH-68\n");
    folder.put(
        "bearings.csv",
        "asset,bearing,pitch_mm,speed_rpm\npress-1,DS,270,180\nfan-3,NDE,125,1480\n");
    folder.put(
        "oils.csv",
        "oil,viscosity_40c_cst,viscosity_100c_cst,viscosity_index\nTH-150,150,14.9,\nTH-68,68,,98\n");
    return folder;
  }

  Folder put(String name, String text) throws IOException {
    return put(name, text, StandardCharsets.UTF_8);
  }

  Folder put(String name, String text, Charset charset) throws IOException {
    Path file = path.resolve(name);
    Files.createDirectories(file.getParent());
    Files.write(file, text.getBytes(charset));
    return this;
  }

  Intake read() {
    return HistoryReader.read(path);
  }

  static Sample sample(Intake intake, String id) {
    return intake.history().samples().stream()
        .filter(sample -> sample.id().equals(id))
        .findFirst()
        .orElseThrow(() -> new AssertionError("no sample " + id + ": " + intake.problems()));
  }
}
