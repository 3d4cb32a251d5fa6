#include "entries.hpp"

#include <algorithm>
#include <bit>
#include <cmath>
#include <cstdio>
#include <cstdlib>
#include <cstring>
#include <limits>

#include "busbar.h"
#include "catalogue/options.hpp"
#include "core/text.hpp"
#include "stream/text.hpp"
#include "units/expression.hpp"
#include "value.hpp"

namespace busbar::fuzz {
namespace {

std::string text_of(Bytes bytes) {
  return {reinterpret_cast<const char*>(bytes.data()), bytes.size()};
}

void require(bool holds, const char* promise) {
  if (holds) return;
  std::fprintf(stderr, "broken promise: %s\n", promise);
  std::abort();
}

// Takes values off the front of the bytes; zeros when they are used up.
class Source {
 public:
  explicit Source(Bytes bytes) : left_(bytes) {}

  [[nodiscard]] bool empty() const { return left_.empty(); }
  std::uint8_t byte() {
    if (left_.empty()) return 0;
    const std::uint8_t value = left_.front();
    left_ = left_.subspan(1);
    return value;
  }
  std::uint64_t word() {
    std::uint64_t value = 0;
    for (int i = 0; i < 8; ++i) value = value << 8U | byte();
    return value;
  }
  std::string text() {
    const std::size_t wanted = byte();
    const std::size_t length = std::min(wanted, left_.size());
    std::string value = text_of(left_.first(length));
    left_ = left_.subspan(length);
    return value;
  }

