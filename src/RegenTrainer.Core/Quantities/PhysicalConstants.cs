namespace RegenTrainer.Core.Quantities;

/// <summary>Constants of nature (CODATA 2018) and of standard annealed copper (IEC 60028:1925).</summary>
public static class PhysicalConstants
{
    /// <summary>Boltzmann constant in J/K, exact since the SI of 2019.</summary>
    public const double Boltzmann = 1.380649e-23;

    /// <summary>Elementary charge in C, exact since the SI of 2019.</summary>
    public const double ElementaryCharge = 1.602176634e-19;

    /// <summary>Magnetic constant in H/m (CODATA 2018).</summary>
    public const double VacuumPermeability = 1.25663706212e-6;

    /// <summary>Electric constant in F/m (CODATA 2018).</summary>
    public const double VacuumPermittivity = 8.8541878128e-12;

    /// <summary>Speed of light in vacuum in m/s, exact.</summary>
    public const double SpeedOfLight = 299792458.0;

    /// <summary>Kelvin at 0 °C, exact.</summary>
    public const double ZeroCelsius = 273.15;

    /// <summary>Conductivity of standard annealed copper at 20 °C in S/m (IEC 60028).</summary>
    public const double CopperConductivity = 58.0e6;

    /// <summary>Rise of the resistance of standard annealed copper per kelvin, referred to 20 °C (IEC 60028).</summary>
    public const double CopperTemperatureCoefficient = 0.00393;

    /// <summary>Thermal voltage kT/q in V.</summary>
    /// <param name="temperatureCelsius">Temperature in °C, absolute zero to 1000.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature lies outside that range.</exception>
    public static double ThermalVoltage(double temperatureCelsius)
    {
        double celsius = Guard.InRange(temperatureCelsius, -ZeroCelsius, 1000.0, nameof(temperatureCelsius));
        return Boltzmann * (celsius + ZeroCelsius) / ElementaryCharge;
    }

    /// <summary>Conductivity of standard annealed copper in S/m at a temperature, by the linear law of IEC 60028.</summary>
    /// <param name="temperatureCelsius">Temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature lies outside that range.</exception>
    public static double CopperConductivityAt(double temperatureCelsius)
    {
        double celsius = Guard.InRange(temperatureCelsius, -100.0, 200.0, nameof(temperatureCelsius));
        return CopperConductivity / (1.0 + (CopperTemperatureCoefficient * (celsius - 20.0)));
    }
}
