package org.kappatrail.duty;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;
import org.apache.spark.sql.SparkSession;
import org.apache.spark.sql.types.DataTypes;
import org.apache.spark.sql.types.StructField;
import org.apache.spark.sql.types.StructType;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Settings;

/** Runs the statement of day cells on an Apache Spark session, for fleets past one machine. */
public final class SparkDayCells {
  private static final String READINGS = "kappatrail_readings";
  private static final String NAMES = "kappatrail_names";

  private SparkDayCells() {}

  /**
   * The cells of a long-form dataset of readings: the columns of the statement, with the names of
   * asset and bearing in front. Bearing 0 stands for readings of bearings that the register does
   * not have.
   *
   * @param session a session; its time zone is set to UTC
   * @param readings columns as in {@code temperatures/}, typed: timestamps and numbers
   * @param mapping how its columns are called
   * @param bearings the register
   * @param settings zone, gap limit and running speed
   * @param asOf last local day that is used
   */
  public static Dataset<Row> of(
      SparkSession session,
      Dataset<Row> readings,
      ExportMapping mapping,
      List<Bearing> bearings,
      Settings settings,
      LocalDate asOf) {
    session.conf().set("spark.sql.session.timeZone", "UTC");
    List<Bearing> sorted = bearings.stream().sorted(Comparator.comparing(Bearing::key)).toList();
    Dataset<Row> names = names(session, sorted);
    readings.createOrReplaceTempView(READINGS);
    names.createOrReplaceTempView(NAMES);
    TableReadings table =
        new TableReadings(
            SqlEngine.SPARK, READINGS, columns(readings.schema()), mapping, NAMES + " AS names");
    ZoneShift zone = DayCellsStatement.shift(ZoneNames.of(mapping, settings), asOf);
    String statement = DayCellsStatement.over(table.sql(zone), sorted, settings, asOf);
    return names
        .withColumnRenamed("name", "bearing_name")
        .join(session.sql(statement), "bearing")
        .orderBy("bearing", "day_ms", "state", "temperature_cell", "speed_cell", "source");
  }

  private static List<TableReadings.Column> columns(StructType schema) {
    List<TableReadings.Column> columns = new ArrayList<>();
    for (StructField field : schema.fields()) {
      columns.add(
          new TableReadings.Column(
              field.name(), "`" + field.name().replace("`", "``") + "`", field.dataType().sql()));
    }
    return columns;
  }

  private static Dataset<Row> names(SparkSession session, List<Bearing> bearings) {
    List<Row> rows = new ArrayList<>();
    rows.add(RowFactory.create(0, "", ""));
    for (int index = 0; index < bearings.size(); index++) {
      Bearing bearing = bearings.get(index);
      rows.add(RowFactory.create(index + 1, bearing.asset(), bearing.id()));
    }
    StructType schema =
        new StructType()
            .add("bearing", DataTypes.IntegerType, false)
            .add("asset", DataTypes.StringType, false)
            .add("name", DataTypes.StringType, false);
    return session.createDataFrame(rows, schema);
  }
}
