"""What the right-hand side of the sheet "Recomputation" works out, line by line, as data."""

POWER = "=unit_power"
TEMPERATURE = "=unit_temperature"

# Steam that passes the first section of the LP stage.
_BELOW = "lp_extraction_upper_flow+lp_extraction_lower_flow+lp_exhaust_flow"
# section, inlet, outlet, flow
SECTIONS = (
    ("HP stage", "main_steam", "hp_exhaust", "=main_steam_flow"),
    ("IP stage, before the extraction", "hot_reheat", "ip_extraction", "=hot_reheat_flow"),
    ("IP stage, after the extraction", "ip_extraction", "ip_exhaust", "=ip_exhaust_flow"),
    ("LP stage, first section", "ip_exhaust", "lp_extraction_upper", f"={_BELOW}"),
    (
        "LP stage, second section",
        "lp_extraction_upper",
        "lp_extraction_lower",
        "=lp_extraction_lower_flow+lp_exhaust_flow",
    ),
    ("LP stage, last section", "lp_extraction_lower", "lp_exhaust", "=lp_exhaust_flow"),
)

# stage, key, efficiency, entropy rise
STAGES = (
    ("HP stage", "hp", "TURBINE_EFFICIENCY(main_steam;hp_exhaust)", "hp_exhaust_entropy-main_steam_entropy"),
    ("IP stage", "ip", "TURBINE_EFFICIENCY(hot_reheat;ip_exhaust)", "ip_exhaust_entropy-hot_reheat_entropy"),
    ("LP stage", "lp", "TURBINE_EFFICIENCY(ip_exhaust;lp_exhaust)", "lp_exhaust_entropy-ip_exhaust_entropy"),
    ("Feed pump", "pump", "PUMP_EFFICIENCY(pump_suction;pump_discharge)", "pump_discharge_entropy-pump_suction_entropy"),
)

_HEATING_POWER = '"("&unit_flow&") ("&unit_enthalpy&")"'

# label, formula, format, how, unit, name
CHAIN = (
    (
        "Heat to main steam",
        "=HEAT_DUTY(SET_FLOW(final_feed;main_steam_flow;unit_set);main_steam;unit_set)",
        "power",
        "final feedwater to main steam",
        POWER,
        "heat_main",
    ),
    (
        "Heat to reheat",
        "=HEAT_DUTY(SET_FLOW(hp_exhaust;hot_reheat_flow;unit_set);hot_reheat;unit_set)",
        "power",
        "HP exhaust to hot reheat",
        POWER,
        "heat_reheat",
    ),
    ("Heat to the steam", "=heat_main+heat_reheat", "power", "sum", POWER, "heat_added"),
    (
        "Power taken by the feedwater",
        "=-FLUID_POWER(pump_suction;SET_FLOW(pump_discharge;pump_suction_flow;unit_set);unit_set)",
        "power",
        "suction to discharge; swings with the readings",
        POWER,
        "pump_fluid",
    ),
    (
        "Heat rejected, by balance",
        "=heat_added+pump_fluid-turbine_fluid",
        "power",
        "heat in + pump − turbine (first law)",
        POWER,
        "heat_rejected",
    ),
    (
        "Heat rejected, steam side",
        "=-HEAT_DUTY(lp_exhaust;SET_FLOW(condensate;lp_exhaust_flow;unit_set);unit_set)",
        "power",
        "LP exhaust to condensate; drains left out",
        POWER,
        "heat_condenser",
    ),
    (
        "Shaft power",
        "=SHAFT_POWER(turbine_fluid;mechanical_efficiency)",
        "power",
        "mechanical efficiency as stated",
        POWER,
        "shaft_output",
    ),
    (
        "Gross output, from the states",
        "=GENERATOR_POWER(shaft_output;stated_claim_generator)",
        "power",
        "generator efficiency as claimed",
        POWER,
        "gross_from_states",
    ),
    (
        "Auxiliary power",
        "=SUM(auxiliary_list)",
        "power",
        "sum of the list above",
        POWER,
        "auxiliaries",
    ),
    (
        "Net output",
        "=NET_POWER(gross_power;auxiliaries)",
        "power",
        "power at the terminals less auxiliaries",
        POWER,
        "net_output",
    ),
    (
        "Fuel heat on LHV",
        f"=CONVERT_UNIT(fuel_flow*lower_heating_value;{_HEATING_POWER};unit_power)",
        "power",
        "fuel flow × lower heating value",
        POWER,
        "fuel_heat_lhv",
    ),
    (
        "Fuel heat on HHV",
        f"=CONVERT_UNIT(fuel_flow*higher_heating_value;{_HEATING_POWER};unit_power)",
        "power",
        "fuel flow × higher heating value",
        POWER,
        "fuel_heat_hhv",
    ),
    (
        "Boiler efficiency, LHV",
        "=heat_added/fuel_heat_lhv",
        "percent",
        "heat to the steam over fuel heat; credits left out",
        "%",
        "efficiency_boiler_lhv",
    ),
)

