package org.kappatrail.duty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping.Tag;
import org.kappatrail.history.UnusableInputException;

/** Logs in which a column names the machine, and columns or tags the bearing. */
class RowAssetTagsTest {
  private static final LocalDate AS_OF = LocalDate.of(2025, 6, 30);
  private static final List<Bearing> BEARINGS =
      List.of(
          Plant.bearing("Fan 1", "DE", 1480),
          Plant.bearing("Fan 1", "NDE", 1480),
          Plant.bearing("Fan 2", "DE", 1480),
          Plant.bearing("Fan 2", "NDE", 1480));
  private static final String LONG =
      """
      time,asset,bearing,temperature_c,speed_rpm
      2025-06-01T00:00:00,Fan 1,DE,60,1480
      2025-06-01T00:00:00,Fan 1,NDE,55,1480
      2025-06-01T00:00:00,Fan 2,DE,40,0
      2025-06-01T00:00:00,Fan 2,NDE,35,0
      2025-06-01T00:10:00,Fan 1,DE,61,1470
      2025-06-01T00:10:00,Fan 1,NDE,56,1470
      2025-06-01T00:10:00,Fan 2,DE,41,1450
      2025-06-01T00:10:00,Fan 2,NDE,36,1450
      """;

  @TempDir Path folder;

  @Test
  void aColumnPerTagTakesTheMachineFromTheRow() {
    ReadLog expected = read(LONG, Block.of("temperatures/*"));
    ReadLog log =
        read(
            """
            time,Unit,T drive,T free,n drive,n free
            2025-06-01T00:00:00,Fan 1,60,55,1480,1480
            2025-06-01T00:00:00,Fan 2,40,35,0,0
            2025-06-01T00:10:00,Fan 1,61,56,1470,1470
            2025-06-01T00:10:00,Fan 2,41,36,1450,1450
            """,
            wide());

    assertThat(log.lines()).isEqualTo(expected.lines()).hasSize(4);
    assertThat(log.problems()).isEmpty();
    assertThat(log.accounts().get(0).fileRows()).hasValue(4);
    assertThat(log.accounts().get(0).rowsRead()).isEqualTo(8);
    assertThat(log.accounts().get(0).rowsUsed()).isEqualTo(8);
  }

  @Test
  void aRowPerValueTakesTheMachineFromTheRow() {
    ReadLog expected = read(LONG, Block.of("temperatures/*"));
    StringBuilder text = new StringBuilder("time,Unit,Name,Reading\n");
    for (String row : LONG.lines().skip(1).toList()) {
      String[] cells = row.split(",", -1);
      String end = cells[2].equals("DE") ? " drive," : " free,";
      text.append(cells[0]).append(',').append(cells[1]).append(",T").append(end).append(cells[3]);
      text.append('\n');
      text.append(cells[0]).append(',').append(cells[1]).append(",n").append(end).append(cells[4]);
      text.append('\n');
    }
    ReadLog log = read(text.toString(), wide().column("Name", "tag").column("Reading", "value"));

    assertThat(log.lines()).isEqualTo(expected.lines());
    assertThat(log.problems()).isEmpty();
  }

  @Test
  void aMachineThatTheRegisterDoesNotHaveIsToldWithItsLine() {
    String rows =
        """
        time,Unit,T drive,T free,n drive,n free
        2025-06-01T00:00:00,Fan 1,60,55,1480,1480
        2025-06-01T00:00:00,Fan 3,40,35,0,0
        2025-06-01T00:10:00,Fan 3,41,36,0,0
        """;
    ReadLog log = read(rows, wide());
    assertThat(log.messages())
        .hasSize(2)
        .first()
        .asString()
        .startsWith(
            "temperatures/log.csv:3 bearing 'Fan 3/DE': 2 readings of a bearing that the register"
                + " does not have; the nearest name there is 'Fan 1/DE'");
    assertThat(log.accounts().get(0).rejected())
        .containsEntry(ReadingState.UNKNOWN_BEARING.label(), 4L);

    ReadLog tagged =
        read(
            """
            time,Unit,Name,Reading
            2025-06-01T00:00:00,Fan 3,T drive,60
            2025-06-01T00:00:00,Fan 1,P 1,60
            """,
            wide().column("Name", "tag").column("Reading", "value"));
    assertThat(tagged.messages())
        .hasSize(2)
        .anyMatch(message -> message.startsWith("temperatures/log.csv:2 bearing 'Fan 3/DE': 1 "))
        .anyMatch(
            message -> message.startsWith("temperatures/log.csv tag 'P 1': 1 values of 1 tag"));
  }

  @Test
  void tagsWithoutAMachineNeedAColumnOfMachines() {
    assertThatThrownBy(
            () ->
                read(
                    "time,T drive,T free,n drive,n free\n",
                    Block.of("temperatures/*").tag("T drive", tag("DE", Tag.Quantity.TEMPERATURE))))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("has no column asset, which the tags without asset: need");
    assertThatThrownBy(
            () ->
                read(
                    "time,Unit,T drive\n",
                    Block.of("temperatures/*")
                        .column("Unit", "asset")
                        .tag("T drive", tag("DR", Tag.Quantity.TEMPERATURE))))
        .isInstanceOf(UnusableInputException.class)
        .hasMessageContaining("the register has no bearing 'DR'; the nearest name is 'DE'");
  }

  private ReadLog read(String text, Block block) {
    SeededLog.write(folder.resolve("temperatures/log.csv"), text);
    return ReadLog.of(folder, ZoneOffset.UTC, BEARINGS, AS_OF, block.build());
  }

  private static Block wide() {
    return Block.of("temperatures/*")
        .column("Unit", "asset")
        .tag("T drive", tag("DE", Tag.Quantity.TEMPERATURE))
        .tag("n drive", tag("DE", Tag.Quantity.SPEED))
        .tag("T free", tag("NDE", Tag.Quantity.TEMPERATURE))
        .tag("n free", tag("NDE", Tag.Quantity.SPEED));
  }

  private static Tag tag(String bearing, Tag.Quantity quantity) {
    return new Tag(Optional.empty(), bearing, quantity);
  }
}
