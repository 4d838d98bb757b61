// The limit that the network pass is held against: the same work in plain C, on the same list.
// Reads count, links, then by link from, to, relation (int32) and lag (double), then durations (double);
// prints the median milliseconds of: both adjacency arrays, order, renumbering, both passes, floats.
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

static int n, m;
static int *from, *to, *relation;
static double *lag, *duration;

static int compare(const void *a, const void *b) {
  double x = *(const double *)a, y = *(const double *)b;
  return (x > y) - (x < y);
}

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_MONOTONIC, &t);
  return t.tv_sec * 1e3 + t.tv_nsec / 1e6;
}

static double pass(void) {
  int *ps = calloc(n + 1, sizeof(int)), *ss = calloc(n + 1, sizeof(int));
  int *pred = malloc(m * sizeof(int)), *link = malloc(m * sizeof(int)), *succ = malloc(m * sizeof(int));
  int *np = malloc(n * sizeof(int)), *ns = malloc(n * sizeof(int));
  for (int k = 0; k < m; k++) ps[to[k] + 1]++, ss[from[k] + 1]++;
  for (int i = 0; i < n; i++) ps[i + 1] += ps[i], ss[i + 1] += ss[i];
  memcpy(np, ps, n * sizeof(int)), memcpy(ns, ss, n * sizeof(int));
  for (int k = 0; k < m; k++) {
    int p = np[to[k]]++;
    pred[p] = from[k], link[p] = k;
    succ[ns[from[k]]++] = to[k];
  }
  int *order = malloc(n * sizeof(int)), *rank = malloc(n * sizeof(int)), *waiting = malloc(n * sizeof(int));
  int placed = 0;
  for (int i = 0; i < n; i++)
    if ((waiting[i] = ps[i + 1] - ps[i]) == 0) order[placed++] = i;
  for (int r = 0; r < placed; r++)
    for (int k = ss[order[r]]; k < ss[order[r] + 1]; k++)
      if (--waiting[succ[k]] == 0) order[placed++] = succ[k];
  double *d = malloc(n * sizeof(double)), *w = malloc(m * sizeof(double));
  int *start = malloc((n + 1) * sizeof(int)), *src = malloc(m * sizeof(int));
  for (int r = 0; r < n; r++) rank[order[r]] = r, d[r] = duration[order[r]];
  int next = 0;
  for (int r = 0; r < n; r++) {
    start[r] = next;
    for (int p = ps[order[r]]; p < ps[order[r] + 1]; p++) {
      int i = rank[pred[p]], type = relation[link[p]];
      double l = lag[link[p]];
      src[next] = i;
      w[next++] = (type == 0 || type == 2 ? d[i] : 0) + l - (type >= 2 ? d[r] : 0);
    }
  }
  start[n] = next;
  double *es = malloc(n * sizeof(double)), *ls = malloc(n * sizeof(double)), *ff = malloc(n * sizeof(double));
  double finish = 0;
  for (int r = 0; r < n; r++) {
    double e = 0;
    for (int p = start[r]; p < start[r + 1]; p++) {
      double b = es[src[p]] + w[p];
      if (b > e) e = b;
    }
    es[r] = e;
    if (e + d[r] > finish) finish = e + d[r];
  }
  for (int r = 0; r < n; r++) ls[r] = finish - d[r], ff[r] = finish - es[r] - d[r];
  for (int r = n - 1; r >= 0; r--)
    for (int p = start[r]; p < start[r + 1]; p++) {
      int i = src[p];
      double b = ls[r] - w[p], s = es[r] - es[i] - w[p];
      if (b < ls[i]) ls[i] = b;
      if (s < ff[i]) ff[i] = s;
    }
  double *out = malloc(7 * n * sizeof(double));
  for (int r = 0; r < n; r++) {
    double *o = out + 7 * order[r];
    o[0] = es[r], o[1] = es[r] + d[r], o[2] = ls[r], o[3] = ls[r] + d[r];
    o[4] = ls[r] - es[r], o[5] = ff[r], o[6] = ls[r] - es[r] <= 1e-6;
  }
  if (out[0] < 0) return -1;
  free(ps), free(ss), free(pred), free(link), free(succ), free(np), free(ns), free(order), free(rank);
  free(waiting), free(d), free(w), free(start), free(src), free(es), free(ls), free(ff), free(out);
  return finish;
}

int main(int argc, char **argv) {
  int rounds = argc > 1 ? atoi(argv[1]) : 9;
  if (fread(&n, 4, 1, stdin) != 1 || fread(&m, 4, 1, stdin) != 1) return 1;
  from = malloc(m * 4), to = malloc(m * 4), relation = malloc(m * 4);
  lag = malloc(m * 8), duration = malloc(n * 8);
  size_t read = fread(from, 4, m, stdin) + fread(to, 4, m, stdin) + fread(relation, 4, m, stdin);
  read += fread(lag, 8, m, stdin) + fread(duration, 8, n, stdin);
  if (read != (size_t)(4 * m + n)) return 1;
  double *times = malloc(rounds * sizeof(double)), finish = 0;
  for (int k = 0; k < rounds; k++) {
    double before = now();
    finish = pass();
    times[k] = now() - before;
  }
  qsort(times, rounds, sizeof(double), compare);
  printf("%.6f %.9g\n", times[rounds / 2], finish);
  return 0;
}
