/*
 * The solver's method in plain C, for the ratio that `npm run bench` prints: the same tabulated branch, the same bracket rule,
 * the same Newton search in a cell, with the C library's sin, cos, exp and acos. Standard input: the case as numbers (see
 * c-reference.ts). Standard output: milliseconds of the surface and the sum of its CP.
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define PI 3.14159265358979323846
#define MAX_ROWS 512
#define MAX_NODES 1024
#define EPSILON 1e-6

typedef struct {
    int rows, nodes;
    double alpha[MAX_ROWS], cl[MAX_ROWS], cd[MAX_ROWS];
    double na[MAX_NODES], ncl[MAX_NODES], ncd[MAX_NODES];
    double clb[MAX_NODES], cla[MAX_NODES], cdb[MAX_NODES], cda[MAX_NODES];
} Polar;

typedef struct {
    const Polar *polar;
    double sigma, pitch, tip, hub;
} Element;

typedef struct {
    double N, D, dN, dD, Dcn, F, dF, cn, ct, dcn, dct, s, c, from, to;
} Record;

typedef struct {
    int ready, count, falling, first;
    double phi[MAX_NODES], N[MAX_NODES], D[MAX_NODES], lambda[MAX_NODES], before[MAX_NODES], after[MAX_NODES];
} Branch;

static Branch ahead, behind, below, far_below;
static double found_phi, found_step;
static Record rec;

static double read_number(void) {
    double x;
    if (scanf("%lf", &x) != 1) {
        fputs("case cut short\n", stderr);
        exit(2);
    }
    return x;
}

static void prandtl(double f, double *F, double *dF) {
    if (f > 40) {
        *F = 1;
        *dF = 0;
        return;
    }
    double e = exp(-f);
    *F = 2 / PI * acos(e);
    *dF = 2 / PI * e / sqrt(1 - e * e);
}

static void balance(const Element *el, double s, double c, double cl, double cd, double dcl, double dcd, Record *o) {
    double side = s < 0 ? -1 : 1, mag = side * s, sigma = el->sigma, Ft, dFt, Fh, dFh;
    double ft = el->tip / mag, fh = el->hub / mag;
    prandtl(ft, &Ft, &dFt);
    prandtl(fh, &Fh, &dFh);
    double F = Ft * Fh;
    double dF = -c / s * (Fh * (dFt == 0 ? 0 : dFt * ft) + Ft * (dFh == 0 ? 0 : dFh * fh));
    double cn = cl * c + cd * s, ct = cl * s - cd * c;
    double dcn = dcl * c + dcd * s - ct, dct = dcl * s - dcd * c + cn;
    o->F = F;
    o->dF = dF;
    o->cn = cn;
    o->ct = ct;
    o->dcn = dcn;
    o->dct = dct;
    o->s = s;
    o->c = c;
    o->N = 4 * F * mag * c - sigma * ct;
    o->dN = 4 * (dF * mag * c + F * side * (c * c - s * s)) - sigma * dct;
    if (s > 0 && sigma * cn > 8.0 / 3 * F * s * s) {
        double q = 0.5 * sigma * cn - F * (4.0 / 3 - F) * s * s, root = sqrt(q);
        double h = s * (5.0 / 3 - F) + root, per = 0.25 * sigma / root;
        double dh = c * (5.0 / 3 - F) - s * dF + per * dcn -
                    (dF * (4.0 / 3 - 2 * F) * s * s + F * (4.0 / 3 - F) * 2 * s * c) / (2 * root);
        o->D = 4 * F * s * h;
        o->dD = 4 * (dF * s * h + F * c * h + F * s * dh);
        o->Dcn = 4 * F * s * per;
        return;
    }
    o->D = 4 * F * mag * s + sigma * cn;
    o->dD = 4 * (dF * mag * s + 2 * F * mag * c) + sigma * dcn;
    o->Dcn = sigma;
}

static void evaluate(const Element *el, double phi, Record *o) {
    const Polar *p = el->polar;
    double angle = phi - el->pitch, turn = fabs(angle) > PI ? 2 * PI * round(angle / (2 * PI)) : 0;
    double alpha = angle - turn;
    int low = 0, high = p->rows - 1;
    while (high - low > 1) {
        int middle = (low + high) >> 1;
        if (p->alpha[middle] <= alpha) low = middle;
        else high = middle;
    }
    double inverse = 1 / (p->alpha[low + 1] - p->alpha[low]), t = alpha - p->alpha[low];
    double dcl = (p->cl[low + 1] - p->cl[low]) * inverse, dcd = (p->cd[low + 1] - p->cd[low]) * inverse;
    o->from = p->alpha[low] + turn + el->pitch;
    o->to = p->alpha[low + 1] + turn + el->pitch;
    balance(el, sin(phi), cos(phi), p->cl[low] + t * dcl, p->cd[low] + t * dcd, dcl, dcd, o);
}

static void take(Branch *b, int i, double phi, const Record *o) {
    b->phi[i] = phi;
    b->N[i] = o->N;
    b->D[i] = o->D;
    b->lambda[i] = o->N / o->D;
    b->after[i] = b->before[i] = (o->dN - b->lambda[i] * o->dD) / o->D;
}

static void mark_falling(Branch *b) {
    int i = b->count - 1;
    b->falling = 0;
    if (!(b->D[i] > 0)) return;
    for (; i > 0 && b->D[i - 1] > 0; i -= 1)
        if (!(b->lambda[i - 1] > b->lambda[i] && b->after[i - 1] < 0 && b->before[i] < 0)) return;
    b->first = i;
    for (i -= 1; i >= 0; i -= 1)
        if (b->D[i] > 0) return;
    b->falling = 1;
}

static double slope_sign(const Element *el, double phi) {
    Record o;
    evaluate(el, phi, &o);
    return o.dN * o.D - o.N * o.dD;
}

static void insert_turns(const Element *el, Branch *b) {
    for (int i = 0; i < b->count - 1; i += 1) {
        if (!(b->D[i] > 0 && b->D[i + 1] > 0)) continue;
        int rises = b->after[i] > 0;
        if (rises == (b->before[i + 1] > 0)) continue;
        double low = b->phi[i], high = b->phi[i + 1];
        for (int step = 0; step < 24; step += 1) {
            double middle = 0.5 * (low + high);
            if ((slope_sign(el, middle) > 0) == rises) low = middle;
            else high = middle;
        }
        double *columns[] = {b->phi, b->N, b->D, b->lambda, b->before, b->after};
        for (int k = 0; k < 6; k += 1)
            for (int j = b->count; j > i + 1; j -= 1) columns[k][j] = columns[k][j - 1];
        Record o;
        evaluate(el, 0.5 * (low + high), &o);
        take(b, i + 1, 0.5 * (low + high), &o);
        b->count += 1;
        i += 1;
    }
}

static Branch *need(const Element *el, Branch *b, double low, double high) {
    if (b->ready) return b;
    const Polar *p = el->polar;
    Record o;
    double sp = sin(el->pitch), cp = cos(el->pitch), start = low - el->pitch;
    double turn = 2 * PI * floor((start - p->na[0]) / (2 * PI));
    int k = 0, count = 1;
    while (k < p->nodes && p->na[k] <= start - turn + 1e-9) k += 1;
    evaluate(el, low, &o);
    take(b, 0, low, &o);
    for (;; k += 1) {
        if (k == p->nodes) {
            k = 0;
            turn += 2 * PI;
        }
        double phi = p->na[k] + turn + el->pitch;
        if (phi > high - 1e-9) break;
        double sa = sin(p->na[k]), ca = cos(p->na[k]), s = sa * cp + ca * sp, c = ca * cp - sa * sp;
        balance(el, s, c, p->ncl[k], p->ncd[k], p->cla[k], p->cda[k], &o);
        take(b, count, phi, &o);
        double lift = p->clb[k] - p->cla[k], drag = p->cdb[k] - p->cda[k];
        double cn = lift * c + drag * s, ct = lift * s - drag * c;
        b->before[count] += (-el->sigma * ct - b->lambda[count] * o.Dcn * cn) / o.D;
        count += 1;
    }
    evaluate(el, high, &o);
    take(b, count, high, &o);
    b->count = count + 1;
    b->ready = 1;
    mark_falling(b);
    if (!b->falling) insert_turns(el, b);
    return b;
}

static double start_in(const Branch *b, int i, double lambda) {
    double x0 = b->phi[i], width = b->phi[i + 1] - x0;
    if (b->D[i] > 0 && b->D[i + 1] > 0) {
        double rise = b->lambda[i + 1] - b->lambda[i], m0 = rise / b->after[i], m1 = rise / b->before[i + 1];
        if (m0 > 0 && m1 > 0 && m0 < 4 * width && m1 < 4 * width) {
            double t = (lambda - b->lambda[i]) / rise;
            return x0 + t * (m0 + t * (3 * width - 2 * m0 - m1 + t * (m0 + m1 - 2 * width)));
        }
    }
    double g0 = lambda * b->D[i] - b->N[i], g1 = lambda * b->D[i + 1] - b->N[i + 1], share = g0 / (g0 - g1);
    return x0 + width * (share > 0 && share < 1 ? share : 0.5);
}

static int try_cell(const Element *el, const Branch *b, int cell, double lambda) {
    double low = b->phi[cell], high = b->phi[cell + 1], at_low = lambda * b->D[cell] - b->N[cell];
    double phi = start_in(b, cell, lambda);
    if (!(phi >= low && phi <= high)) phi = 0.5 * (low + high);
    for (int count = 0; count < 120; count += 1) {
        evaluate(el, phi, &rec);
        double g = lambda * rec.D - rec.N, step = -g / (lambda * rec.dD - rec.dN), next = phi + step;
        int small = fabs(step) * (fabs(rec.dD * rec.s) + fabs(rec.D)) <= 3e-6 * fabs(rec.D * rec.s);
        if ((small && next >= rec.from && next <= rec.to) || fabs(step) <= 4e-16 * (fabs(phi) + 1e-3)) {
            found_phi = next;
            found_step = step;
            return rec.D + step * rec.dD > 0;
        }
        if (g * at_low > 0) low = phi;
        else high = phi;
        if (high - low <= 4e-16 * fabs(phi) || g == 0) {
            found_phi = phi;
            found_step = 0;
            return rec.D > 0;
        }
        phi = next > low && next < high ? next : 0.5 * (low + high);
    }
    return 0;
}

static int chosen(const Element *el, Branch **branches, int n, double lambda) {
    const Branch *best = NULL;
    int best_cell = 0;
    double least = INFINITY;
    for (int k = 0; k < n; k += 1) {
        const Branch *b = branches[k];
        double before = lambda * b->D[0] - b->N[0];
        for (int cell = 0; cell < b->count - 1; cell += 1) {
            double after = lambda * b->D[cell + 1] - b->N[cell + 1];
            int crosses = before == 0 ? after != 0 : before * after < 0;
            before = after;
            if (!crosses || !try_cell(el, b, cell, lambda)) continue;
            double alpha = found_phi - el->pitch, size = fabs(alpha - 2 * PI * round(alpha / (2 * PI)));
            if (size >= least) continue;
            best = b;
            best_cell = cell;
            least = size;
        }
    }
    return best != NULL && try_cell(el, best, best_cell, lambda);
}

static int falling_cell(const Branch *b, double lambda) {
    int low = b->first, high = b->count - 1;
    if (lambda > b->lambda[low]) return low - 1;
    if (lambda < b->lambda[high]) return -1;
    while (high - low > 1) {
        int middle = (low + high) >> 1;
        if (b->lambda[middle] >= lambda) low = middle;
        else high = middle;
    }
    return low;
}

static int find_root(const Element *el, double lambda) {
    Branch *b = need(el, &ahead, EPSILON, PI / 2);
    int last = b->count - 1;
    if (lambda * b->D[last] - b->N[last] < 0) b = need(el, &behind, PI / 2, PI - EPSILON);
    else if (!(lambda * b->D[0] - b->N[0] < 0)) b = need(el, &below, -PI / 4, -EPSILON);
    if (b->falling) {
        int cell = falling_cell(b, lambda);
        if (cell >= 0 && try_cell(el, b, cell, lambda)) return 1;
    }
    if (chosen(el, &b, 1, lambda)) return 1;
    Branch *all[] = {need(el, &far_below, -PI / 2, -EPSILON), &ahead, need(el, &behind, PI / 2, PI - EPSILON)};
    return chosen(el, all, 3, lambda);
}

static double now_ms(void) {
    struct timespec t;
    clock_gettime(CLOCK_MONOTONIC, &t);
    return 1e3 * t.tv_sec + 1e-6 * t.tv_nsec;
}

int main(void) {
    int rounds = (int)read_number(), n_polars = (int)read_number();
    Polar *polars = calloc(n_polars, sizeof *polars);
    for (int k = 0; k < n_polars; k += 1) {
        Polar *p = &polars[k];
        p->rows = (int)read_number();
        for (int i = 0; i < p->rows; i += 1) {
            p->alpha[i] = read_number();
            p->cl[i] = read_number();
            p->cd[i] = read_number();
        }
        p->nodes = (int)read_number();
        for (int i = 0; i < p->nodes; i += 1) {
            p->na[i] = read_number();
            p->ncl[i] = read_number();
            p->ncd[i] = read_number();
            p->clb[i] = read_number();
            p->cla[i] = read_number();
            p->cdb[i] = read_number();
            p->cda[i] = read_number();
        }
    }
    int blades = (int)read_number(), n = (int)read_number();
    double radius = read_number();
    double *r = calloc(n, sizeof *r), *chord = calloc(n, sizeof *chord), *twist = calloc(n, sizeof *twist);
    double *width = calloc(n, sizeof *width), *tip = calloc(n, sizeof *tip), *hub = calloc(n, sizeof *hub);
    int *polar = calloc(n, sizeof *polar);
    for (int i = 0; i < n; i += 1) {
        r[i] = read_number();
        chord[i] = read_number();
        twist[i] = read_number();
        width[i] = read_number();
        tip[i] = read_number();
        hub[i] = read_number();
        polar[i] = (int)read_number();
    }
    int n_ratios = (int)read_number(), n_pitches = 0;
    double *ratios = calloc(n_ratios, sizeof *ratios), *torque = calloc(n_ratios, sizeof *torque);
    for (int i = 0; i < n_ratios; i += 1) ratios[i] = read_number();
    n_pitches = (int)read_number();
    double *pitches = calloc(n_pitches, sizeof *pitches);
    for (int i = 0; i < n_pitches; i += 1) pitches[i] = read_number();
    for (int round = 0; round < rounds; round += 1) {
        double start = now_ms(), sum = 0;
        for (int p = 0; p < n_pitches; p += 1) {
            for (int i = 0; i < n_ratios; i += 1) torque[i] = 0;
            for (int e = 0; e < n; e += 1) {
                Element el = {&polars[polar[e]], blades * chord[e] / (2 * PI * r[e]), twist[e] + pitches[p], tip[e], hub[e]};
                ahead.ready = behind.ready = below.ready = far_below.ready = 0;
                for (int i = 0; i < n_ratios; i += 1) {
                    if (!find_root(&el, ratios[i] * r[e] / radius)) {
                        torque[i] = NAN;
                        continue;
                    }
                    double growth = rec.dD / rec.D - rec.dF / rec.F - rec.c / rec.s;
                    double speed = 4 * rec.F * fabs(rec.s) / rec.D * (1 - found_step * growth);
                    double ct = rec.ct + found_step * rec.dct;
                    torque[i] += speed * speed * chord[e] * width[e] * ct * r[e] * blades;
                }
            }
            for (int i = 0; i < n_ratios; i += 1) sum += torque[i] * ratios[i] / (PI * radius * radius * radius);
        }
        printf("%.6f %.12e\n", now_ms() - start, sum);
    }
    return 0;
}
