package steelyard.problems.solve;

import java.util.ArrayList;
import java.util.List;
import steelyard.problems.Family;

/** The families of linear systems. */
public final class SystemFamilies {
  private SystemFamilies() {}

  /** Returns all families, in the order in which they are listed to readers. */
  public static List<Family<LinearSystem>> all() {
    List<Family<LinearSystem>> families = new ArrayList<>();
    families.addAll(SpectrumFamilies.all());
    families.add(NearlyDependentFamily.create());
    families.add(BadlyScaledFamily.create());
    families.addAll(ClassicalFamilies.all());
    families.add(DepotFamily.create());
    return List.copyOf(families);
  }
}
