package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.UnusableInputException;

/** The same readings, written as other programs write them, give the same cells. */
class LogMappingTest {
  private static final ZoneId SITE = ZoneId.of("Europe/London");
  private static final LocalDate AS_OF = LocalDate.of(2025, 11, 30);
  private static final List<Bearing> BEARINGS =
      List.of(Plant.bearing("Kiln Süd", "DE", 1480), Plant.bearing("Kiln Süd", "NDE", 1480));

  @TempDir Path folder;
  private List<RawReading> rows;
  private ReadLog canonical;

  @BeforeEach
  void readTheCanonicalForm() {
    rows =
        SeededLog.of(
                21, BEARINGS, SITE, LocalDateTime.of(2025, 10, 24, 0, 0), 4, SeededLog.Clock.UTC)
            .stream()
            .filter(
                row ->
                    row.temperature().matches("-?[\\d.]*")
                        && !row.temperature().matches(".*\\..*\\..*"))
            .filter(row -> row.speed().matches("-?[\\d.]*"))
            .toList();
    SeededLog.write(folder.resolve("temperatures/log.csv"), rows);
    canonical = ReadLog.of(folder, SITE, BEARINGS, AS_OF);
    assertThat(canonical.problems()).allMatch(problem -> problem.value().equals("so-so"));
    assertThat(canonical.only()).hasSizeGreaterThan(100);
  }

  @Test
  void readsDecimalCommasThousandsAndAForeignLayout() throws IOException {
    DateTimeFormatter format = DateTimeFormatter.ofPattern("dd.MM.yyyy HH:mm:ss", Locale.ROOT);
    String text =
        "Meßwerte der Überwachung\r\n\r\nZeit;Anlage;Stelle;Temperatur;Drehzahl;Güte\r\n"
            + ";;;°C;1/min;\r\n"
            + lines(
                row ->
                    String.join(
                        ";",
                        format.format(local(row)),
                        row.bearing().asset(),
                        row.bearing().bearing(),
                        row.temperature().replace('.', ','),
                        row.speed()
                            .replace('.', ',')
                            .replaceAll("^(-?\\d+)(\\d{3})(,|$)", "$1.$2$3"),
                        row.quality()))
            + "Ende der Werte;x;x\r\nSumme;1;2;3;4;5;6;7\r\n";
    Files.write(
        folder.resolve("temperatures/log.csv"), text.getBytes(Charset.forName("windows-1252")));
    Block block =
        Block.of("temperatures/*.csv")
            .column("Zeit", "time")
            .column("Anlage", "asset")
            .column("Stelle", "bearing")
            .column("Temperatur °C", "temperature_c")
            .column("Drehzahl 1/min", "speed_rpm")
            .column("Güte", "quality")
            .with("date-format", "dd.MM.yyyy HH:mm:ss")
            .with("thousands", ".")
            .with("encoding", "windows-1252")
            .with("footer", "Ende")
            .decimalComma()
            .header(2, 2);

    // Local times without an offset cannot tell the two hours of the night in October apart.
    ReadLog log = ReadLog.of(folder, SITE, BEARINGS, AS_OF, block.build());
    writeCanonical(row -> local(row).toString());

    assertThat(log.lines()).isEqualTo(ReadLog.of(folder, SITE, BEARINGS, AS_OF).lines());
    assertThat(log.accounts().get(0).rowsRead()).isEqualTo(rows.size());
    assertThat(log.problems())
        .allMatch(problem -> problem.source().line() > 4 && problem.value().equals("so-so"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "M/d/yyyy h:mm:ss a XXX",
        "dd-MMM-yyyy HH:mm:ss.SSSxx",
        "yyyyMMdd'T'HHmmssX",
        "EEE d MMM yy, H:mm:ss Z"
      })
  void readsOtherFormsOfTimes(String pattern) {
    DateTimeFormatter format = DateTimeFormatter.ofPattern(pattern, Locale.ENGLISH);
    write(row -> "\"" + format.format(instant(row)) + "\"");

    assertThat(read(Block.of("temperatures/*").with("date-format", pattern)).lines())
        .isEqualTo(canonical.lines());
  }

  @Test
  void readsCountsSince1970() {
    write(row -> Long.toString(instant(row).toEpochSecond()));
    assertThat(read(Block.of("temperatures/*").with("date-format", "epoch-seconds")).lines())
        .isEqualTo(canonical.lines());

    write(row -> Long.toString(instant(row).toInstant().toEpochMilli()));
    assertThat(read(Block.of("temperatures/*").with("date-format", "epoch-millis")).lines())
        .isEqualTo(canonical.lines());
  }

  @Test
  void takesLocalTimesInTheZoneOfTheBlock() {
    ZoneId other = ZoneId.of("Asia/Kolkata");
    write(row -> instant(row).atZoneSameInstant(other).toLocalDateTime().toString());

    assertThat(read(Block.of("temperatures/*").with("timezone", "Asia/Kolkata")).lines())
        .isEqualTo(canonical.lines());
  }

  @Test
  void convertsUnits() {
    BigDecimal nineFifths = new BigDecimal("1.8");
    writeWith(
        row -> number(row.temperature(), t -> t.multiply(nineFifths).add(new BigDecimal(32))),
        RawReading::speed);
    assertThat(read(Block.of("temperatures/*").unit("temperature_c", "fahrenheit")).lines())
        .isEqualTo(canonical.lines());

    writeWith(
        row -> number(row.temperature(), t -> t.add(new BigDecimal("273.15"))),
        row ->
            number(
                row.speed(),
                s -> s.divide(new BigDecimal(60), 12, java.math.RoundingMode.HALF_UP)));
    assertThat(
            read(Block.of("temperatures/*").unit("temperature_c", "kelvin").unit("speed_rpm", "hz"))
                .lines())
        .isEqualTo(canonical.lines());
  }

  @Test
  void readsTypedParquetColumns() throws SQLException {
    Path csv = folder.resolve("temperatures/log.csv");
    Path parquet = folder.resolve("temperatures/log.parquet");
    for (String columns :
        List.of(
            "time::TIMESTAMPTZ AS time, temperature_c::DOUBLE AS temperature_c, speed_rpm::FLOAT AS"
                + " speed_rpm",
            "timezone('UTC', time::TIMESTAMPTZ) AS time, temperature_c::DECIMAL(9, 3) AS"
                + " temperature_c, speed_rpm::DECIMAL(18, 4) AS speed_rpm",
            "epoch_ms(time::TIMESTAMPTZ) AS time, temperature_c::VARCHAR AS temperature_c,"
                + " speed_rpm::DOUBLE AS speed_rpm")) {
      SeededLog.write(csv, rows);
      try (Connection duck = DriverManager.getConnection("jdbc:duckdb:");
          Statement statement = duck.createStatement()) {
        statement.execute(
            "COPY (SELECT asset, bearing, quality, "
                + columns
                + " FROM read_csv('"
                + csv
                + "', all_varchar = true)) TO '"
                + parquet
                + "'");
        Files.delete(csv);
      } catch (IOException e) {
        throw new AssertionError(e);
      }
      Block block = Block.of("temperatures/*").with("timezone", "UTC");
      Block counted =
          columns.startsWith("epoch") ? block.with("date-format", "epoch-millis") : block;

      assertThat(read(counted).lines()).isEqualTo(canonical.lines());
    }
  }

  @Test
  void takesTheFirstBlockThatMatches() {
    Block first = Block.of("temperatures/l*.csv");
    Block second = Block.of("temperatures/*.csv").column("nowhere", "time");

    assertThat(ReadLog.of(folder, SITE, BEARINGS, AS_OF, first.build(), second.build()).lines())
        .isEqualTo(canonical.lines());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "unit=temperature_c: 'rankine' is not celsius, fahrenheit or kelvin",
        "date-format=yyyy-DD: 'DD' cannot be read in a log",
        "encoding=latin-99: encoding 'latin-99' is not known",
        "timezone=Europe/Londres: timezone 'Europe/Londres' is not known",
        "delimiter=ab: delimiter 'ab' must be one character"
      })
  void refusesSettingsThatItDoesNotKnow(String text) {
    String[] parts = text.split("[=:] ?", 3);
    Block block = Block.of("temperatures/*");
    Block changed =
        parts[0].equals("unit") ? block.unit(parts[1], "rankine") : block.with(parts[0], parts[1]);

    assertThatThrownBy(() -> read(changed))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageStartingWith("kappatrail.yaml: temperatures: ")
        .hasMessageContaining(parts[2]);
  }

