/* The yardstick of the decoder kernel: layered min-sum of 64 frames in 8-bit lanes, 10 iterations, decoding alone, by hand
 * on 512-bit or 256-bit registers. The graph is a random one with the size and about the edges of a 1944-bit code of
 * rate 1/2 (block length Z = 81). Prints the best coded Mb/s of a core over a few stretches of processor time.
 * gcc -O3 -march=native -o layered_min_sum layered_min_sum.c */
#include <immintrin.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

enum { Z = 81, ROWS = 12, COLUMNS = 24, FRAMES = 64, ITERATIONS = 10, MOST_EDGES_OF_ROW = COLUMNS };

#ifdef __AVX512BW__
typedef __m512i lanes;
#define SET1(x) _mm512_set1_epi8(x)
#define ZERO() _mm512_setzero_si512()
#define SUB(a, b) _mm512_sub_epi8(a, b)
#define ADD(a, b) _mm512_add_epi8(a, b)
#define MIN(a, b) _mm512_min_epi8(a, b)
#define MAX(a, b) _mm512_max_epi8(a, b)
#define ABS(a) _mm512_abs_epi8(a)
#define XOR(a, b) _mm512_xor_si512(a, b)
#define AND(a, b) _mm512_and_si512(a, b)
#define DOWN16(a, n) _mm512_srli_epi16(a, n)
static inline lanes where_equal(lanes a, lanes b, lanes then, lanes other) {
  return _mm512_mask_blend_epi8(_mm512_cmpeq_epi8_mask(a, b), other, then);
}
static inline lanes negated_where_negative(lanes m, lanes sign) {
  return _mm512_mask_sub_epi8(m, _mm512_movepi8_mask(sign), ZERO(), m);
}
#else
typedef __m256i lanes;
#define SET1(x) _mm256_set1_epi8(x)
#define ZERO() _mm256_setzero_si256()
#define SUB(a, b) _mm256_sub_epi8(a, b)
#define ADD(a, b) _mm256_add_epi8(a, b)
#define MIN(a, b) _mm256_min_epi8(a, b)
#define MAX(a, b) _mm256_max_epi8(a, b)
#define ABS(a) _mm256_abs_epi8(a)
#define XOR(a, b) _mm256_xor_si256(a, b)
#define AND(a, b) _mm256_and_si256(a, b)
#define DOWN16(a, n) _mm256_srli_epi16(a, n)
static inline lanes where_equal(lanes a, lanes b, lanes then, lanes other) {
  return _mm256_blendv_epi8(other, then, _mm256_cmpeq_epi8(a, b));
}
static inline lanes negated_where_negative(lanes m, lanes sign) {
  return _mm256_sign_epi8(m, _mm256_or_si256(sign, _mm256_set1_epi8(1)));
}
#endif
enum { VECTORS = FRAMES / (int)sizeof(lanes) };

static uint64_t state = 88172645463325252ULL;
static uint64_t draw(void) {
  state ^= state << 13;
  state ^= state >> 7;
  return state ^= state << 17;
}
static double seconds(void) {
  struct timespec t;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}

static lanes posterior[COLUMNS * Z][VECTORS];
static lanes (*message)[VECTORS];
static int *column, first_edge[ROWS * Z + 1];

static void iterate(void) {
  const lanes limit = SET1(95), least_value = SET1(-95), largest = SET1(31), cleared = SET1(0x1f);
  for (int row = 0; row < ROWS * Z; row++) {
    const int from = first_edge[row], to = first_edge[row + 1];
    for (int v = 0; v < VECTORS; v++) {
      lanes least = SET1(127), second = least, sign = ZERO(), read[MOST_EDGES_OF_ROW];
      for (int e = from; e < to; e++) {
        lanes t = SUB(posterior[column[e]][v], message[e][v]);
        read[e - from] = t;
        sign = XOR(sign, t);
        lanes magnitude = ABS(t);
        second = MIN(second, MAX(least, magnitude));
        least = MIN(least, magnitude);
      }
      lanes others = MIN(SUB(least, AND(DOWN16(least, 2), cleared)), largest);
      lanes own = MIN(SUB(second, AND(DOWN16(second, 2), cleared)), largest);
      for (int e = from; e < to; e++) {
        lanes t = read[e - from];
        lanes m = negated_where_negative(where_equal(ABS(t), least, own, others), XOR(sign, t));
        message[e][v] = m;
        posterior[column[e]][v] = MAX(MIN(ADD(t, m), limit), least_value);
      }
    }
  }
}

int main(void) {
  int base[ROWS][COLUMNS], edges = 0;
  memset(base, -1, sizeof base);
  for (int j = 0; j < 12; j++) {
    int degree = j == 0 || j == 4 ? 11 : j < 8 ? 4 : 3;
    for (int d = 0; d < degree; d++) {
      int r;
      do r = draw() % ROWS; while (base[r][j] >= 0);
      base[r][j] = draw() % Z;
    }
  }
  for (int i = 0; i < ROWS - 1; i++) base[i][13 + i] = base[i + 1][13 + i] = 0;
  base[0][12] = base[ROWS - 1][12] = 1;
  base[6][12] = 0;
  for (int i = 0; i < ROWS; i++) for (int j = 0; j < COLUMNS; j++) edges += base[i][j] >= 0 ? Z : 0;
  column = malloc(edges * sizeof *column);
  message = aligned_alloc(64, (size_t)edges * FRAMES);
  memset(message, 0, (size_t)edges * FRAMES);
  int e = 0;
  for (int i = 0; i < ROWS; i++)
    for (int z = 0; z < Z; z++) {
      first_edge[i * Z + z] = e;
      for (int j = 0; j < COLUMNS; j++) if (base[i][j] >= 0) column[e++] = j * Z + (z + base[i][j]) % Z;
    }
  first_edge[ROWS * Z] = e;
  int8_t *values = (int8_t *)posterior;
  for (int i = 0; i < COLUMNS * Z * FRAMES; i++) values[i] = (int8_t)((int)(draw() % 40) - 8);
  double best = 0;
  for (int stretch = 0; stretch < 8; stretch++) {
    const int count = 4000;
    double start = seconds();
    for (int k = 0; k < count; k++) iterate();
    double rate = 64.0 * COLUMNS * Z * count / ITERATIONS / (seconds() - start) / 1e6;
    if (rate > best) best = rate;
  }
  int sum = 0;
  for (int i = 0; i < COLUMNS * Z * FRAMES; i++) sum += values[i];
  printf("yardstick %d-bit registers, %d edges, sum %d\ndecoder [Mb/s] %.3f\n", 8 * (int)sizeof(lanes), edges, sum, best);
}
