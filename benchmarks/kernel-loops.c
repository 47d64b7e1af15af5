/*
 * The kernel's loops in C, for comparison: the same data, the same arithmetic, the same checksums.
 * cc -O3 -march=native -o kernel-loops kernel-loops.c; kernel-loops LOOP ROUNDS prints seconds and checksum.
 */
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

enum { WIDTH = 20000, LENGTH = 4000, ROWS = 64, LEADS = 512, VARIABLES = 48, TERMS = 2000, MULTIPLES = 64, SLOTS = 1 << 20 };
static uint64_t prime = 2147483647;

static uint32_t state = 0x2545f491;
static uint32_t random_word(void) {
  state ^= state << 13;
  state ^= state >> 17;
  state ^= state << 5;
  return state;
}

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_MONOTONIC, &t);
  return t.tv_sec + t.tv_nsec * 1e-9;
}

static uint32_t columns[ROWS][LENGTH], residues[ROWS][LENGTH];

static void fill_rows(void) {
  for (int r = 0; r < ROWS; r++) {
    uint32_t column = 0;
    for (int k = 0; k < LENGTH; k++) {
      column += 1 + random_word() % (2 * WIDTH / LENGTH - 1);
      columns[r][k] = column % WIDTH;
      residues[r][k] = random_word() % prime;
    }
  }
}

/* accumulator[columns] -= multiplier * residues */
static uint64_t sparse(int rounds) {
  static int64_t accumulator[WIDTH];
  const int64_t square = prime * prime;
  for (int round = 0; round < rounds; round++) {
    for (int r = 0; r < ROWS; r++) {
      const uint64_t multiplier = 1 + (uint64_t)(round * ROWS + r) * 12345 % (prime - 1);
      for (int k = 0; k < LENGTH; k++) {
        int64_t x = accumulator[columns[r][k]] - (int64_t)(multiplier * residues[r][k]);
        accumulator[columns[r][k]] = x + ((x >> 63) & square);
      }
    }
  }
  uint64_t sum = 0;
  for (int c = 0; c < WIDTH; c++) sum += accumulator[c] % prime;
  return sum;
}

/* four accumulators side by side, the same pivots for all */
static uint64_t lanes(int rounds) {
  static int64_t accumulator[WIDTH][4];
  const int64_t square = prime * prime;
  for (int round = 0; round < rounds; round++) {
    for (int r = 0; r < ROWS; r++) {
      uint64_t multipliers[4];
      for (int lane = 0; lane < 4; lane++) {
        multipliers[lane] = 1 + (uint64_t)((round * ROWS + r) * 4 + lane) * 12345 % (prime - 1);
      }
      for (int k = 0; k < LENGTH; k++) {
        int64_t *target = accumulator[columns[r][k]];
        for (int lane = 0; lane < 4; lane++) {
          int64_t x = target[lane] - (int64_t)(multipliers[lane] * residues[r][k]);
          target[lane] = x + ((x >> 63) & square);
        }
      }
    }
  }
  uint64_t sum = 0;
  for (int c = 0; c < WIDTH; c++)
    for (int lane = 0; lane < 4; lane++) sum += accumulator[c][lane] % prime;
  return sum;
}

static uint8_t terms[TERMS][VARIABLES], multipliers_of[MULTIPLES][VARIABLES];
static uint8_t found[TERMS * MULTIPLES + 1][VARIABLES];
static uint32_t weights[VARIABLES], found_hashes[TERMS * MULTIPLES + 1], slots[SLOTS];

static uint32_t hash_of(const uint8_t *m) {
  uint32_t hash = 0;
  for (int v = 0; v < VARIABLES; v++) hash += m[v] * weights[v];
  return hash;
}

static void fill_monomial(uint8_t *m, int degree) {
  memset(m, 0, VARIABLES);
  for (int k = 0; k < degree; k++) m[random_word() % VARIABLES]++;
}

/* products looked up in a table of monomials */
static uint64_t products(int rounds) {
  uint32_t count = 0;
  for (int v = 0; v < VARIABLES; v++) weights[v] = random_word() | 1;
  for (int t = 0; t < TERMS; t++) fill_monomial(terms[t], 5);
  for (int m = 0; m < MULTIPLES; m++) fill_monomial(multipliers_of[m], 1);
  uint64_t sum = 0;
  for (int round = 0; round < rounds; round++) {
    memset(slots, 0, sizeof slots);
    count = 0;
    for (int m = 0; m < MULTIPLES; m++) {
      const uint32_t base = hash_of(multipliers_of[m]);
      for (int t = 0; t < TERMS; t++) {
        uint8_t *candidate = found[count];
        for (int v = 0; v < VARIABLES; v++) candidate[v] = terms[t][v] + multipliers_of[m][v];
        const uint32_t hash = base + hash_of(terms[t]);
        uint32_t mixed = (hash ^ (hash >> 16)) * 0x7feb352du;
        uint32_t slot = (mixed ^ (mixed >> 15)) & (SLOTS - 1);
        while (slots[slot] != 0) {
          const uint32_t old = slots[slot] - 1;
          if (found_hashes[old] == hash && memcmp(found[old], candidate, VARIABLES) == 0) break;
          slot = (slot + 1) & (SLOTS - 1);
        }
        if (slots[slot] == 0) {
          found_hashes[count] = hash;
          slots[slot] = ++count;
        }
        sum += slots[slot];
      }
    }
  }
  return sum;
}

/* is a monomial divisible by one of many leading monomials? support masks first */
static uint64_t divisors(int rounds) {
  static uint8_t leads[LEADS][VARIABLES];
  static uint32_t masks[LEADS];
  for (int k = 0; k < LEADS; k++) {
    fill_monomial(leads[k], 4);
    for (int v = 0; v < VARIABLES; v++) masks[k] |= (leads[k][v] != 0) ? 1u << (v & 31) : 0;
  }
  for (int t = 0; t < TERMS; t++) fill_monomial(terms[t], 8);
  uint64_t sum = 0;
  for (int round = 0; round < rounds; round++) {
    for (int t = 0; t < TERMS; t++) {
      uint32_t mask = 0;
      for (int v = 0; v < VARIABLES; v++) mask |= (terms[t][v] != 0) ? 1u << (v & 31) : 0;
      int k = 0;
      for (; k < LEADS; k++) {
        if ((masks[k] & ~mask) != 0) continue;
        int v = 0;
        while (v < VARIABLES && leads[k][v] <= terms[t][v]) v++;
        if (v == VARIABLES) break;
      }
      sum += k;
    }
  }
  return sum;
}

int main(int argc, char **argv) {
  if (argc != 3) return 2;
  const int rounds = atoi(argv[2]);
  if (strcmp(argv[1], "sparse26") == 0) prime = 67108859;
  if (argv[1][0] == 's' || argv[1][0] == 'l') fill_rows();
  const double start = now();
  uint64_t sum;
  if (argv[1][0] == 's') sum = sparse(rounds);
  else if (strcmp(argv[1], "lanes") == 0) sum = lanes(rounds);
  else if (strcmp(argv[1], "products") == 0) sum = products(rounds);
  else if (strcmp(argv[1], "divisors") == 0) sum = divisors(rounds);
  else return 2;
  printf("%.9f %llu\n", now() - start, (unsigned long long)sum);
  return 0;
}
