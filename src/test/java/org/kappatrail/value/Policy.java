package org.kappatrail.value;

/** Someone who decides month by month what is done about a machine. */
interface Policy {

  /**
   * What is done on a day.
   *
   * @param machine the machine; only {@link PerfectKnowledge} may look at its truth
   * @param state what is in it and since when
   * @param samples what the laboratory has measured so far
   */
  Deed decide(Machine machine, State state, Samples samples);

  /** What may be done. */
  enum Kind {
    NOTHING,
    CHANGE,
    COOL
  }

  /**
   * What is done.
   *
   * @param kind its kind
   * @param oil oil that goes in; empty where none does
   */
  record Deed(Kind kind, String oil) {
    static final Deed NOTHING = new Deed(Kind.NOTHING, "");
    static final Deed COOL = new Deed(Kind.COOL, "");

    static Deed change(String oil) {
      return new Deed(Kind.CHANGE, oil);
    }
  }

  /**
   * What is in a machine and since when.
   *
   * @param day today
   * @param oil oil of the present charge
   * @param filledOn day it was filled; before 0 for the first charge
   * @param cooledOn day the cooler was put right last; −1 for never
   * @param used fraction of L10mh truly used up
   */
  record State(int day, String oil, int filledOn, int cooledOn, double used) {}
}
