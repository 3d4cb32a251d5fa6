#include "iapws95.hpp"

#include <cmath>

namespace busbar::water::iapws95 {
namespace {

// Table 1: n and gamma; terms 1 to 3 have no gamma.
struct IdealTerm {
  double n;
  double gamma;
};
constexpr IdealTerm kIdeal[] = {
    {-8.3204464837497, 0}, {6.6832105275932, 0},  {3.00632, 0},          {0.012436, 1.28728967},
    {0.97315, 3.53734222}, {1.27950, 7.74073708}, {0.96956, 9.24437796}, {0.24873, 27.5075105},
};

// Table 2, terms 1 to 51: n delta^d tau^t exp(-delta^c), without the exponential where c is 0.
struct PowerTerm {
  double c;
  double d;
  double t;
  double n;
};
constexpr PowerTerm kPower[] = {
    {0, 1, -0.5, 0.12533547935523E-01}, {0, 1, 0.875, 0.78957634722828E+01},
    {0, 1, 1, -0.87803203303561E+01},   {0, 2, 0.5, 0.31802509345418},
    {0, 2, 0.75, -0.26145533859358},    {0, 3, 0.375, -0.78199751687981E-02},
    {0, 4, 1, 0.88089493102134E-02},    {1, 1, 4, -0.66856572307965},
    {1, 1, 6, 0.20433810950965},        {1, 1, 12, -0.66212605039687E-04},
    {1, 2, 1, -0.19232721156002},       {1, 2, 5, -0.25709043003438},
    {1, 3, 4, 0.16074868486251},        {1, 4, 2, -0.40092828925807E-01},
    {1, 4, 13, 0.39343422603254E-06},   {1, 5, 9, -0.75941377088144E-05},
    {1, 7, 3, 0.56250979351888E-03},    {1, 9, 4, -0.15608652257135E-04},
    {1, 10, 11, 0.11537996422951E-08},  {1, 11, 4, 0.36582165144204E-06},
    {1, 13, 13, -0.13251180074668E-11}, {1, 15, 1, -0.62639586912454E-09},
    {2, 1, 7, -0.10793600908932},       {2, 2, 1, 0.17611491008752E-01},
    {2, 2, 9, 0.22132295167546},        {2, 2, 10, -0.40247669763528},
    {2, 3, 10, 0.58083399985759},       {2, 4, 3, 0.49969146990806E-02},
    {2, 4, 7, -0.31358700712549E-01},   {2, 4, 10, -0.74315929710341},
    {2, 5, 10, 0.47807329915480},       {2, 6, 6, 0.20527940895948E-01},
    {2, 6, 10, -0.13636435110343},      {2, 7, 10, 0.14180634400617E-01},
    {2, 9, 1, 0.83326504880713E-02},    {2, 9, 2, -0.29052336009585E-01},
    {2, 9, 3, 0.38615085574206E-01},    {2, 9, 4, -0.20393486513704E-01},
    {2, 9, 8, -0.16554050063734E-02},   {2, 10, 6, 0.19955571979541E-02},
    {2, 10, 9, 0.15870308324157E-03},   {2, 12, 8, -0.16388568342530E-04},
    {3, 3, 16, 0.43613615723811E-01},   {3, 4, 22, 0.34994005463765E-01},
    {3, 4, 23, -0.76788197844621E-01},  {3, 5, 23, 0.22446277332006E-01},
    {4, 14, 10, -0.62689710414685E-04}, {6, 3, 50, -0.55711118565645E-09},
    {6, 6, 44, -0.19905718354408},      {6, 6, 46, 0.31777497330738},
    {6, 6, 50, -0.11841182425981},
};

// Table 2, terms 52 to 54: n delta^d tau^t exp(-alpha (delta - epsilon)^2 - beta (tau - gamma)^2).
struct GaussTerm {
  double d;
  double t;
  double n;
  double alpha;
  double beta;
  double gamma;
  double epsilon;
};
constexpr GaussTerm kGauss[] = {
    {3, 0, -0.31306260323435E+02, 20, 150, 1.21, 1},
    {3, 1, 0.31546140237781E+02, 20, 150, 1.21, 1},
    {3, 4, -0.25213154341695E+04, 20, 250, 1.25, 1},
};

// Table 2, terms 55 and 56: n Delta^b delta psi.
struct CriticalTerm {
  double a;
  double b;
  double big_b;
  double n;
  double big_c;
  double big_d;
  double big_a;
  double beta;
};
constexpr CriticalTerm kCritical[] = {
    {3.5, 0.85, 0.2, -0.14874640856724, 28, 700, 0.32, 0.3},
    {3.5, 0.95, 0.2, 0.31806110878444, 32, 800, 0.32, 0.3},
};

void add_power(Derivatives& sum, double delta, double tau) {
  for (const PowerTerm& k : kPower) {
    const double dc = k.c > 0 ? std::pow(delta, k.c) : 0;
    const double term = k.n * std::pow(delta, k.d) * std::pow(tau, k.t) * std::exp(-dc);
    const double slope = k.d - k.c * dc;
    sum.value += term;
    sum.d += term * slope / delta;
    sum.dd += term * (slope * (slope - 1) - k.c * k.c * dc) / (delta * delta);
    sum.t += term * k.t / tau;
    sum.tt += term * k.t * (k.t - 1) / (tau * tau);
    sum.dt += term * k.t * slope / (delta * tau);
  }
}

void add_gauss(Derivatives& sum, double delta, double tau) {
  for (const GaussTerm& k : kGauss) {
    const double x = delta - k.epsilon;
    const double y = tau - k.gamma;
    const double term = k.n * std::pow(delta, k.d) * std::pow(tau, k.t) *
                        std::exp(-k.alpha * x * x - k.beta * y * y);
    const double by_delta = k.d / delta - 2 * k.alpha * x;
    const double by_tau = k.t / tau - 2 * k.beta * y;
    sum.value += term;
    sum.d += term * by_delta;
    sum.dd += term * (by_delta * by_delta - k.d / (delta * delta) - 2 * k.alpha);
    sum.t += term * by_tau;
    sum.tt += term * (by_tau * by_tau - k.t / (tau * tau) - 2 * k.beta);
    sum.dt += term * by_delta * by_tau;
  }
}

// The derivatives of Delta^b and psi are those printed below table 5.
void add_critical(Derivatives& sum, double delta, double tau) {
  const double x = delta - 1;
  const double y = tau - 1;
  const double q = x * x;
  for (const CriticalTerm& k : kCritical) {
    const double e = 1 / (2 * k.beta);
    const double theta = (1 - tau) + k.big_a * std::pow(q, e);
    const double big_delta = theta * theta + k.big_b * std::pow(q, k.a);
    const double psi = std::exp(-k.big_c * q - k.big_d * y * y);
    const double slope = k.big_a * theta * 2 / k.beta * std::pow(q, e - 1) +
                         2 * k.big_b * k.a * std::pow(q, k.a - 1);
    const double by_delta = x * slope;
    const double by_delta_2 = slope + 4 * k.big_b * k.a * (k.a - 1) * std::pow(q, k.a - 1) +
                              2 * k.big_a * k.big_a / (k.beta * k.beta) * std::pow(q, 2 * e - 1) +
                              k.big_a * theta * 4 / k.beta * (e - 1) * std::pow(q, e - 1);
    const double power = std::pow(big_delta, k.b);
    const double power_1 = std::pow(big_delta, k.b - 1);
    const double power_2 = std::pow(big_delta, k.b - 2);
    const double power_d = k.b * power_1 * by_delta;
    const double power_dd =
        k.b * (power_1 * by_delta_2 + (k.b - 1) * power_2 * by_delta * by_delta);
    const double power_t = -2 * theta * k.b * power_1;
    const double power_tt = 2 * k.b * power_1 + 4 * theta * theta * k.b * (k.b - 1) * power_2;
    const double power_dt = -k.big_a * k.b * 2 / k.beta * power_1 * x * std::pow(q, e - 1) -
                            2 * theta * k.b * (k.b - 1) * power_2 * by_delta;
    const double psi_d = -2 * k.big_c * x * psi;
    const double psi_dd = (2 * k.big_c * q - 1) * 2 * k.big_c * psi;
    const double psi_t = -2 * k.big_d * y * psi;
    const double psi_tt = (2 * k.big_d * y * y - 1) * 2 * k.big_d * psi;
    const double psi_dt = 4 * k.big_c * k.big_d * x * y * psi;
    sum.value += k.n * power * delta * psi;
    sum.d += k.n * (power * (psi + delta * psi_d) + power_d * delta * psi);
    sum.dd += k.n * (power * (2 * psi_d + delta * psi_dd) + 2 * power_d * (psi + delta * psi_d) +
                     power_dd * delta * psi);
    sum.t += k.n * delta * (power_t * psi + power * psi_t);
    sum.tt += k.n * delta * (power_tt * psi + 2 * power_t * psi_t + power * psi_tt);
    sum.dt += k.n * (power * (psi_t + delta * psi_dt) + delta * power_d * psi_t +
                     power_t * (psi + delta * psi_d) + power_dt * delta * psi);
  }
}

}  // namespace

Derivatives ideal(double delta, double tau) {
  Derivatives sum;
  sum.value = std::log(delta) + kIdeal[0].n + kIdeal[1].n * tau + kIdeal[2].n * std::log(tau);
  sum.d = 1 / delta;
  sum.dd = -1 / (delta * delta);
  sum.t = kIdeal[1].n + kIdeal[2].n / tau;
  sum.tt = -kIdeal[2].n / (tau * tau);
  for (int i = 3; i < 8; ++i) {
    const double n = kIdeal[i].n;
    const double gamma = kIdeal[i].gamma;
    const double e = std::exp(-gamma * tau);
    sum.value += n * std::log1p(-e);
    sum.t += n * gamma * (1 / (1 - e) - 1);
    sum.tt -= n * gamma * gamma * e / ((1 - e) * (1 - e));
  }
  return sum;
}

Derivatives residual(double delta, double tau) {
  Derivatives sum;
  add_power(sum, delta, tau);
  add_gauss(sum, delta, tau);
  add_critical(sum, delta, tau);
  return sum;
}

Point at(double density, double temperature) {
  const double delta = density / kCriticalDensity;
  const double tau = kCriticalTemperature / temperature;
  const Derivatives o = ideal(delta, tau);
  const Derivatives r = residual(delta, tau);
  const double rt = kGasConstant * temperature;
  const double stiffness = 1 + 2 * delta * r.d + delta * delta * r.dd;
  const double thermal = 1 + delta * r.d - delta * tau * r.dt;
  const double cv = -tau * tau * (o.tt + r.tt);
  Point point;
  point.pressure = density * rt * (1 + delta * r.d);
  point.enthalpy = rt * (1 + tau * (o.t + r.t) + delta * r.d);
  point.entropy = kGasConstant * (tau * (o.t + r.t) - o.value - r.value);
  point.isochoric_heat_capacity = kGasConstant * cv;
  point.isobaric_heat_capacity = kGasConstant * (cv + thermal * thermal / stiffness);
  point.speed_of_sound = std::sqrt(rt * (stiffness + thermal * thermal / cv));
  point.pressure_by_density = rt * stiffness;
  point.gibbs_energy = rt * (1 + o.value + r.value + delta * r.d);
  return point;
}

double density(double pressure, double temperature, double start) {
  double rho = start;
  for (int k = 0; k < 60; ++k) {
    const Point point = at(rho, temperature);
    const double step = (pressure - point.pressure) / point.pressure_by_density;
    rho += step;
    if (std::abs(step) < 1e-13 * rho) return rho;
  }
  return std::nan("");
}

Saturation saturation(double temperature, double liquid_start, double vapour_start) {
  Saturation rho{liquid_start, vapour_start};
  for (int k = 0; k < 60; ++k) {
    const Point l = at(rho.liquid, temperature);
    const Point v = at(rho.vapour, temperature);
    const double pressures = l.pressure - v.pressure;
    const double energies = l.gibbs_energy - v.gibbs_energy;
    // dg = dp / rho at constant temperature.
    const double pl = l.pressure_by_density;
    const double pv = v.pressure_by_density;
    const double gl = pl / rho.liquid;
    const double gv = pv / rho.vapour;
    const double determinant = -pl * gv + pv * gl;
    const double step_l = (pressures * gv - energies * pv) / determinant;
    const double step_v = (pressures * gl - energies * pl) / determinant;
    rho.liquid += step_l;
    rho.vapour += step_v;
    if (std::abs(step_l) < 1e-11 * rho.liquid && std::abs(step_v) < 1e-11 * rho.vapour) return rho;
  }
  return {std::nan(""), std::nan("")};
}

}  // namespace busbar::water::iapws95
