package org.kappatrail.intake;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.Event;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Oil;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;
import org.kappatrail.history.Settings;
import org.kappatrail.history.SourceLine;
import org.kappatrail.history.UnusableInputException;

/** Reads a history folder: settings, register, events and samples. Nothing in it is written to. */
public final class HistoryReader {
  private HistoryReader() {}

  /**
   * What a folder holds.
   *
   * @throws UnusableInputException where a file is missing or cannot be read at all, or the
   *     settings do not fit
   */
  public static Intake read(Path folder) {
    return read(folder, Optional.empty());
  }

  /**
   * What a folder holds.
   *
   * @param today day after which no sample can have been drawn; empty where the caller has no clock
   * @throws UnusableInputException where a file is missing or cannot be read at all, or the
   *     settings do not fit
   */
  public static Intake read(Path folder, Optional<LocalDate> today) {
    if (!Files.isDirectory(folder)) {
      throw new UnusableInputException(
          folder
              + ": is no folder; give the folder that holds assets.csv, bearings.csv and oils.csv");
    }
    List<Problem> problems = new ArrayList<>();
    List<FileAccount> accounts = new ArrayList<>();
    RegisterFolder register = new RegisterFolder(folder, problems, accounts);
    Settings settings = settings(register);
    OilReader oilReader = new OilReader(register);
    List<Oil> oils = oilReader.read();
    Set<String> oilIds = ids(oils.stream().map(Oil::id).toList());
    AssetReader assetReader = new AssetReader(register, oilIds, oilReader.left());
    List<Asset> assets = assetReader.read();
    Set<String> assetIds = ids(assets.stream().map(Asset::id).toList());
    Map<String, SourceLine> left = assetReader.left();
    List<Bearing> bearings = new BearingReader(register, assetIds, left).read();
    List<Event> events = List.of();
    if (register.has(EventReader.FILE)) {
      Set<BearingKey> keys = bearings.stream().map(Bearing::key).collect(Collectors.toSet());
      events =
          new EventReader(register, assetIds, left, oilIds, keys, DateText.iso(settings.zone()))
              .read();
    }
    SampleReader.Context context =
        new SampleReader.Context(settings.zone(), assetIds, left, today, problems);
    List<String> notes = new ArrayList<>();
    List<Sample> samples = samples(folder, settings, context, register, notes);
    PlantHistory history = new PlantHistory(oils, assets, bearings, samples, events);
    return new Intake(settings, history, problems, accounts, sorted(register.inputs()), notes);
  }

  private static Settings settings(RegisterFolder register) {
    if (register.has(SettingsReader.FILE)) {
      return SettingsReader.read(register.input(SettingsReader.FILE));
    }
    if (register.has("kappatrail.yml")) {
      throw new UnusableInputException(
          "kappatrail.yml: is not read under this name; rename it to " + SettingsReader.FILE);
    }
    return Settings.defaults();
  }

  private static List<Sample> samples(
      Path folder,
      Settings settings,
      SampleReader.Context context,
      RegisterFolder register,
      List<String> notes) {
    List<SampleFile> files = new ArrayList<>();
    SampleMerge merge = new SampleMerge(context.problems());
    SampleFolder found = new SampleFolder(folder, settings.sampleExports(), context.problems());
    for (SampleFolder.Found file : found.files()) {
      register.inputs().add(file.path());
      RawTable table =
          file.isWorkbook()
              ? WorkbookFile.read(file.path(), file.name(), file.mapping())
              : CsvFile.read(file.path(), file.name(), file.mapping());
      SampleFile read = new SampleReader(table, file.mapping(), context).read();
      read.samples().forEach(merge::add);
      notes.addAll(read.notes());
      files.add(read);
    }
    for (SampleFile file : files) {
      register.accounts().add(account(file, merge));
    }
    return merge.samples();
  }

  private static FileAccount account(SampleFile file, SampleMerge merge) {
    List<LocalDate> days = new ArrayList<>();
    Map<String, Long> rejected = new TreeMap<>(file.rejected());
    for (Sample sample : file.samples()) {
      merge
          .whyNot(sample)
          .ifPresentOrElse(
              reason -> rejected.merge(reason, 1L, Long::sum), () -> days.add(sample.day()));
    }
    days.sort(null);
    return new FileAccount(
        file.name(),
        FileAccount.Kind.SAMPLES,
        OptionalLong.empty(),
        days.size(),
        rejected,
        days.stream().findFirst(),
        days.isEmpty() ? Optional.empty() : Optional.of(days.get(days.size() - 1)),
        file.unused());
  }

  private static Set<String> ids(List<String> ids) {
    return new java.util.LinkedHashSet<>(ids);
  }

  private static List<Path> sorted(List<Path> inputs) {
    return inputs.stream().distinct().sorted().toList();
  }
}
