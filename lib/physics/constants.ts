// Physical constants of the model: each with its unit and source. One set for every use.

/** Stefan-Boltzmann constant. [W m⁻² K⁻⁴] CODATA 2018. */
export const STEFAN_BOLTZMANN = 5.670374e-8
/** 0 °C in kelvin. [K] */
export const ZERO_CELSIUS_K = 273.15
/** Enthalpy of fusion at 0 °C. [J/kg] CRC Handbook; IAPWS R10-06 with IAPWS-95 gives 333.43e3, Ashton takes 334e3. */
export const FUSION_J_PER_KG = 333_600
/** Enthalpy of vaporisation at 0 °C. [J/kg] FAO-56 and meteorological practice. */
export const VAPORISATION_J_PER_KG = 2.501e6
/** Enthalpy of sublimation at 0 °C: vaporisation plus fusion. [J/kg] CRC Handbook prints 2.838e6. */
export const SUBLIMATION_J_PER_KG = VAPORISATION_J_PER_KG + FUSION_J_PER_KG
/** Density of ice at 0 °C. [kg/m³] IAPWS R10-06. */
export const ICE_DENSITY = 916.721
/** Density of liquid water near 0 °C, so that 1 mm is 1 kg/m². [kg/m³] IAPWS SR6-08: 999.8, rounded. */
export const WATER_DENSITY = 1000
/** Heat capacity of ice near 0 °C. [J kg⁻¹ K⁻¹] IAPWS R10-06. */
export const ICE_HEAT_CAPACITY = 2096.71
/** Heat capacity of liquid water between 0 and 10 °C. [J kg⁻¹ K⁻¹] IAPWS SR6-08: 4.22e3 at 0, 4.19e3 at 10 °C. */
export const WATER_HEAT_CAPACITY = 4200
/** Conductivity of ice near 0 °C. [W m⁻¹ K⁻¹] Ashton, Encyclopaedia Britannica "Ice in lakes and rivers": 2.24. */
export const ICE_CONDUCTIVITY = 2.24
/** Conductivity of liquid water near 0 °C. [W m⁻¹ K⁻¹] IAPWS; 0.56. */
export const WATER_CONDUCTIVITY = 0.56
/** Heat capacity of air. [J kg⁻¹ K⁻¹] */
export const AIR_HEAT_CAPACITY = 1005
/** Gas constant of dry air. [J kg⁻¹ K⁻¹] WMO-No. 8. */
export const DRY_AIR_GAS_CONSTANT = 287.05
/** Ratio of the molar masses of water and dry air. [-] */
export const VAPOUR_MASS_RATIO = 0.622
/** Acceleration of gravity. [m/s²] */
export const GRAVITY = 9.81
/** Infrared emissivity of water and ice. [-] Usual value; see scoring rule of the heat balance. */
export const SURFACE_EMISSIVITY = 0.97
/** Air pressure where none is reported. [hPa] ICAO standard atmosphere at sea level. */
export const STANDARD_PRESSURE_HPA = 1013.25
/** Seconds in the model's hour. [s] */
export const HOUR_SECONDS = 3600
/** The same and its parts, for instants counted in milliseconds. [ms] By definition. */
export const HOUR_MILLIS = 3_600_000
export const MINUTE_MILLIS = 60_000
export const DAY_MILLIS = 24 * HOUR_MILLIS
