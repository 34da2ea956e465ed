package steelyard.algorithms;

import java.util.List;

/** A catalogue of candidates as the table that the module's README shows. */
record CandidateTable(String task, List<? extends Candidate<?>> candidates) {

  static final String HEADER = "| candidate | what it does | cost | claimed bound | source |";

  String heading() {
    return "## " + task;
  }

  List<String> rows() {
    return candidates.stream().map(CandidateTable::row).toList();
  }

  private static String row(Candidate<?> candidate) {
    return "| `%s` | %s | %s | %s | %s |"
        .formatted(
            candidate.id(),
            cell(candidate.description()),
            cell(candidate.cost()),
            cell(candidate.bound().map(CandidateTable::claim).orElse("none")),
            cell(candidate.source()));
  }

  private static String claim(Bound bound) {
    String error =
        switch (bound.limits()) {
          case FORWARD_ERROR -> "forward error";
          case BACKWARD_ERROR -> "backward error";
          case COMPONENTWISE_BACKWARD_ERROR -> "componentwise backward error";
        };
    String traits = String.join(", ", bound.traits().stream().sorted().toList());
    String condition = traits.isEmpty() ? "" : ", for problems with " + traits;
    return error + " <= " + bound.text() + condition + " (" + bound.source() + ")";
  }

  private static String cell(String text) {
    return text.replace("|", "\\|");
  }
}
