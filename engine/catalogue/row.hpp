// What a row of the catalogue is, and how it takes its argument kinds from the kernel's signature.
//
// A kernel is a plain function Outcome<R>(A...). Each parameter type below stands for one argument
// of the cell function; a type without a specialisation of Typed does not compile. The last
// optional argument `options` is there by itself whenever an argument or the result depends on the
// unit set. Decoding, ranges, units and lifting are one routine for all rows (call.cpp); per kernel
// there is one thunk of a few instructions.
#pragma once

#include <array>
#include <cmath>
#include <cstddef>
#include <cstdint>
#include <limits>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <type_traits>
#include <utility>

#include "catalogue/composition.hpp"
#include "catalogue/options.hpp"
#include "catalogue/value.hpp"
#include "core/outcome.hpp"
#include "core/units.hpp"
#include "stream/stream.hpp"

namespace busbar {

/// How an argument is taken; the numbers are those of BUSBAR_ARGUMENT_... in abi/busbar.h.
enum class Kind : std::uint8_t {
  number,
  stream,
  word,
  numbers,
  streams,
  cell,
  rest,
  options,
  composition
};

/// What a kernel gives back.
enum class ResultKind : std::uint8_t { number, stream, text, table };

struct Type {
  Kind kind = Kind::number;
  Quantity quantity = Quantity::number;
  bool optional = false;
  CompositionUse use = CompositionUse::parts;
};

struct ResultType {
  ResultKind kind = ResultKind::number;
  Quantity quantity = Quantity::number;
};

/// A whole range of numbers (SI) or streams: never lifted over.
template <class Q>
struct Numbers {
  std::span<const double> si;
};
using Streams = std::span<const Stream>;

/// A word such as a unit or a basis; whatever further arguments there are; a reference to a cell.
using Word = std::string_view;
using Rest = std::span<const Grid* const>;
struct CellReference {};

/// A text result.
struct Text {
  std::string value;
};

/// One decoded argument. `data` and `size` hold a word, a range of numbers, a range of streams, a
/// composition or the further arguments, as the argument's kind says; `stream` points into the
/// call's workspace.
struct Slot {
  bool given = false;
  double si = 0;
  const Stream* stream = nullptr;
  const void* data = nullptr;
  std::size_t size = 0;

