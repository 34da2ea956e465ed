/* A function in a shared library as a candidate: cc -O2 -shared -fPIC -o libtotal.so total-library.c */

double total(const double *terms, long count) {
  double sum = 0;
  for (long i = 0; i < count; i++) {
    sum += terms[i];
  }
  return sum;
}
