// The catalogue: every cell function, chapter by chapter.
#pragma once

#include <cstddef>
#include <cstdint>
#include <span>
#include <string_view>

#include "catalogue/row.hpp"

namespace busbar::functions {

std::span<const Row> steam();
std::span<const Row> streams();
std::span<const Row> machines();
std::span<const Row> limits();
std::span<const Row> performance();
std::span<const Row> electrical_machines();
std::span<const Row> electrical_three_phase();
std::span<const Row> electrical_losses();
std::span<const Row> electrical_generator();
std::span<const Row> electrical_plant();
std::span<const Row> units();
std::span<const Row> explanation();
std::span<const Row> steam_properties();
std::span<const Row> steam_transport();
std::span<const Row> steam_pairs();
std::span<const Row> stream_properties();
std::span<const Row> humid_air();
std::span<const Row> air_properties();
std::span<const Row> air_formulas();
std::span<const Row> compositions();
std::span<const Row> gases();
std::span<const Row> gas_streams();
std::span<const Row> diagrams();
std::span<const Row> fuel_moisture();
std::span<const Row> fuel_library();
std::span<const Row> solid_fuels();
std::span<const Row> solid_fuel_heating_values();
std::span<const Row> combustion_air();
std::span<const Row> combustion_flue_gas();
std::span<const Row> combustion_flames();
std::span<const Row> boiler_losses();
std::span<const Row> gaseous_fuels();
std::span<const Row> gaseous_fuel_tables();
std::span<const Row> gaseous_fuel_data();
std::span<const Row> emission_factors();
std::span<const Row> emissions();

/// All rows in the order of the chapters above.
std::span<const Row* const> all();

/// The row of that name, capitals or not; nullptr when there is none.
const Row* find(std::string_view name);

/// Changes whenever a name, an argument, its kind or its place changes.
std::uint64_t fingerprint();

}  // namespace busbar::functions
