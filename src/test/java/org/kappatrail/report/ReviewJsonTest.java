package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ReviewJsonTest {
  @TempDir Path folder;

  @Tag("slow")
  @Test
  void theDemoSitesReviewFollowsTheSchemaBesideIt() throws IOException {
    assertFollowsItsSchema(FleetFiles.review(Path.of("sample-history"), folder));
  }

  @Test
  void hostileNamesStandInTheDocumentAsTheyAre() throws IOException {
    FleetFiles.write(folder.resolve("site"), FleetFiles.HOSTILE, FleetFiles.HOSTILE);
    Path pack = FleetFiles.review(folder.resolve("site"), folder.resolve("out"));
    assertFollowsItsSchema(pack);
    List<String> names = new ArrayList<>();
    read(pack).get("assets").forEach(asset -> names.add(asset.get("name").asText()));
    assertThat(names).isEqualTo(FleetFiles.HOSTILE);
  }

  @Test
  void theSchemaRefusesWhatItDoesNotKnow() throws IOException {
    FleetFiles.write(folder.resolve("site"), List.of("Stock pump"));
    Path pack = FleetFiles.review(folder.resolve("site"), folder.resolve("out"));
    String document = Files.readString(pack.resolve("review.json"));
    Schema schema = schema(pack);
    String renamed = document.replace("\"governing_bearing\"", "\"worst_bearing\"");
    String otherLevel = document.replace("\"level\": \"clear\"", "\"level\": \"green\"");
    String textForNumber = document.replace("\"kappa\": 1", "\"kappa\": \"1\", \"x\": 1");
    for (String changed : List.of(renamed, otherLevel, textForNumber)) {
      assertThat(changed).isNotEqualTo(document);
      assertThat(schema.validate(changed, InputFormat.JSON)).isNotEmpty();
    }
  }

  @Test
  void censoredValuesKeepTheirSignAndTheUnknownIsNull() throws IOException {
    FleetFiles.write(folder.resolve("site"), List.of("Stock pump"));
    Path pack = FleetFiles.review(folder.resolve("site"), folder.resolve("out"));
    JsonNode asset = read(pack).get("assets").get(0);
    assertThat(asset.get("samples").get(0).get("values").get("water_ppm").asText())
        .isEqualTo("<20");
    assertThat(asset.get("bearings").get(0).get("trail").get(0).get("running_hours").isNull())
        .isTrue();
  }

  private static void assertFollowsItsSchema(Path pack) throws IOException {
    String document = Files.readString(pack.resolve("review.json"));
    assertThat(schema(pack).validate(document, InputFormat.JSON)).isEmpty();
  }

  private static Schema schema(Path pack) throws IOException {
    String name = read(pack).get("$schema").asText();
    return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
        .getSchema(Files.readString(pack.resolve(name)), InputFormat.JSON);
  }

  private static JsonNode read(Path pack) throws IOException {
    return new ObjectMapper().readTree(pack.resolve("review.json").toFile());
  }
}