 private:
  Bytes left_;
};

constexpr double kTelling[] = {0,
                               -0.0,
                               1,
                               0.5,
                               38,
                               100,
                               540,
                               1e-300,
                               1e308,
                               -1,
                               1e5,
                               220.64,
                               373.946,
                               350,
                               165.3,
                               273.15,
                               647.096,
                               0.05,
                               1e7,
                               22.064,
                               863.15,
                               1073.15,
                               800,
                               500,
                               0.00611213,
                               2300,
                               6.8,
                               4.41,
                               2084.26,
                               std::numeric_limits<double>::infinity(),
                               std::numeric_limits<double>::quiet_NaN(),
                               std::numeric_limits<double>::denorm_min()};
constexpr const char* kWords[] = {"metric", "us",       "si",     "LHV", "HHV",   "psia",
                                  "barg",   "kJ/kg",    "°C",     "",    "STEAM", "LBA10",
                                  "WHY",    "WHY_CALL", "CARNOT", "a:b", "K",     "kJ/(kg K)"};

double some_number(Source& source) {
  const std::uint8_t choice = source.byte();
  if (choice < 60) return std::bit_cast<double>(source.word());
  if (choice < 200) return kTelling[source.byte() % std::size(kTelling)];
  return 1e5 * std::exp(source.byte() / 16.0 - 8);
}

// Numbers that no device would give, under right check digits.
support::Value forged_stream(Source& source) {
  Stream stream;
  stream.phase = static_cast<Phase>(source.byte() % static_cast<int>(Phase::count_));
  stream.pressure = some_number(source);
  stream.temperature = some_number(source);
  stream.enthalpy = some_number(source);
  if (stream.phase == Phase::two_phase) stream.dryness = source.byte() / 255.0;
  if ((source.byte() & 1U) != 0) stream.flow = some_number(source);
  std::string text;
  write_stream(text, stream, static_cast<UnitSet>(source.byte() % 3));
  return support::Value::text(text);
}

support::Value one_cell(Source& source) {
  using support::Value;
  switch (source.byte() % 12) {
    case 10:
    case 11:
      return forged_stream(source);
    case 0:
      return Value::blank();
    case 1:
      return Value::text(source.text());
    case 2:
      return Value::text(kWords[source.byte() % std::size(kWords)]);
    case 3:
      return Value::logical((source.byte() & 1U) != 0);
    case 4:
      return Value::error(1 + source.byte() % 5);
    case 5:
      return Value::number(std::bit_cast<double>(source.word()));
    case 6:
    case 7: {
      const double p = 1e-2 * std::exp(static_cast<double>(source.byte()) / 22);
      const double t = 3.5 * source.byte();
      const double m = 1 + source.byte();
      return support::call("STEAM", {Value::number(p), Value::number(t), Value::number(m)});
    }
    case 8: {
      const double p = 1e-2 * std::exp(static_cast<double>(source.byte()) / 26);
      return support::call("STEAM_AT_DRYNESS",
                           {Value::number(p), Value::number(source.byte() / 255.0)});
    }
    default: {
      const double telling = kTelling[source.byte() % std::size(kTelling)];
      return Value::number(telling * (1 + 1e-6 * (source.byte() - 128)));
    }
  }
}

support::Value argument(Source& source) {
  const std::uint8_t shape = source.byte();
  if (shape < 200) return one_cell(source);
  support::Value grid(1 + shape % 3, 1 + shape % 4);
  for (std::size_t r = 0; r < grid.rows(); ++r) {
    for (std::size_t c = 0; c < grid.columns(); ++c) grid.copy(r, c, one_cell(source));
  }
  return grid;
}

// A quoted word of the caller may hold what it likes.
std::string unquoted(std::string text) {
  const auto first = text.find('"');
  const auto last = text.rfind('"');
  if (first != last) text.erase(first, last - first);
  return text;
}

void check_answer(const support::Value& answer) {
  for (std::size_t r = 0; r < answer.rows(); ++r) {
    for (std::size_t c = 0; c < answer.columns(); ++c) {
      if (answer.kind(r, c) == BUSBAR_NUMBER) {
        require(std::isfinite(answer.number_at(r, c)), "numbers are finite");
      }
      if (answer.kind(r, c) == BUSBAR_ERROR) {
        const std::string reason = answer.reason(r, c);
        require(!reason.empty() && is_printable_utf8(reason), "a reason can be printed");
        require(unquoted(reason).find_first_of("{}") == std::string::npos, "a reason is filled in");
      }
      if (answer.kind(r, c) == BUSBAR_TEXT) {
        require(is_printable_utf8(answer.text_at(r, c)), "a text can be printed");
      }
    }
  }
}

}  // namespace

void stream_text(Bytes bytes) {
  const std::string text = text_of(bytes);
  const Outcome<Stream> read = read_stream(text);
  if (!read) {
    require(*read.failure().reason != '\0', "a refusal has a reason");
    return;
  }
  // A fuzzer that watches comparisons forges check digits, so the face may say anything; yet what
  // is taken is a stream, and its own text is that stream again.
  std::string anew;
  write_stream(anew, *read, read->face);
  const Outcome<Stream> again = read_stream(anew);
  require(static_cast<bool>(again), "the text of a stream can be read");
  std::string third;
  write_stream(third, *again, again->face);
  require(third == anew, "a stream and its text are one");
}

void unit_expression(Bytes bytes) {
  const std::string text = text_of(bytes);
  const Outcome<units::Expression> unit = units::read_unit(text);
  if (!unit) {
    require(*unit.failure().reason != '\0', "a refusal has a reason");
    return;
  }
  require(std::isfinite(unit->factor) && unit->factor > 0, "a factor is finite and above zero");
  const Outcome<double> same = units::convert_difference(1, text, text);
  require(same && *same == 1, "a unit converts into itself");
}

void options_text(Bytes bytes) {
  const std::string text = text_of(bytes);
  std::string word;
  const Outcome<Options> options = read_options(text, word);
  if (!options) {
    require(*options.failure().reason != '\0', "a refusal has a reason");
    require(word.size() < 70, "a sentence quotes a short part");
    return;
  }
  require(
      text.find(name_of(options->units).front()) != std::string::npos ||
          text.find(static_cast<char>(name_of(options->units).front() - 32)) != std::string::npos,
      "the unit set was named");
}

void any_call(Bytes bytes) {
  Source source(bytes);
  const busbar_function* function = busbar_function_at(source.word() % busbar_function_count());
  std::vector<support::Value> values;
  std::vector<const busbar_value*> arguments;
  const std::size_t count = source.byte() % (busbar_argument_count(function) + 2);
  for (std::size_t i = 0; i < count; ++i) values.push_back(argument(source));
  for (const support::Value& value : values) {
    arguments.push_back(source.byte() == 255 ? nullptr : value.get());
  }
  busbar_value* answer = nullptr;
  require(busbar_call(function, arguments.data(), count, &answer) == BUSBAR_OK, "a call answers");
  const support::Value first(answer);
  check_answer(first);
  busbar_value* again = nullptr;
  require(busbar_call(function, arguments.data(), count, &again) == BUSBAR_OK, "a call answers");
  const support::Value second(again);
  for (std::size_t r = 0; r < first.rows(); ++r) {
    for (std::size_t c = 0; c < first.columns(); ++c) {
      require(support::same_cell(first, second, r, c), "the same arguments give the same answer");
    }
  }
  busbar_value* words = nullptr;
  require(busbar_explain(function, arguments.data(), count, &words) == BUSBAR_OK,
          "a call can be explained");
  const support::Value explanation(words);
  require(explanation.is_text() && !explanation.text_at().empty(), "an explanation says something");
  require(is_printable_utf8(explanation.text_at()), "an explanation can be printed");
}

std::vector<Entry> entries() {
  std::vector<std::string> streams;
  for (const auto& [p, t] :
       {std::pair{100.0, 540.0}, std::pair{0.05, 20.0}, std::pair{250.0, 600.0}}) {
    using support::Value;
    for (const char* set : {"metric", "us", "si"}) {
      const Value stream = support::call("STEAM", {Value::number(p), Value::number(t)});
      const Value tagged = support::call("TAGGED", {stream, Value::text("LBA10")});
      streams.push_back(
          support::call("SET_FLOW", {tagged, Value::number(55), Value::text(set)}).text_at());
    }
  }
  streams.push_back(support::call("STEAM_AT_DRYNESS",
                                  {support::Value::number(0.05), support::Value::number(0.88)})
                        .text_at());
  std::vector<std::string> calls;
  for (int i = 0; i < 64; ++i) calls.emplace_back(48, static_cast<char>(i * 4));
  return {
      {"stream", stream_text, streams},
      {"unit",
       unit_expression,
       {"kJ/(kg K)", "m3/h", "bar(g)", "psia", "W/(m² K)", "kg m⁻¹ s⁻²", "Btu/(ft2 h °F)", "%"}},
      {"options", options_text, {"metric", "US", "si", "metric;us", " si , x=1"}},
      {"call", any_call, calls},
  };
}

}  // namespace busbar::fuzz
