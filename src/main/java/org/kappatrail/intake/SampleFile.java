package org.kappatrail.intake;

import java.util.List;
import org.kappatrail.history.Sample;

/**
 * What a file of samples gave, before samples of several files are put together.
 *
 * @param name path within the history folder
 * @param rows rows below the header
 * @param samples samples of the rows that are not left out, in the order of the file
 * @param unused columns that were not used
 * @param notes how something was read that could be read in another way
 */
record SampleFile(
    String name, long rows, List<Sample> samples, List<String> unused, List<String> notes) {
  SampleFile {
    samples = List.copyOf(samples);
    unused = List.copyOf(unused);
    notes = List.copyOf(notes);
  }
}
