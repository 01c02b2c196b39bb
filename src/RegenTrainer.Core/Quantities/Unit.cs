namespace RegenTrainer.Core.Quantities;

/// <summary>What a number measures. Every value is held in the SI unit, except as said below.</summary>
public enum Unit
{
    /// <summary>A plain number: a ratio, a count of turns, a quality factor.</summary>
    None,

    /// <summary>Resistance, reactance or impedance.</summary>
    Ohm,

    /// <summary>Capacitance.</summary>
    Farad,

    /// <summary>Inductance.</summary>
    Henry,

    /// <summary>Frequency or bandwidth.</summary>
    Hertz,

    /// <summary>Voltage.</summary>
    Volt,

    /// <summary>Current.</summary>
    Ampere,

    /// <summary>Power.</summary>
    Watt,

    /// <summary>Length.</summary>
    Metre,

    /// <summary>Temperature in degrees Celsius, not kelvin.</summary>
    Celsius,

    /// <summary>A share in percent: five percent is 5, not 0.05.</summary>
    Percent,

    /// <summary>An angle in degrees, not radian.</summary>
    Degree,

    /// <summary>Time.</summary>
    Second,

    /// <summary>Conductance, admittance or transconductance.</summary>
    Siemens,

    /// <summary>A level or gain in decibels.</summary>
    Decibel,

    /// <summary>Charge of a battery in ampere-hours, not coulomb.</summary>
    AmpereHour,
}
