namespace RegenTrainer.Core.Devices;

/// <summary>What the junction of a diode is made of: it decides the temperature law and the shape of its capacitance.</summary>
public enum JunctionMaterial
{
    /// <summary>A junction in silicon.</summary>
    Silicon,

    /// <summary>A point contact on germanium, or a junction in it.</summary>
    Germanium,

    /// <summary>A metal on silicon.</summary>
    Schottky,
}

/// <summary>A type of diode as its device file states it; figures hold at 25 °C.</summary>
/// <param name="Name">Registered type.</param>
/// <param name="Material">What its junction is made of.</param>
/// <param name="SaturationCurrent">Saturation current in ampere.</param>
/// <param name="EmissionCoefficient">Emission coefficient, a pure number from 1: what the thermal voltage is multiplied by.</param>
/// <param name="SeriesResistance">Series resistance in ohm.</param>
/// <param name="Capacitance">Capacitance in farad at a reverse voltage in volt; no condition means without bias.</param>
public sealed record DiodeModel(
    string Name,
    JunctionMaterial Material,
    DeviceFigure SaturationCurrent,
    DeviceFigure EmissionCoefficient,
    DeviceFigure SeriesResistance,
    DeviceFigure Capacitance) : DeviceModel(Name)
{
    /// <summary>Limits; null where none are stated.</summary>
    public DiodeRating? Rating { get; init; }

    /// <inheritdoc/>
    public override DeviceKind Kind => DeviceKind.Diode;

    /// <inheritdoc/>
    public override DiodeLaw LawAt(Grade grade, double temperatureCelsius) => new(this, grade, temperatureCelsius);

    /// <inheritdoc/>
    public override double LeadOhm(Grade grade) => SeriesResistance.FallingWith(grade);
}

/// <summary>Limits a diode must not exceed.</summary>
/// <param name="ReverseVolt">Largest reverse voltage in volt; null where unknown.</param>
/// <param name="ForwardAmpere">Largest forward current in ampere; null where unknown.</param>
public sealed record DiodeRating(double? ReverseVolt, double? ForwardAmpere);
