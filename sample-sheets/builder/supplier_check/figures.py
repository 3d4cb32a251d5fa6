"""The invented supplier's data sheet. Site, supplier, unit and every figure are made up.

The figures come from a heat balance that closes, worked out once with another steam library, and
then carry the faults that the workbook has to find. No verdict is written anywhere in the builder.
"""

SITE = "Marrowby Quay power station, unit 2"
SUPPLIER = "Tarnholt Steam Works"
SHEET = "data sheet TSW-0417, revision B, 100 % load"

# Units as the supplier states them.
STATED_UNITS = {"pressure": "bar", "temperature": "°C", "flow": "t/h"}

# id, name, pressure, "absolute" or "gauge", temperature, dryness, flow, key.
# S5 is 31.7 K too cold for the stage efficiency that the supplier claims: fault 1.
POINTS = [
    ("S1", "Main steam", 130.0, "absolute", 540.0, None, 428.0, "main_steam"),
    ("S2", "HP exhaust", 36.5, "absolute", 353.9, None, 428.0, "hp_exhaust"),
    ("S3", "Hot reheat", 33.6, "absolute", 540.0, None, 384.1, "hot_reheat"),
    ("S4", "IP extraction", 13.5, "absolute", 403.0, None, 25.5, "ip_extraction"),
    ("S5", "IP exhaust, crossover", 4.60, "absolute", 236.0, None, 358.6, "ip_exhaust"),
    ("S6", "LP extraction, upper", 1.05, "absolute", 124.5, None, 18.2, "lp_extraction_upper"),
    ("S7", "LP extraction, lower", 0.300, "absolute", None, 0.968, 17.2, "lp_extraction_lower"),
    ("S8", "LP exhaust", 0.050, "absolute", None, 0.912, 294.6, "lp_exhaust"),
    ("S9", "Condensate", 11.0, "gauge", 33.0, None, 330.0, "condensate"),
    ("S10", "Feed pump suction", 4.40, "gauge", 147.1, None, 428.0, "pump_suction"),
    ("S11", "Feed pump discharge", 164.0, "gauge", 149.7, None, 428.0, "pump_discharge"),
    ("S12", "Final feedwater", 154.0, "gauge", 241.9, None, 428.0, "final_feed"),
    ("S13", "Cooling water inlet", 2.00, "gauge", 18.0, None, 15570.0, "cooling_inlet"),
    ("S14", "Cooling water outlet", 1.40, "gauge", 28.0, None, 15570.0, "cooling_outlet"),
]

# key, name, value, unit, kind of quantity
PLANT = [
    ("ambient_pressure", "Ambient pressure", 1.013, "bar", "pressure"),
    ("fuel_flow", "Fuel, as fired", 51.6, "t/h", "flow"),
    ("higher_heating_value", "Higher heating value, as fired", 26.20, "MJ/kg", "enthalpy"),
    ("lower_heating_value", "Lower heating value, as fired", 25.05, "MJ/kg", "enthalpy"),
    ("gross_power", "Power at the generator terminals", 150.2, "MW", "power"),
    ("generator_losses", "Generator losses", 1980.0, "kW", "power"),
    ("mechanical_efficiency", "Mechanical efficiency", 0.995, None, "fraction"),
    ("feed_pump_motors", "Auxiliaries: feed pump motors", 2800.0, "kW", "power"),
    ("fans", "Auxiliaries: draught fans", 3100.0, "kW", "power"),
    ("mills", "Auxiliaries: mills", 900.0, "kW", "power"),
    ("cooling_pumps", "Auxiliaries: cooling water", 1600.0, "kW", "power"),
    ("gas_cleaning", "Auxiliaries: flue gas cleaning", 1500.0, "kW", "power"),
    ("other_auxiliaries", "Auxiliaries: all other", 900.0, "kW", "power"),
]
AUXILIARIES = 6  # so many at the end of the list above

# key, name, stated uncertainty, allowance where none is stated, unit. 95 % coverage.
UNCERTAINTIES = [
    ("u_pressure", "Pressures, of reading", 0.0025, None, None),
    ("u_vacuum", "LP exhaust pressure", 2.0, None, "mbar"),
    ("u_temperature", "Temperatures", 1.0, None, "K"),
    ("u_flow", "Steam, feed and cooling water flows", 0.006, None, None),
    ("u_extraction", "Extraction flows (calculated)", None, 0.05, None),
    ("u_dryness", "Dryness (calculated)", None, 0.004, "absolute"),
    ("u_fuel", "Fuel flow", 0.01, None, None),
    ("u_heating_value", "Heating values", None, 0.005, None),
    ("u_power", "Power at the terminals", 0.002, None, None),
    ("u_auxiliary", "Auxiliary power", None, 0.02, None),
    ("u_losses", "Generator losses", None, 0.10, None),
    ("u_mechanical", "Mechanical efficiency", None, 0.001, "absolute"),
]

