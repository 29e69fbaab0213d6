package org.kappatrail.intake;

import java.util.List;
import java.util.Map;
import org.kappatrail.history.Sample;

/**
 * What a file of samples gave, before samples of several files are put together.
 *
 * @param name path within the history folder
 * @param rejected rows left out, by reason
 * @param samples samples of the rows that are not left out, in the order of the file
 * @param unused columns that were not used
 * @param notes how something was read that could be read in another way
 */
record SampleFile(
    String name,
    Map<String, Long> rejected,
    List<Sample> samples,
    List<String> unused,
    List<String> notes) {
  SampleFile {
    rejected = Map.copyOf(rejected);
    samples = List.copyOf(samples);
    unused = List.copyOf(unused);
    notes = List.copyOf(notes);
  }
}
