#include "stream/gas_text.hpp"

#include <array>
#include <cmath>

#include "core/text.hpp"

namespace busbar {
namespace {

// As written by append_gas; the formation datum has none.
constexpr std::array<std::string_view, static_cast<std::size_t>(gas::Datum::count_)> kDatums{
    "", " d=0", " d=15", " d=25"};

// Mixing adds up the rounding of many fractions.
constexpr double kWhole = 1e-9;

}  // namespace

void append_gas(std::string& out, const Stream& stream) {
  out += kDatums[static_cast<std::size_t>(stream.datum)];
  const gas::Mixture& mixture = stream.mixture;
  for (std::size_t i = 0; i < mixture.size(); ++i) {
    out += ' ';
    out += gas::name_of(mixture.species(i));
    out += '=';
    append_exact(out, mixture.mole_fraction(i));
  }
}

bool take_gas(std::string_view& tail, Stream& stream) {
  for (std::size_t i = 1; i < kDatums.size(); ++i) {
    const std::string_view datum = kDatums[i];
    if (tail.substr(0, datum.size()) != datum || tail.substr(datum.size(), 1) != " ") continue;
    stream.datum = static_cast<gas::Datum>(i);
    tail.remove_prefix(datum.size());
    break;
  }
  double sum = 0;
  while (tail.size() > 1 && tail[0] == ' ' && tail[1] != '#') {
    const auto end = tail.find(' ', 1);
    if (end == std::string_view::npos) return false;
    const std::string_view field = tail.substr(1, end - 1);
    const auto equals = field.find('=');
    if (equals == std::string_view::npos) return false;
    const auto species = gas::species_named(field.substr(0, equals));
    double fraction = 0;
    if (!species || gas::name_of(*species) != field.substr(0, equals) ||
        !read_number(field.substr(equals + 1), fraction) ||
        !stream.mixture.restore(*species, fraction)) {
      return false;
    }
    sum += fraction;
    tail.remove_prefix(end);
  }
  return std::abs(sum - 1) <= kWhole;
}

}  // namespace busbar
