/* A program as a candidate for sums, in C99: cc -O2 -o total total.c
   It adds up from the first term to the last, in double. */
#include <stdio.h>

int main(void) {
  int version;
  char task[32];
  char name[32];
  long problem;
  long count;
  if (scanf(" steelyard %d %31s", &version, task) != 2 || version != 1) {
    fprintf(stderr, "this program speaks version 1\n");
    return 1;
  }
  printf("steelyard 1\n");
  fflush(stdout);
  while (scanf(" problem %ld vector %31s %ld", &problem, name, &count) == 3) {
    double sum = 0;
    for (long i = 0; i < count; i++) {
      double term;
      if (scanf("%la", &term) != 1) {
        fprintf(stderr, "term %ld is missing\n", i + 1);
        return 1;
      }
      sum += term;
    }
    if (scanf("%31s", name) != 1) { /* the word end */
      return 1;
    }
    printf("answer %ld 1\n%a\n", problem, sum);
    fflush(stdout);
  }
  return 0;
}