NOT_NEEDED = "–"

# id, key, claim, value, unit, heating-value basis, boundary. None: the supplier states nothing.
# C11 is on the lower heating value whatever it says: fault 2. C12 is gross: fault 3.
CLAIMS = [
    ("C1", "hp", "HP stage efficiency", 0.878, None, NOT_NEEDED, NOT_NEEDED),
    ("C2", "ip", "IP stage efficiency", 0.920, None, NOT_NEEDED, NOT_NEEDED),
    ("C3", "lp", "LP stage efficiency", 0.872, None, NOT_NEEDED, NOT_NEEDED),
    ("C4", "pump", "Feed pump efficiency", 0.81, None, NOT_NEEDED, NOT_NEEDED),
    ("C5", "terminal", "Condenser terminal difference", 4.9, "K", NOT_NEEDED, NOT_NEEDED),
    ("C6", "rejected", "Heat given to cooling water", 181.0, "MW", NOT_NEEDED, NOT_NEEDED),
    ("C7", "generator", "Generator efficiency", 0.987, None, NOT_NEEDED, NOT_NEEDED),
    ("C8", "gross", "Gross output", None, "MW", NOT_NEEDED, "gross"),
    ("C9", "net", "Net output", 139.4, "MW", NOT_NEEDED, "net"),
    ("C10", "cycle", "Turbine heat rate", 7940.0, "kJ/kWh", NOT_NEEDED, None),
    ("C11", "boiler", "Boiler efficiency (losses)", 0.924, None, "LHV", NOT_NEEDED),
    ("C12", "unit", "Unit efficiency", 0.418, None, "HHV", "gross"),
    ("C13", "heat_rate", "Unit heat rate", 8610.0, "kJ/kWh", "LHV", "net"),
]

# name, low, high, key of the recomputed figure. Ranges met in the trade: common practice, no source.
TRADE_RANGES = [
    ("HP stage efficiency", 0.85, 0.92, "efficiency_hp"),
    ("IP stage efficiency", 0.90, 0.94, "efficiency_ip"),
    ("LP stage efficiency (dry)", 0.86, 0.91, "efficiency_lp"),
    ("Feed pump efficiency", 0.78, 0.86, "efficiency_pump"),
    ("Mechanical efficiency", 0.99, 0.996, "mechanical_efficiency"),
    ("Generator efficiency", 0.98, 0.991, "efficiency_generator"),
    ("Boiler efficiency, LHV, utility coal", 0.92, 0.95, "efficiency_boiler_lhv"),
    ("Auxiliary power of gross, coal", 0.05, 0.09, "auxiliary_share"),
    ("Net efficiency, LHV, subcritical coal", 0.35, 0.39, "efficiency_net_lhv"),
    ("Condenser terminal difference", 3.0, 5.0, "terminal_difference_kelvin"),
]

# What the model of the unit leaves out, for the reader of the sheet.
LEFT_OUT = (
    "One unit in steady state at one load. Shaft glands and valve stems leak nothing; no spray, no "
    "make-up, no blow-down; the steam to the deaerator leaves at the crossover; drains add nothing to "
    "the condenser.\n\n"
    "Steam that leaks from HP to IP inside one casing is not seen: it cools the IP exhaust and can lift "
    "the apparent IP efficiency by points (common practice, no source). Ask about it before drawing a conclusion.\n\n"
    "Boiler efficiency here is heat to the steam over fuel heat; a claim by the loss method also counts "
    "credits, such as the heat of the combustion air.\n\n"
    "Isentropic efficiency holds a wet stage against a wet ideal: moisture, leaving loss and packing "
    "are inside the figure.\n\n"
    "Readings are moved one by one and taken as independent; two readings of one instrument are not."
)

REMARKS = {
    "ambient_pressure": "site, long-term mean",
    "fuel_flow": "belt weigher",
    "higher_heating_value": "monthly composite",
    "lower_heating_value": "monthly composite",
    "generator_losses": "works test",
}

SHORT_NAMES = {
    "hp": "HP stage",
    "ip": "IP stage",
    "lp": "LP stage",
    "pump": "Feed pump",
    "terminal": "Terminal difference",
    "rejected": "Heat rejected",
    "generator": "Generator",
    "gross": "Gross output",
    "net": "Net output",
    "cycle": "Turbine heat rate",
    "boiler": "Boiler",
    "unit": "Unit efficiency",
    "heat_rate": "Unit heat rate",
}
