"""The invented performance test of a reheat turbine. Site, documents and every figure are made up.

The unit is the one of supplier-check.ods; here its turbine was tested after the sheet was
questioned. The readings belong to a heat balance that closes, worked out once with another steam
library.
"""

SITE = "Marrowby Quay power station, unit 2"
TEST = "Turbine test at 100 % load, run 3"

RECORD = ("TR-2-0611 test record", "0")
BALANCE = ("HB-2-017 heat balance", "C")
CERTIFICATE = ("GC-88 generator certificate", "A")

NONE = "–"

# tag, name, key
POINTS = [
    ("S1", "Main steam", "main_steam"),
    ("S2", "HP exhaust", "hp_exhaust"),
    ("S3", "Hot reheat", "hot_reheat"),
    ("S4", "IP extraction", "ip_extraction"),
    ("S5", "IP exhaust, crossover", "ip_exhaust"),
    ("S6", "LP extraction, upper", "lp_extraction_upper"),
    ("S7", "LP extraction, lower", "lp_extraction_lower"),
    ("S8", "LP exhaust", "lp_exhaust"),
    ("S9", "Final feedwater", "final_feed"),
]

# point, quantity, value, unit, "gauge" or "absolute", document, page
READINGS = [
    ("main_steam", "pressure", 129.0, "bar", "gauge", RECORD, "4"),
    ("main_steam", "temperature", 540.0, "°C", NONE, RECORD, "4"),
    ("main_steam", "flow", 428.0, "t/h", NONE, RECORD, "5"),
    ("hp_exhaust", "pressure", 35.5, "bar", "gauge", RECORD, "4"),
    ("hp_exhaust", "temperature", 353.9, "°C", NONE, RECORD, "4"),
    ("hot_reheat", "pressure", 32.6, "bar", "gauge", RECORD, "4"),
    ("hot_reheat", "temperature", 540.0, "°C", NONE, RECORD, "4"),
    ("hot_reheat", "flow", 384.1, "t/h", NONE, BALANCE, "2"),
    ("ip_extraction", "pressure", 12.5, "bar", "gauge", RECORD, "4"),
    ("ip_extraction", "temperature", 403.0, "°C", NONE, RECORD, "4"),
    ("ip_extraction", "flow", 25.5, "t/h", NONE, BALANCE, "2"),
    ("ip_exhaust", "pressure", 3.59, "bar", "gauge", RECORD, "4"),
    ("ip_exhaust", "temperature", 267.7, "°C", NONE, RECORD, "4"),
    ("lp_extraction_upper", "pressure", 1.05, "bar", "absolute", RECORD, "6"),
    ("lp_extraction_upper", "temperature", 124.5, "°C", NONE, RECORD, "6"),
    ("lp_extraction_upper", "flow", 18.2, "t/h", NONE, BALANCE, "2"),
    ("lp_extraction_lower", "pressure", 0.300, "bar", "absolute", RECORD, "6"),
    ("lp_extraction_lower", "dryness", 0.968, "kg/kg", NONE, BALANCE, "3"),
    ("lp_extraction_lower", "flow", 17.2, "t/h", NONE, BALANCE, "2"),
    ("lp_exhaust", "pressure", 50.0, "mbar", "absolute", RECORD, "6"),
    ("lp_exhaust", "flow", 294.6, "t/h", NONE, BALANCE, "2"),
    ("final_feed", "pressure", 154.0, "bar", "gauge", RECORD, "5"),
    ("final_feed", "temperature", 241.9, "°C", NONE, RECORD, "5"),
]

# key, name, value, unit, document, page
PLANT = [
    ("ambient_pressure", "Ambient pressure", 1013.0, "mbar", RECORD, "3"),
    ("gross_power", "Power at the generator terminals", 150.2, "MW", RECORD, "3"),
    ("generator_losses", "Generator losses at this load", 1980.0, "kW", CERTIFICATE, "2"),
    ("mechanical_efficiency", "Mechanical efficiency", 0.995, NONE, BALANCE, "4"),
]

# section, inlet, outlet, flow
SECTIONS = [
    ("HP", "main_steam", "hp_exhaust", "main_steam_flow"),
    ("IP before the extraction", "hot_reheat", "ip_extraction", "hot_reheat_flow"),
    ("IP after the extraction", "ip_extraction", "ip_exhaust", "hot_reheat_flow-ip_extraction_flow"),
    (
        "LP, first",
        "ip_exhaust",
        "lp_extraction_upper",
        "lp_extraction_upper_flow+lp_extraction_lower_flow+lp_exhaust_flow",
    ),
    (
        "LP, second",
        "lp_extraction_upper",
        "lp_extraction_lower",
        "lp_extraction_lower_flow+lp_exhaust_flow",
    ),
]
LAST_SECTION = ("LP, last", "lp_extraction_lower", "lp_exhaust", "lp_exhaust_flow")

# stage, key, inlet, outlet
STAGES = [
    ("HP stage", "hp", "main_steam", "hp_exhaust"),
    ("IP stage", "ip", "hot_reheat", "ip_exhaust"),
    ("LP stage", "lp", "ip_exhaust", "lp_exhaust"),
]