  private ReadLog read(Block block) {
    return ReadLog.of(folder, SITE, BEARINGS, AS_OF, block.build());
  }

  private void write(Function<RawReading, String> time) {
    writeCanonical(time);
  }

  private void writeCanonical(Function<RawReading, String> time) {
    SeededLog.write(
        folder.resolve("temperatures/log.csv"),
        SeededLog.HEADER
            + "\n"
            + lines(row -> time.apply(row) + row.csv().substring(row.time().length())));
  }

  private void writeWith(
      Function<RawReading, String> temperature, Function<RawReading, String> speed) {
    SeededLog.write(
        folder.resolve("temperatures/log.csv"),
        rows.stream()
            .map(
                row ->
                    new RawReading(
                        row.time(),
                        row.bearing(),
                        temperature.apply(row),
                        speed.apply(row),
                        row.quality()))
            .toList());
  }

  private String lines(Function<RawReading, String> line) {
    return rows.stream().map(row -> line.apply(row) + "\n").collect(Collectors.joining());
  }

  private static String number(String text, Function<BigDecimal, BigDecimal> change) {
    return text.isEmpty() ? text : change.apply(new BigDecimal(text)).toPlainString();
  }

  private static OffsetDateTime instant(RawReading row) {
    return OffsetDateTime.parse(row.time());
  }

  private static LocalDateTime local(RawReading row) {
    return instant(row).atZoneSameInstant(SITE).toLocalDateTime();
  }
}
