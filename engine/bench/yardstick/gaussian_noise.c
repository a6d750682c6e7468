/* The yardstick of noise: the passes of Nearlimit's Gaussian noise, operation for operation, as the C compiler vectorises
 * them. Prints the best ns a sample over a few stretches of processor time.
 * gcc -O3 -march=native -ffp-contract=off -fno-math-errno -o gaussian_noise gaussian_noise.c -lm */
#include <math.h>
#include <stdint.h>
#include <stdio.h>
#include <string.h>
#include <time.h>

enum { LANES = 64, STEPS = 16, COUNT = LANES * STEPS };

static uint64_t state[4][LANES];
static int high[COUNT], low[COUNT];
static float radius[COUNT], samples[2 * COUNT];

static double seconds(void) {
  struct timespec t;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}
static inline uint64_t rotated(uint64_t x, int by) { return x << by | x >> (64 - by); }
static inline float as_float(int bits) {
  float f;
  memcpy(&f, &bits, sizeof f);
  return f;
}
static inline int as_bits(float f) {
  int bits;
  memcpy(&bits, &f, sizeof bits);
  return bits;
}

__attribute__((noinline)) static void halves(void) {
  for (int s = 0; s < STEPS; s++) {
    int *h = high + s * LANES, *w = low + s * LANES;
    for (int l = 0; l < LANES; l++) {
      uint64_t s0 = state[0][l], s1 = state[1][l], s2 = state[2][l], s3 = state[3][l];
      uint64_t d = rotated(s0 + s3, 23) + s0;
      h[l] = (int)(d >> 32);
      w[l] = (int)d;
      s2 ^= s0;
      s3 ^= s1;
      state[1][l] = s1 ^ s2;
      state[0][l] = s0 ^ s3;
      state[2][l] = s2 ^ s1 << 17;
      state[3][l] = rotated(s3, 45);
    }
  }
}
__attribute__((noinline)) static int radii(void) {
  int tail = 0;
  for (int i = 0; i < COUNT; i++) {
    tail |= (int)((unsigned)high[i] >> 7) - 1;
    float w = (float)(int)((unsigned)high[i] >> 1) + 0.5f;
    int bits = as_bits(w), e = (bits - 0x3f3504f3) >> 23;
    float m = as_float(bits - (e << 23)) - 1.f;
    float p = m * 7.0376836292E-2f + -1.1514610310E-1f;
    p = p * m + 1.1676998740E-1f;
    p = p * m + -1.2420140846E-1f;
    p = p * m + 1.4249322787E-1f;
    p = p * m + -1.6668057665E-1f;
    p = p * m + 2.0000714765E-1f;
    p = p * m + -2.4999993993E-1f;
    p = p * m + 3.3333331174E-1f;
    float z = m * m;
    float x = (p * m * z - z * 0.5f + m + ((float)e - 31.f) * 0.69314718056f) * -2.f;
    radius[i] = sqrtf(x > 0.f ? x : 0.f);
  }
  return tail;
}
__attribute__((noinline)) static void rotate_pairs(void) {
  for (int s = 0; s < STEPS; s++)
    for (int l = 0; l < LANES; l++) {
      int b = low[s * LANES + l];
      float r = radius[s * LANES + l], t = (float)(int)((unsigned)b << 2) * (float)(3.14159265358979323846 / 4 / 2147483648.0);
      float t2 = t * t;
      float c = t2 * 2.443315711809948E-5f + -1.388731625493765E-3f;
      c = c * t2 + 4.166664568298827E-2f;
      c = r * (c * t2 * t2 - t2 * 0.5f + 1.f);
      float q = t2 * -1.9515295891E-4f + 8.3321608736E-3f;
      q = q * t2 + -1.6666654611E-1f;
      q = r * (q * t2 * t + t);
      int x = as_bits(c) ^ (b & (int)0x80000000u), y = as_bits(q);
      int exchange = (x ^ y) & ((int)((unsigned)b << 1) >> 31);
      samples[2 * s * LANES + l] = as_float(x ^ exchange);
      samples[(2 * s + 1) * LANES + l] = as_float(y ^ exchange);
    }
}

int main(void) {
  for (int w = 0; w < 4; w++)
    for (int l = 0; l < LANES; l++) state[w][l] = (uint64_t)(w * LANES + l + 1) * 0x9E3779B97F4A7C15ULL;
  double best = 1e9;
  int tails = 0;
  for (int stretch = 0; stretch < 8; stretch++) {
    const int count = 60000;
    double start = seconds();
    for (int k = 0; k < count; k++) {
      halves();
      tails += radii() < 0;
      rotate_pairs();
    }
    double ns = (seconds() - start) / count / (2 * COUNT) * 1e9;
    if (ns < best) best = ns;
  }
  printf("tails %d\nnoise [ns/sample] %.3f\n", tails, best);
}
