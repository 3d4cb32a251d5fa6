"""The invented generator, its test and its plant. Site, documents and every figure are made up.

The unit is the one of supplier-check.ods and steam-process.ods.
"""

SITE = "Marrowby Quay power station, unit 2"
TEST = "Generator by summation of losses, at the load of turbine test run 3"

CERTIFICATE = ("GC-88 generator certificate", "A")
RECORD = ("TR-2-0611 test record", "0")
TRANSFORMER = ("TX-31 transformer certificate", "B")
MOTORS = ("MS-14 motor schedule", "D")
CONTRACT = ("CT-02 generator guarantee", "1")

NONE = "–"

# block, then key, name, value, unit, number format, document, page
REGISTER = [
    (
        "Nameplate and guarantee",
        [
            ("rated_apparent_power", "Rated apparent power", 190.0, "MVA", "given", CERTIFICATE, "1"),
            ("rated_voltage", "Rated voltage, line to line", 15.75, "kV", "given", CERTIFICATE, "1"),
            ("rated_power_factor", "Rated power factor, lagging", 0.80, NONE, "ratio2", CERTIFICATE, "1"),
            ("rated_frequency", "Rated frequency", 50.0, "Hz", "given", CERTIFICATE, "1"),
            ("rated_speed", "Rated speed", 3000.0, "rpm", "given", CERTIFICATE, "1"),
            ("thermal_class", "Thermal class that losses are stated for", "B", NONE, None, CERTIFICATE, "1"),
            ("guaranteed_efficiency", "Guaranteed efficiency at rated load", 0.986, NONE, "percent2", CONTRACT, "4"),
        ],
    ),
    (
        "Works test of the generator",
        [
            ("friction_and_windage", "Friction and windage loss", 478.0, "kW", "given", CERTIFICATE, "3"),
            ("core_loss", "Core loss at rated voltage", 345.0, "kW", "given", CERTIFICATE, "3"),
            ("stray_load_loss", "Stray load loss at rated current", 260.0, "kW", "given", CERTIFICATE, "3"),
            ("excitation_loss", "Exciter and rectifier loss at rated load", 48.0, "kW", "given", CERTIFICATE, "4"),
            ("stator_resistance", "Stator resistance between two lines", 0.00447, "Ω", "volume", CERTIFICATE, "2"),
            ("field_resistance", "Field resistance", 0.142, "Ω", "dryness", CERTIFICATE, "2"),
            ("cold_temperature", "Winding temperature at these resistances", 21.0, "°C", "temperature", CERTIFICATE, "2"),
            ("no_load_field_current", "Field current at no load, rated voltage", 620.0, "A", "given", CERTIFICATE, "3"),
            ("rated_field_current", "Field current at rated load", 1610.0, "A", "given", CERTIFICATE, "4"),
        ],
    ),
    (
        "Readings of the run",
        [
            ("gross_power", "Power at the generator terminals", 150.2, "MW", "given", RECORD, "3"),
            ("line_voltage", "Voltage, line to line", 15.75, "kV", "given", RECORD, "3"),
            ("line_current", "Line current, mean of three", 6715.0, "A", "given", RECORD, "3"),
        ],
    ),
    (
        "Transformers",
        [
            ("step_up_rating", "Step-up transformer, rated apparent power", 200.0, "MVA", "given", TRANSFORMER, "1"),
            ("step_up_no_load", "Step-up transformer, no-load loss with cooling", 88.0, "kW", "given", TRANSFORMER, "2"),
            ("step_up_load", "Step-up transformer, load loss as measured", 430.0, "kW", "given", TRANSFORMER, "2"),
            ("step_up_resistance", "Part of it that is I²R", 372.0, "kW", "given", TRANSFORMER, "2"),
            ("step_up_measured_at", "Winding temperature of that measurement", 24.0, "°C", "temperature", TRANSFORMER, "2"),
            ("step_up_stated_at", "Temperature to which load loss is stated", 75.0, "°C", "temperature", TRANSFORMER, "1"),
            ("auxiliary_transformer", "Unit auxiliary transformer, losses at this load", 74.0, "kW", "given", TRANSFORMER, "5"),
            ("house_power_factor", "Power factor of the house load", 0.85, NONE, "ratio2", RECORD, "7"),
        ],
    ),
]

# motor, shaft power kW, rated power kW, stated efficiency or IE class, page
AUXILIARIES = [
    ("Feed pump A", 3640.0, 4000.0, 0.966, "1"),
    ("Feed pump B, standby", 0.0, 4000.0, 0.966, "1"),
    ("Condensate pump", 410.0, 450.0, 0.955, "1"),
    ("Cooling water pumps, both", 2180.0, 2600.0, 0.958, "2"),
    ("Forced-draught fan", 940.0, 1100.0, 0.957, "2"),
    ("Induced-draught fan", 1420.0, 1700.0, 0.960, "2"),
    ("Primary air fan", 610.0, 750.0, 0.956, "2"),
    ("Coal mills, three", 660.0, 315.0, "IE3", "3"),
    ("Closed cooling pumps, two", 150.0, 90.0, "IE3", "3"),
    ("Ash and dust plant", 220.0, 55.0, "IE2", "3"),
]

LOADS = [round(0.20 + 0.05 * step, 2) for step in range(19)]
POWER_FACTORS = [0.80, 0.90, 1.00]
