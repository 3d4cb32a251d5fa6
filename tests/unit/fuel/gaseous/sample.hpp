// The gases of ISO 6976:2016, annex D.
#pragma once

#include <array>
#include <vector>

#include "fuel/gaseous/mixture.hpp"

namespace busbar::sample {

struct AnalysedPart {
  const char* name;
  double fraction;
  double uncertainty;
};

/// Annex D, example 1.
inline const std::vector<AnalysedPart> kExample1{{"methane", 0.933212, 0.000346},
                                                 {"ethane", 0.025656, 0.000243},
                                                 {"propane", 0.015368, 0.000148},
                                                 {"nitrogen", 0.010350, 0.000195},
                                                 {"carbon dioxide", 0.015414, 0.000111}};

/// Annex D, example 2: with water, 60 °F.
inline const std::vector<AnalysedPart> kExample2{{"methane", 0.931819, 0.000350},
                                                 {"ethane", 0.025618, 0.000243},
                                                 {"nitrogen", 0.010335, 0.000195},
                                                 {"carbon dioxide", 0.015391, 0.000111},
                                                 {"water", 0.016837, 0.000162}};

/// Annex D, example 3: with a correlation matrix.
inline const std::vector<AnalysedPart> kExample3{
    {"methane", 0.922393, 0.000348},         {"ethane", 0.025358, 0.000247},
    {"propane", 0.015190, 0.000149},         {"n-butane", 0.000523, 0.000018},
    {"2-methylpropane", 0.001512, 0.000027}, {"n-pentane", 0.002846, 0.000007},
    {"2-methylbutane", 0.002832, 0.000009},  {"2,2-dimethylpropane", 0.001015, 0.000004},
    {"n-hexane", 0.002865, 0.000008},        {"nitrogen", 0.010230, 0.000195},
    {"carbon dioxide", 0.015236, 0.000112}};

inline Composition composition(const std::vector<AnalysedPart>& parts) {
  Composition analysis;
  for (const AnalysedPart& part : parts) analysis.parts.push_back({part.name, part.fraction});
  return analysis;
}

inline fuel::gaseous::Mixture mixture(const std::vector<AnalysedPart>& parts) {
  return *fuel::gaseous::mixture_of(composition(parts));
}

inline std::vector<double> uncertainties(const std::vector<AnalysedPart>& parts) {
  std::vector<double> out;
  out.reserve(parts.size());
  for (const AnalysedPart& part : parts) out.push_back(part.uncertainty);
  return out;
}

/// Annex D, example 3: correlation coefficients in the order of the components above.
inline constexpr std::array<double, 121> kExample3Correlation{
    1.0,       -0.657246, -0.377458, -0.041205, -0.056924, 0.099228,  0.061961,  0.064295,
    0.080202,  -0.512347, -0.265664, -0.657246, 1.0,       -0.035617, -0.00745,  -0.01372,
    -0.08569,  -0.063295, -0.054908, -0.074061, -0.030668, -0.038371, -0.377458, -0.035617,
    1.0,       -0.004442, -0.00781,  -0.039877, -0.029677, -0.025538, -0.034574, -0.024994,
    -0.023925, -0.041205, -0.00745,  -0.004442, 1.0,       -0.000824, -0.000592, -0.000551,
    -0.000372, -0.000567, -0.005703, -0.003373, -0.056924, -0.01372,  -0.00781,  -0.000824,
    1.0,       0.002803,  0.001827,  0.001811,  0.002303,  -0.01074,  -0.005392, 0.099228,
    -0.08569,  -0.039877, -0.000592, 0.002803,  1.0,       0.079557,  0.07118,   0.09467,
    -0.072794, -0.014019, 0.061961,  -0.063295, -0.029677, -0.000551, 0.001827,  0.079557,
    1.0,       0.051085,  0.067927,  -0.053627, -0.010845, 0.064295,  -0.054908, -0.025538,
    -0.000372, 0.001811,  0.07118,   0.051085,  1.0,       0.060788,  -0.046653, -0.008952,
    0.080202,  -0.074061, -0.034574, -0.000567, 0.002303,  0.09467,   0.067927,  0.060788,
    1.0,       -0.062845, -0.012357, -0.512347, -0.030668, -0.024994, -0.005703, -0.01074,
    -0.072794, -0.053627, -0.046653, -0.062845, 1.0,       -0.028699, -0.265664, -0.038371,
    -0.023925, -0.003373, -0.005392, -0.014019, -0.010845, -0.008952, -0.012357, -0.028699,
    1.0,
};

}  // namespace busbar::sample
