// One block of states at pressure and temperature: sorted by region, each region's equation over
// its list, and the answers put back in order.
// Read inside the namespace of an instruction set, after batch/regions.hpp.

// A job says what is computed of each state:
//   kColumns              how many numbers
//   gibbs<Equation>(p, t, out)     by the equation of region 1, 2 or 5
//   helmholtz(rho, p, t, out)      by that of region 3
// The columns of a block are padded (kPadded): what lies behind the last state is computed too.
template <class Job, class Equation>
inline void run_gibbs(const double* pressure, const double* temperature, double* const* out,
                      std::size_t n) {
  for (std::size_t i = 0; i < n; i += kLanes) {
    Lanes answer[Job::kColumns];
    Job::template gibbs<Equation>(load(pressure + i), load(temperature + i), answer);
    for (std::size_t c = 0; c < Job::kColumns; ++c) store(answer[c], out[c] + i);
  }
}

template <class Job>
inline void run_helmholtz(const double* pressure, const double* temperature, double* const* out,
                          std::size_t n) {
  double density[kPadded];
  batch::density_3(pressure, temperature, density, n);
  fill_up(density, n);
  for (std::size_t i = 0; i < n; i += kLanes) {
    Lanes answer[Job::kColumns];
    Job::helmholtz(load(density + i), load(pressure + i), load(temperature + i), answer);
    for (std::size_t c = 0; c < Job::kColumns; ++c) store(answer[c], out[c] + i);
  }
}

template <class Job>
inline void run_region(std::size_t region, const double* pressure, const double* temperature,
                       double* const* out, std::size_t n) {
  switch (region) {
    case 1:
      return run_gibbs<Job, Region1Equation>(pressure, temperature, out, n);
    case 2:
      return run_gibbs<Job, Region2Equation>(pressure, temperature, out, n);
    case 3:
      return run_helmholtz<Job>(pressure, temperature, out, n);
    case 5:
      return run_gibbs<Job, Region5Equation>(pressure, temperature, out, n);
    default:
      for (std::size_t c = 0; c < Job::kColumns; ++c) {
        for (std::size_t i = 0; i < n; ++i) out[c][i] = kNotANumber;
      }
  }
}

// States of several regions: list by list.
template <class Job>
inline void run_sorted(const double* region, const double* pressure, const double* temperature,
                       double* const* out, std::size_t n) {
  Sorted<6> sorted;
  sorted.sort(region, n);
  double p[kPadded];
  double t[kPadded];
  Answers<Job> answers;
  for (std::size_t k = 0; k < 6; ++k) {
    if (sorted.count[k] == 0) continue;
    sorted.gather(k, pressure, p);
    sorted.gather(k, temperature, t);
    run_region<Job>(k, p, t, answers.at, sorted.count[k]);
    for (std::size_t c = 0; c < Job::kColumns; ++c) sorted.scatter(k, answers.column[c], out[c]);
  }
}

// `n` is a multiple of the lanes.
template <class Job>
inline void run_block(const double* pressure, const double* temperature, double* const* out,
                      std::size_t n) {
  double region[kPadded];
  Lanes least = region_at(load(pressure), load(temperature));
  Lanes greatest = least;
  store(least, region);
  for (std::size_t i = kLanes; i < n; i += kLanes) {
    const Lanes at = region_at(load(pressure + i), load(temperature + i));
    least = select(at < least, at, least);
    greatest = select(at > greatest, at, greatest);
    store(at, region + i);
  }
  if (all(least == all_lanes(region[0])) && all(greatest == all_lanes(region[0]))) {
    run_region<Job>(static_cast<std::size_t>(static_cast<int>(region[0])), pressure, temperature,
                    out, n);
  } else {
    run_sorted<Job>(region, pressure, temperature, out, n);
  }
}
