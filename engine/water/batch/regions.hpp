// Sorting a block of states by region, so that each equation runs over full vectors.
// Read inside the namespace of an instruction set, after batch/kernels.hpp.

// States of one block; small enough for the nearest cache together with its lists.
inline constexpr std::size_t kBlock = 512;
inline constexpr std::size_t kPadded = kBlock + kLanes;

// Fills a column up to whole vectors with its last state.
inline void fill_up(double* column, std::size_t n) {
  for (std::size_t i = n; i < n + kLanes - 1; ++i) column[i] = column[n - 1];
}

// Which of `kLists` lists each state of a block goes to, and the places in each list.
template <std::size_t kLists>
struct Sorted {
  unsigned short place[kLists][kPadded];
  std::size_t count[kLists];

  // `list[i]` is the number of the list of state i.
  void sort(const double* list, std::size_t n) {
    for (std::size_t k = 0; k < kLists; ++k) count[k] = 0;
    for (std::size_t i = 0; i < n; ++i) {
      const auto k = static_cast<std::size_t>(static_cast<int>(list[i]));
      place[k][count[k]] = static_cast<unsigned short>(i);
      ++count[k];
    }
  }

  // The column in the order of a list, filled up.
  void gather(std::size_t k, const double* from, double* to) const {
    const std::size_t n = count[k];
    for (std::size_t i = 0; i < n; ++i) to[i] = from[place[k][i]];
    fill_up(to, n);
  }

  void scatter(std::size_t k, const double* from, double* to) const {
    const std::size_t n = count[k];
    for (std::size_t i = 0; i < n; ++i) to[place[k][i]] = from[i];
  }
};

inline constexpr double kRedo = 0;  // the list of states for the scalar function
inline constexpr double kNotANumber = __builtin_nan("");

// The region of states at pressure and temperature, 1, 2, 3 or 5, as at_pressure_temperature
// (water/state.cpp) chooses it; kRedo where it would fail, and in the last digits beside the
// saturation line.
HWY_INLINE Lanes region_at(Lanes pressure, Lanes temperature) {
  // Below this pressure logarithms would need more than normal numbers.
  constexpr double kLeastPressure = 1e-290;
  constexpr double kRounding = 1e-9;
  const Mask cold = temperature <= kTemperature13;
  const Lanes beside = rough_logarithm(pressure) - rough_saturation_logarithm(temperature);
  Mask liquid = (beside > kSurelyLiquid) | (pressure > kPressure13);
  Mask vapour = (beside < kSurelyVapour) & (pressure <= kPressure13);
  if (!all(liquid | vapour | !cold)) {
    const Lanes saturation = saturation_pressure_at(temperature);
    liquid = liquid | (pressure >= saturation);
    vapour = vapour | ((pressure < saturation * (1.0 - kRounding)) & (pressure <= kPressure13));
  }
  const Lanes of_cold = select(liquid, 1.0, select(vapour, 2.0, kRedo));
  const Mask dense = (pressure > kPressure13) & (temperature <= kHighestTemperature23) &
                     (pressure > boundary_23_pressure_at(temperature));
  const Mask hot = temperature > kHighestTemperature2;
  const Lanes of_warm = select(hot, 5.0, select(dense, 3.0, 2.0));
  const Mask inside = (pressure >= kLeastPressure) & (pressure <= kHighestPressure) &
                      (temperature >= kLowestTemperature) & (temperature <= kHighestTemperature5) &
                      ((temperature <= kHighestTemperature2) | (pressure <= kHighestPressure5));
  return select(inside, select(cold, of_cold, of_warm), kRedo);
}

// Columns for the answers of a job.
template <class Job>
struct Answers {
  double column[Job::kColumns][kPadded];
  double* at[Job::kColumns];
  Answers() {
    for (std::size_t c = 0; c < Job::kColumns; ++c) at[c] = column[c];
  }
};

// Two columns block by block. A job says how many columns it gives (kColumns) and fills them for a
// block of whole vectors: block(first, second, out, n).
template <class Job>
inline void run_blocks(const double* first, const double* second, double* const* out,
                       std::size_t count) {
  double* at[Job::kColumns];
  std::size_t done = 0;
  while (count - done >= kLanes) {
    std::size_t n = count - done < kBlock ? count - done : kBlock;
    n -= n % kLanes;
    for (std::size_t c = 0; c < Job::kColumns; ++c) at[c] = out[c] + done;
    Job::block(first + done, second + done, at, n);
    done += n;
  }
  if (done == count) return;
  // The last few, in columns of one vector.
  double a[kLanes];
  double b[kLanes];
  Answers<Job> answers;
  for (std::size_t i = 0; i < kLanes; ++i) {
    const std::size_t from = done + i < count ? done + i : count - 1;
    a[i] = first[from];
    b[i] = second[from];
  }
  Job::block(a, b, answers.at, kLanes);
  for (std::size_t c = 0; c < Job::kColumns; ++c) {
    for (std::size_t i = done; i < count; ++i) out[c][i] = answers.column[c][i - done];
  }
}