# label, formula, how
LINKS = (
    (
        '="Boiler, as claimed, "&claim_boiler_basis',
        "=stated_claim_boiler",
        "the basis of the claim is that of the product",
    ),
    ("Steam to turbine", "=turbine_fluid/heat_added", "power of the fluid over heat to the steam"),
    ("Mechanical, as stated", "=mechanical_efficiency", ""),
    ("Generator, as claimed", "=stated_claim_generator", ""),
)

_KELVIN = 'CONVERT_UNIT({};unit_temperature;"K")'
_ENTROPY = (
    "heat_main/" + _KELVIN.format("mean_main") + "+heat_reheat/" + _KELVIN.format("mean_reheat")
)

# label, formula, format, how, unit, name
LIMITS = (
    (
        "Mean temperature, main steam",
        "=MEAN_HEATING_TEMPERATURE(final_feed;main_steam;unit_set)",
        "temperature",
        "heat over entropy, feedwater to main steam",
        TEMPERATURE,
        "mean_main",
    ),
    (
        "Mean temperature, reheat",
        "=MEAN_HEATING_TEMPERATURE(hp_exhaust;hot_reheat;unit_set)",
        "temperature",
        "heat over entropy, HP exhaust to hot reheat",
        TEMPERATURE,
        "mean_reheat",
    ),
    (
        "Entropy taken with the heat",
        f"={_ENTROPY}",
        "small",
        "main steam and reheat: heat over mean temperature, summed",
        '=unit_power&"/K"',
        "entropy_added",
    ),
    (
        "Mean temperature, both together",
        '=CONVERT_UNIT(heat_added/entropy_added;"K";unit_temperature)',
        "temperature",
        "all heat over all entropy",
        TEMPERATURE,
        "mean_heating",
    ),
    (
        "Temperature of condensation",
        "=TEMPERATURE_OF(lp_exhaust;unit_set)",
        "temperature",
        "LP exhaust",
        TEMPERATURE,
        "condensing",
    ),
    (
        "Carnot, at the mean temperature",
        "=CARNOT(mean_heating;condensing;unit_set)",
        "percent",
        "the limit that bites: no cycle with these states is better",
        "%",
        "carnot_limit",
    ),
    (
        "Gross power of heat, at most",
        "=carnot_limit+MAX(0;pump_fluid)/heat_added",
        "percent",
        "Carnot, and the feed pump's power that comes from outside",
        "%",
        "gross_limit",
    ),
    (
        "Carnot, at the peak temperature",
        "=CARNOT(main_steam_temperature;condensing;unit_set)",
        "percent",
        "true but loose",
        "%",
        "carnot_peak",
    ),
    (
        "Curzon–Ahlborn, peak temperature",
        "=CURZON_AHLBORN(main_steam_temperature;condensing;unit_set)",
        "percent",
        "orientation only, never a limit",
        "%",
        "curzon_ahlborn_value",
    ),
    (
        "Gross turbine efficiency of Carnot",
        "=efficiency_turbine_gross/carnot_limit",
        "percent",
        "share of the limit that the cycle reaches",
        "%",
        "second_law_share",
    ),
    (
        "Terminal difference",
        "=condensing-TEMPERATURE_OF(cooling_outlet;unit_set)",
        "ratio",
        "condensation less cooling water outlet",
        "=unit_difference",
        "terminal_difference",
    ),
    (
        "Terminal difference",
        '=CONVERT_DIFFERENCE(terminal_difference;unit_difference;"K")',
        "ratio",
        "for the range beside",
        "K",
        "terminal_difference_kelvin",
    ),
    (
        "Generator efficiency",
        "=gross_power/(gross_power+generator_losses)",
        "percent2",
        "power over power and losses",
        "%",
        "efficiency_generator",
    ),
    (
        "Auxiliary power of gross",
        "=auxiliaries/gross_power",
        "percent2",
        "",
        "%",
        "auxiliary_share",
    ),
    (
        "Feed pump drive efficiency",
        "=pump_fluid/feed_pump_motors",
        "percent",
        "fluid over motor power; above 100 % is impossible",
        "%",
        "drive_efficiency",
    ),
)
