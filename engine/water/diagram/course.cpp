#include "water/diagram/course.hpp"

#include <algorithm>
#include <cmath>
#include <queue>

#include "water/failure.hpp"

namespace busbar::water::diagram {

namespace {

// A part of the line that is drawn as one straight piece so far, and its middle.
struct Piece {
  const Stretch* stretch = nullptr;
  double from = 0;
  double to = 0;
  State first;
  State middle;
  State last;
  double miss = 0;
};

// A long straight piece gets a point at last where nothing bends more: this share of its length
// counts as missed.
constexpr double kLength = 1e-4;

class Drawing {
 public:
  Drawing(const Course& course, Axes axes, std::size_t count)
      : course_(course), axes_(axes), count_(count) {}

  Outcome<Points> draw() {
    if (const Failure failure = begin(); failure.fault != Fault::none) return failure;
    measure_extent();
    for (const Piece& piece : begun_) push(piece);
    while (points_ < count_) {
      if (const Failure failure = halve_worst(); failure.fault != Fault::none) return failure;
    }
    return collected();
  }

 private:
  // The ends of the stretches, and a third of the points spread evenly over those that bend, so
  // that no bend is overlooked.
  Failure begin() {
    points_ = course_.size() + 1;
    const auto bending = static_cast<std::size_t>(std::count_if(
        course_.begin(), course_.end(), [](const Stretch& stretch) { return !stretch.straight; }));
    const std::size_t each = bending == 0 ? 0 : (count_ - points_) / 3 / bending;
    for (const Stretch& stretch : course_) {
      const std::size_t pieces = stretch.straight ? 1 : 1 + each;
      State first = stretch.first;
      double from = stretch.from;
      for (std::size_t i = 1; i <= pieces; ++i) {
        double to = stretch.to;
        State last = stretch.last;
        if (i < pieces) {
          const double share = static_cast<double>(i) / static_cast<double>(pieces);
          to = stretch.from + share * (stretch.to - stretch.from);
          const Outcome<State> state = stretch.at(to);
          if (!state) return state.failure();
          last = *state;
          ++points_;
        }
        Piece piece{&stretch, from, to, first, {}, last};
        if (const Failure failure = find_middle(piece); failure.fault != Fault::none) {
          return failure;
        }
        begun_.push_back(piece);
        first = last;
        from = to;
      }
    }
    return {};
  }

  static Failure find_middle(Piece& piece) {
    const Outcome<State> state = piece.stretch->at(piece.from + 0.5 * (piece.to - piece.from));
    if (!state) return state.failure();
    piece.middle = *state;
    return {};
  }

  void measure_extent() {
    Place low = place_of(axes_, begun_.front().first);
    Place high = low;
    for (const Piece& piece : begun_) {
      for (const State* state : {&piece.middle, &piece.last}) {
        const Place place = place_of(axes_, *state);
        low = {std::fmin(low.x, place.x), std::fmin(low.y, place.y)};
        high = {std::fmax(high.x, place.x), std::fmax(high.y, place.y)};
      }
    }
    unit_ = {high.x > low.x ? high.x - low.x : 1, high.y > low.y ? high.y - low.y : 1};
  }

  [[nodiscard]] Place scaled(const State& state) const {
    const Place place = place_of(axes_, state);
    return {place.x / unit_.x, place.y / unit_.y};
  }

  // How far the middle lies from the straight piece. Pieces much shorter than an even share are
  // not refined for it: at the seams of IAPWS-IF97 a line has steps that no point removes.
  [[nodiscard]] double missed_by(const Piece& piece) const {
    const Place a = scaled(piece.first);
    const Place m = scaled(piece.middle);
    const Place b = scaled(piece.last);
    const double length = std::hypot(b.x - a.x, b.y - a.y);
    if (length < 0.1 / static_cast<double>(count_)) return kLength * length;
    const double area = (b.x - a.x) * (m.y - a.y) - (b.y - a.y) * (m.x - a.x);
    return std::abs(area) / length + kLength * length;
  }

  // Rounded, so that the last bits of a processor's mathematics do not choose between equals.
  static double rounded(double value) {
    int exponent = 0;
    const double fraction = std::frexp(value, &exponent);
    return std::ldexp(std::round(std::ldexp(fraction, 20)), exponent - 20);
  }

  struct LessMissed {
    bool operator()(const Piece& a, const Piece& b) const {
      if (a.miss != b.miss) return a.miss < b.miss;
      if (a.stretch != b.stretch) return a.stretch > b.stretch;
      return std::abs(a.from - a.stretch->from) > std::abs(b.from - b.stretch->from);
    }
  };

  void push(Piece piece) {
    piece.miss = rounded(missed_by(piece));
    pieces_.push(piece);
  }

  Failure halve_worst() {
    const Piece worst = pieces_.top();
    pieces_.pop();
    const double centre = worst.from + 0.5 * (worst.to - worst.from);
    Piece left{worst.stretch, worst.from, centre, worst.first, {}, worst.middle};
    Piece right{worst.stretch, centre, worst.to, worst.middle, {}, worst.last};
    for (Piece* half : {&left, &right}) {
      if (const Failure failure = find_middle(*half); failure.fault != Fault::none) return failure;
      push(*half);
    }
    ++points_;
    return {};
  }

  Points collected() {
    std::vector<Piece> ordered;
    ordered.reserve(pieces_.size());
    for (; !pieces_.empty(); pieces_.pop()) ordered.push_back(pieces_.top());
    std::sort(ordered.begin(), ordered.end(), [](const Piece& a, const Piece& b) {
      if (a.stretch != b.stretch) return a.stretch < b.stretch;
      return std::abs(a.from - a.stretch->from) < std::abs(b.from - b.stretch->from);
    });
    Points points{ordered.front().first};
    points.reserve(count_);
    for (const Piece& piece : ordered) points.push_back(piece.last);
    return points;
  }

  const Course& course_;
  Axes axes_;
  std::size_t count_;
  std::size_t points_ = 0;
  Place unit_{1, 1};
  std::vector<Piece> begun_;
  std::priority_queue<Piece, std::vector<Piece>, LessMissed> pieces_;
};

}  // namespace

Outcome<Points> points_of(const Course& course, Axes axes, std::size_t count,
                          std::uint8_t count_input, std::uint8_t course_input) {
  if (course.size() + 1 > count) {
    return make_failure(Fault::outside_range, count_input,
                        "{0} is too few: this line has {1} ends and corners",
                        {static_cast<double>(count), Quantity::number},
                        {static_cast<double>(course.size() + 1), Quantity::number});
  }
  Outcome<Points> points = Drawing(course, axes, count).draw();
  if (!points) return points.failure().about(course_input);
  return points;
}

}  // namespace busbar::water::diagram
