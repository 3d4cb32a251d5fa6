// What a call costs through the C interface, as a spreadsheet makes it: values created, called,
// read and freed for every cell. Inputs vary from call to call over a sheet of states, because one
// input again and again flatters branch prediction.
#include <benchmark/benchmark.h>

#include <array>
#include <cstring>
#include <random>
#include <string>
#include <vector>

#include "busbar.h"

namespace {

constexpr std::size_t kStates = 1024;

struct Inputs {
  std::array<double, kStates> pressure;
  std::array<double, kStates> temperature;
  std::array<double, kStates> enthalpy;
  std::vector<std::string> stream;
  std::vector<std::string> outlet;
};

const busbar_function* function(const char* name) { return busbar_find(name, std::strlen(name)); }

std::string text_of(const busbar_value* value) {
  std::size_t length = 0;
  const char* text = busbar_get_text(value, 0, 0, &length);
  return text == nullptr ? std::string() : std::string(text, length);
}

std::string call_text(const char* name, std::vector<busbar_value*> arguments) {
  busbar_value* result = nullptr;
  busbar_call(function(name), arguments.data(), arguments.size(), &result);
  std::string text = text_of(result);
  busbar_value_free(result);
  for (busbar_value* argument : arguments) busbar_value_free(argument);
  return text;
}

// Boiler and turbine states of a steam plant: liquid, wet and superheated.
const Inputs& inputs() {
  static const auto& made = *new Inputs([] {
    Inputs in;
    std::mt19937_64 random(20261201);
    std::uniform_real_distribution<double> pressure(20, 160);
    std::uniform_real_distribution<double> temperature(380, 560);
    std::uniform_real_distribution<double> enthalpy(300, 3500);
    for (std::size_t i = 0; i < kStates; ++i) {
      in.pressure[i] = pressure(random);
      in.temperature[i] = temperature(random);
      in.enthalpy[i] = enthalpy(random);
      in.stream.push_back(call_text(
          "STEAM",
          {busbar_number(in.pressure[i]), busbar_number(in.temperature[i]), busbar_number(55)}));
      in.outlet.push_back(
          call_text("TURBINE_OUT", {busbar_text(in.stream[i].data(), in.stream[i].size()),
                                    busbar_number(4), busbar_number(0.88)}));
    }
    return in;
  }());
  return made;
}

// One numeric cell: two values in, one out.
void numeric(benchmark::State& state, const char* name, const std::array<double, kStates>& first,
             const std::array<double, kStates>& second) {
  const busbar_function* called = function(name);
  std::size_t i = 0;
  double sum = 0;
  for (auto _ : state) {
    busbar_value* arguments[] = {busbar_number(first[i]), busbar_number(second[i])};
    busbar_value* result = nullptr;
    busbar_call(called, arguments, 2, &result);
    sum += busbar_get_number(result, 0, 0);
    busbar_value_free(result);
    busbar_value_free(arguments[0]);
    busbar_value_free(arguments[1]);
    i = (i + 1) % kStates;
  }
  benchmark::DoNotOptimize(sum);
}

void nothing_but_values(benchmark::State& state) {
  std::size_t i = 0;
  double sum = 0;
  for (auto _ : state) {
    busbar_value* values[] = {busbar_number(inputs().pressure[i]),
                              busbar_number(inputs().temperature[i]), busbar_number(0)};
    sum += busbar_get_number(values[0], 0, 0);
    for (busbar_value* value : values) busbar_value_free(value);
    i = (i + 1) % kStates;
  }
  benchmark::DoNotOptimize(sum);
}

void carnot(benchmark::State& state) {
  const busbar_function* called = function("CARNOT");
  std::size_t i = 0;
  double sum = 0;
  for (auto _ : state) {
    busbar_value* arguments[] = {busbar_number(inputs().temperature[i]), busbar_number(30)};
    busbar_value* result = nullptr;
    busbar_call(called, arguments, 2, &result);
    sum += busbar_get_number(result, 0, 0);
    busbar_value_free(result);
    busbar_value_free(arguments[0]);
    busbar_value_free(arguments[1]);
    i = (i + 1) % kStates;
  }
  benchmark::DoNotOptimize(sum);
}

void steam_enthalpy(benchmark::State& state) {
  numeric(state, "STEAM_ENTHALPY", inputs().pressure, inputs().temperature);
}
void temperature_at_enthalpy(benchmark::State& state) {
  numeric(state, "STEAM_TEMPERATURE_AT_ENTHALPY", inputs().pressure, inputs().enthalpy);
}

// One stream cell: numbers in, text out.
void steam_stream(benchmark::State& state) {
  const busbar_function* called = function("STEAM");
  std::size_t i = 0;
  for (auto _ : state) {
    busbar_value* arguments[] = {busbar_number(inputs().pressure[i]),
                                 busbar_number(inputs().temperature[i]), busbar_number(55)};
    busbar_value* result = nullptr;
    busbar_call(called, arguments, 3, &result);
    benchmark::DoNotOptimize(busbar_get_text(result, 0, 0, nullptr));
    busbar_value_free(result);
    for (busbar_value* argument : arguments) busbar_value_free(argument);
    i = (i + 1) % kStates;
  }
}

// A stream read and written again with another flow: what the text form itself costs.
void set_flow(benchmark::State& state) {
  const busbar_function* called = function("SET_FLOW");
  std::size_t i = 0;
  for (auto _ : state) {
    const std::string& stream = inputs().stream[i];
    busbar_value* arguments[] = {busbar_text(stream.data(), stream.size()), busbar_number(60)};
    busbar_value* result = nullptr;
    busbar_call(called, arguments, 2, &result);
    benchmark::DoNotOptimize(busbar_get_text(result, 0, 0, nullptr));
    busbar_value_free(result);
    for (busbar_value* argument : arguments) busbar_value_free(argument);
    i = (i + 1) % kStates;
  }
}

// A stage: stream in, stream out, an isentropic and an enthalpy solve between.
void turbine_out(benchmark::State& state) {
  const busbar_function* called = function("TURBINE_OUT");
  std::size_t i = 0;
  for (auto _ : state) {
    const std::string& stream = inputs().stream[i];
    busbar_value* arguments[] = {busbar_text(stream.data(), stream.size()), busbar_number(4),
                                 busbar_number(0.88)};
    busbar_value* result = nullptr;
    busbar_call(called, arguments, 3, &result);
    benchmark::DoNotOptimize(busbar_get_text(result, 0, 0, nullptr));
    busbar_value_free(result);
    for (busbar_value* argument : arguments) busbar_value_free(argument);
    i = (i + 1) % kStates;
  }
}

// A reader that needs nothing but the text, and one that needs the state.
void reader(benchmark::State& state, const char* name) {
  const busbar_function* called = function(name);
  std::size_t i = 0;
  double sum = 0;
  for (auto _ : state) {
    const std::string& stream = inputs().outlet[i];
    busbar_value* argument = busbar_text(stream.data(), stream.size());
    busbar_value* result = nullptr;
    busbar_call(called, &argument, 1, &result);
    sum += busbar_get_number(result, 0, 0);
    busbar_value_free(result);
    busbar_value_free(argument);
    i = (i + 1) % kStates;
  }
  benchmark::DoNotOptimize(sum);
}
void enthalpy_of(benchmark::State& state) { reader(state, "ENTHALPY_OF"); }
void entropy_of(benchmark::State& state) { reader(state, "ENTROPY_OF"); }

// One array call over a column of states.
void column(benchmark::State& state, const char* name) {
  const busbar_function* called = function(name);
  const auto rows = static_cast<std::size_t>(state.range(0));
  busbar_value* arguments[] = {busbar_value_create(rows, 1), busbar_value_create(rows, 1)};
  for (std::size_t r = 0; r < rows; ++r) {
    busbar_set_number(arguments[0], r, 0, inputs().pressure[r % kStates]);
    busbar_set_number(arguments[1], r, 0, inputs().temperature[r % kStates]);
  }
  for (auto _ : state) {
    busbar_value* result = nullptr;
    busbar_call(called, arguments, 2, &result);
    benchmark::DoNotOptimize(result);
    busbar_value_free(result);
  }
  for (busbar_value* argument : arguments) busbar_value_free(argument);
  state.SetItemsProcessed(state.iterations() * state.range(0));
}
void enthalpy_column(benchmark::State& state) { column(state, "STEAM_ENTHALPY"); }
void stream_column(benchmark::State& state) { column(state, "STEAM"); }

BENCHMARK(nothing_but_values);
BENCHMARK(carnot);
BENCHMARK(steam_enthalpy);
BENCHMARK(temperature_at_enthalpy);
BENCHMARK(steam_stream);
BENCHMARK(set_flow);
BENCHMARK(turbine_out);
BENCHMARK(enthalpy_of);
BENCHMARK(entropy_of);
BENCHMARK(enthalpy_column)->Arg(100000);
BENCHMARK(stream_column)->Arg(100000);

}  // namespace