  template <class T>
  void set(const T* first, std::size_t count) {
    data = first;
    size = count;
  }
  [[nodiscard]] Word word() const { return {static_cast<const char*>(data), size}; }
  [[nodiscard]] std::span<const double> numbers() const {
    return {static_cast<const double*>(data), size};
  }
  [[nodiscard]] Streams streams() const { return {static_cast<const Stream*>(data), size}; }
  [[nodiscard]] const GivenComposition& composition() const {
    return *static_cast<const GivenComposition*>(data);
  }
  [[nodiscard]] Rest rest() const { return {static_cast<const Grid* const*>(data), size}; }
};

/// What a thunk leaves behind; the member that the row's result kind names is filled.
struct Result {
  double si = 0;
  std::optional<Stream> stream;
  Text text;
  std::optional<Grid> table;
};

template <class T>
struct Typed;

template <Quantity Q>
struct Typed<Of<Q>> {
  static constexpr Type type{Kind::number, Q, false};
  static constexpr ResultType result{ResultKind::number, Q};
  static Of<Q> take(const Slot& slot) { return {slot.si}; }
  static void give(Of<Q> value, Result& result_) { result_.si = value.si; }
};

template <>
struct Typed<Stream> {
  static constexpr Type type{Kind::stream, Quantity::number, false};
  static constexpr ResultType result{ResultKind::stream, Quantity::number};
  static const Stream& take(const Slot& slot) { return *slot.stream; }
  static void give(const Stream& value, Result& result_) { result_.stream = value; }
};

template <>
struct Typed<Text> {
  static constexpr ResultType result{ResultKind::text, Quantity::number};
  static void give(Text value, Result& result_) { result_.text = std::move(value); }
};

template <>
struct Typed<Grid> {
  static constexpr ResultType result{ResultKind::table, Quantity::number};
  static void give(Grid value, Result& result_) { result_.table = std::move(value); }
};

template <>
struct Typed<Word> {
  static constexpr Type type{Kind::word, Quantity::number, false};
  static Word take(const Slot& slot) { return slot.word(); }
};

template <>
struct Typed<std::optional<Word>> {
  static constexpr Type type{Kind::word, Quantity::number, true};
  static std::optional<Word> take(const Slot& slot) {
    return slot.given ? std::optional<Word>{slot.word()} : std::nullopt;
  }
};

template <Quantity Q>
struct Typed<Numbers<Of<Q>>> {
  static constexpr Type type{Kind::numbers, Q, false};
  static Numbers<Of<Q>> take(const Slot& slot) { return {slot.numbers()}; }
};

template <Quantity Q>
struct Typed<std::optional<Numbers<Of<Q>>>> {
  static constexpr Type type{Kind::numbers, Q, true};
  static std::optional<Numbers<Of<Q>>> take(const Slot& slot) {
    return slot.given ? std::optional<Numbers<Of<Q>>>{{slot.numbers()}} : std::nullopt;
  }
};

template <>
struct Typed<Streams> {
  static constexpr Type type{Kind::streams, Quantity::number, false};
  static Streams take(const Slot& slot) { return slot.streams(); }
};

/// Named parts as they were given: what the names mean and whether the sum matters is the kernel's.
template <>
struct Typed<Composition> {
  static constexpr Type type{Kind::composition, Quantity::number, false};
  static const Composition& take(const Slot& slot) { return slot.composition().composition; }
};

/// A composition of gas species that sums to 1.
template <>
struct Typed<gas::Mixture> {
  static constexpr Type type{Kind::composition, Quantity::number, false, CompositionUse::gas};
  static const gas::Mixture& take(const Slot& slot) { return slot.composition().mixture; }
};

/// The analysis of a solid or liquid fuel, which closes and states its basis.
template <>
struct Typed<fuel::solid::Analysis> {
  static constexpr Type type{Kind::composition, Quantity::number, false, CompositionUse::fuel};
  static const fuel::solid::Analysis& take(const Slot& slot) { return slot.composition().analysis; }
};

template <>
struct Typed<Rest> {
  static constexpr Type type{Kind::rest, Quantity::number, true};
  static Rest take(const Slot& slot) { return slot.rest(); }
};

template <>
struct Typed<CellReference> {
  static constexpr Type type{Kind::cell, Quantity::number, false};
  static CellReference take(const Slot&) { return {}; }
};

template <Quantity Q>
struct Typed<std::optional<Of<Q>>> {
  static constexpr Type type{Kind::number, Q, true};
  static std::optional<Of<Q>> take(const Slot& slot) {
    return slot.given ? std::optional<Of<Q>>{{slot.si}} : std::nullopt;
  }
};

/// A kernel that needs the unit set itself (a table with units in its headings) or another option
/// takes it so, last.
template <>
struct Typed<UnitSet> {
  static constexpr Type type{Kind::options, Quantity::number, true};
};
template <>
struct Typed<Options> {
  static constexpr Type type{Kind::options, Quantity::number, true};
};

/// Lower limit "above zero": the least normal double, written as "above 0".
inline constexpr double kAboveZero = std::numeric_limits<double>::min();
inline constexpr double kNoLimit = std::numeric_limits<double>::max();

/// Words and range of one argument. Limits are in SI and inclusive. `limit` says whose limits they
/// are; the sentence about a number outside reads "1200 bar is above 1000 bar, <limit>".
struct Argument {
  const char* name;
  const char* meaning;
  double low = -kNoLimit;
  double high = kNoLimit;
  const char* limit = "the limit of this argument";
};

struct Source {
  const char* document;
  const char* edition;
  const char* place;
};

/// A formula without the equals sign, the cells that it reads ("B2=STEAM(10;300) | B3=7"), and what
/// the cell then shows to the digits printed (for a stream: the beginning of its text).
struct Example {
  const char* formula;
  const char* answer;
  const char* given = "";
};

struct Words {
  const char* name;
  const char* chapter;
  const char* summary;
  const char* notes;
  const char* result;
  Source source;
  Example example;
  const char* since;
};

/// Adds to the explanation of a call that worked: region, validity, sensitivities.
using Explain = void (*)(const Slot* in, const Result& result, UnitSet units, std::string& text);

using Thunk = Failure (*)(const Slot* in, const Options& options, Result& out);

/// A column of numbers of one quantity, in SI, as a batch kernel takes and fills it.
template <class Q>
struct Column {
  const double* si;
};
template <class Q>
struct Answers {
  double* si;
};

/// A batch kernel bound to a row: columns of `count` numbers, one for each argument, to the column
/// of the results. What is not a number in the result is asked of the kernel again, one by one, so
/// that failures and their reasons have one source. A column holds NaN where the number in the cell
/// is none or is outside its range.
using Batch = void (*)(const double* const* in, double* out, std::size_t count);

inline constexpr std::size_t kMostArguments = 8;

struct Row {
  Words words;
  std::span<const Argument> arguments;  ///< without options
  std::span<const Type> types;          ///< without options
  ResultType result;
  bool has_options = false;
  Thunk thunk = nullptr;
  Explain explain = nullptr;
  Batch batch = nullptr;  ///< the same as the thunk to the last bit, for whole columns

  [[nodiscard]] std::size_t argument_count() const {
    return arguments.size() + (has_options ? 1 : 0);
  }
};

namespace detail {

template <class T>
inline constexpr bool kIsOptions = std::is_same_v<std::remove_cvref_t<T>, UnitSet> ||
                                   std::is_same_v<std::remove_cvref_t<T>, Options>;

template <auto Kernel>
struct Bind;

template <class R, class... A, Outcome<R> (*Kernel)(A...)>
struct Bind<Kernel> {
  static constexpr std::size_t kCount = (std::size_t{0} + ... + (kIsOptions<A> ? 0 : 1));
  static constexpr std::array<Type, sizeof...(A)> kAll{Typed<std::remove_cvref_t<A>>::type...};
  static constexpr ResultType kResult = Typed<R>::result;

