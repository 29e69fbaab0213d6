package org.kappatrail.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tech.tablesaw.api.ColumnType;
import tech.tablesaw.api.Table;

class SampleTableTest {
  @TempDir Path temporary;

  @Test
  void columnsHaveStatedTypesAndMissingAndBoundsStayWhatTheyAre() throws IOException {
    Intake intake =
        Folder.in(temporary)
            .put(
                "samples/a.csv",
                """
                sample,asset,sampled_at,iron_ppm,viscosity_40c_cst,water_ppm
                007,press-1,2024-03-05,,148.5,<20
                008,press-1,2024-03-06T08:15,3,,120
                """)
            .read();
    Table table = SampleTable.of(intake.history());
    assertThat(table.columnNames())
        .containsExactly(
            "sample",
            "asset",
            "sampled_at",
            "laboratory",
            "iso_4406",
            "viscosity_40c_cst",
            "water_ppm",
            "iron_ppm",
            "iron_ppm_bound",
            "viscosity_40c_cst_bound",
            "water_ppm_bound");
    assertThat(table.column("sample").type()).isEqualTo(ColumnType.STRING);
    assertThat(table.column("sampled_at").type()).isEqualTo(ColumnType.LOCAL_DATE_TIME);
    assertThat(table.stringColumn("sample").get(0)).isEqualTo("007");
    assertThat(table.doubleColumn("iron_ppm").isMissing(0)).isTrue();
    assertThat(table.doubleColumn("iron_ppm").getDouble(1)).isEqualTo(3);
    assertThat(table.doubleColumn("viscosity_40c_cst").countMissing()).isEqualTo(1);
    assertThat(table.doubleColumn("water_ppm").getDouble(0)).isEqualTo(20);
    assertThat(table.stringColumn("water_ppm_bound").asList()).containsExactly("<", "");
  }

  @Test
  void noSamplesGiveATableWithoutRows() throws IOException {
    assertThat(SampleTable.of(Folder.in(temporary).read().history()).rowCount()).isZero();
  }
}
