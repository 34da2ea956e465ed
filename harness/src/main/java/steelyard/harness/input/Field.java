package steelyard.harness.input;

/**
 * A field of a row.
 *
 * @param text its text, without quotes and without blanks around it
 * @param place where it stands
 */
record Field(String text, Place place) {}