  static constexpr bool has_options() {
    if (kCount != sizeof...(A)) return true;
    for (const Type& type : kAll) {
      const bool number = type.kind == Kind::number || type.kind == Kind::numbers;
      if (number && kDependsOnUnitSet(type.quantity)) return true;
    }
    return kResult.kind == ResultKind::number && kDependsOnUnitSet(kResult.quantity);
  }

  // The table of units is not a constant expression for other files; the two quantities that are
  // the same in every unit set, and the plain number, are named here and checked by a test.
  static constexpr bool kDependsOnUnitSet(Quantity quantity) {
    return quantity != Quantity::number && quantity != Quantity::fraction &&
           quantity != Quantity::same_unit;
  }

  template <class T>
  static decltype(auto) take(const Slot& slot, const Options& options) {
    if constexpr (std::is_same_v<std::remove_cvref_t<T>, UnitSet>) {
      return UnitSet{options.units};
    } else if constexpr (kIsOptions<T>) {
      return Options{options};
    } else {
      return Typed<std::remove_cvref_t<T>>::take(slot);
    }
  }

  static Failure thunk([[maybe_unused]] const Slot* in, [[maybe_unused]] const Options& options,
                       Result& out) {
    return [&]<std::size_t... I>(std::index_sequence<I...>) {
      Outcome<R> outcome = Kernel(take<A>(in[I], options)...);
      if (outcome) Typed<R>::give(std::move(*outcome), out);
      return outcome.failure();
    }
    (std::index_sequence_for<A...>{});
  }
};

// A batch kernel must take what the kernel takes and give what it gives.
template <auto Kernel, auto BatchKernel>
struct BindBatch;

template <class R, class... A, Outcome<R> (*Kernel)(A...), auto BatchKernel>
struct BindBatch<Kernel, BatchKernel> {
  static_assert(
      std::is_same_v<decltype(BatchKernel), void (*)(Column<A>..., Answers<R>, std::size_t)>,
      "a batch kernel takes the columns of the kernel's arguments");
  static_assert(Typed<R>::result.kind == ResultKind::number, "a batch kernel gives numbers");
  static_assert(((Typed<A>::type.kind == Kind::number && !Typed<A>::type.optional) && ...),
                "a batch kernel takes numbers, none of them optional");

  static void batch(const double* const* in, double* out, std::size_t count) {
    [&]<std::size_t... I>(std::index_sequence<I...>) {
      BatchKernel(Column<A>{in[I]}..., Answers<R>{out}, count);
    }
    (std::index_sequence_for<A...>{});
  }
};

template <auto Kernel, std::size_t N>
constexpr Row checked_row(const Words& words, std::span<const Argument, N> arguments,
                          Explain explain, Batch batch) {
  using Bound = detail::Bind<Kernel>;
  static_assert(N == Bound::kCount, "one Argument for each parameter of the kernel");
  static_assert(N < kMostArguments, "more arguments than a call can hold");
  bool optional_seen = false;
  for (std::size_t i = 0; i < arguments.size(); ++i) {
    if (optional_seen && !Bound::kAll[i].optional) {
      throw "an optional argument stands before a required one";
    }
    optional_seen = Bound::kAll[i].optional;
    if (std::string_view(arguments[i].meaning).empty()) throw "an argument lacks its meaning";
    if (!(arguments[i].low < arguments[i].high)) throw "an argument has an empty range";
  }
  if (std::string_view(words.source.document).empty()) throw "a row needs a source";
  if (std::string_view(words.example.formula).empty()) throw "a row needs an example";
  if (std::string_view(words.example.answer).empty()) throw "an example needs its answer";
  if (std::string_view(words.summary).empty()) throw "a row needs a summary";
  return {words,
          arguments,
          std::span<const Type>(Bound::kAll).first(N),
          Bound::kResult,
          Bound::has_options(),
          &Bound::thunk,
          explain,
          batch};
}

}  // namespace detail

/// Binds a kernel to its words. What does not fit does not compile.
template <auto Kernel, std::size_t N>
consteval Row row(const Words& words, const Argument (&arguments)[N], Explain explain = nullptr) {
  return detail::checked_row<Kernel>(words, std::span<const Argument, N>(arguments), explain,
                                     nullptr);
}

/// A function without arguments.
template <auto Kernel>
consteval Row row(const Words& words) {
  return detail::checked_row<Kernel>(words, std::span<const Argument, 0>{}, nullptr, nullptr);
}

/// The same with a batch kernel for calls over ranges: void(Column<A>..., Answers<R>, count).
template <auto Kernel, auto BatchKernel, std::size_t N>
consteval Row row_with_batch(const Words& words, const Argument (&arguments)[N],
                             Explain explain = nullptr) {
  return detail::checked_row<Kernel>(words, std::span<const Argument, N>(arguments), explain,
                                     &detail::BindBatch<Kernel, BatchKernel>::batch);
}

}  // namespace busbar
