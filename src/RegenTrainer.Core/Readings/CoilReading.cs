using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Readings;

/// <summary>One winding of a coil from end to end.</summary>
/// <param name="Name">The builder's name of the part it belongs to.</param>
/// <param name="Turns">Number of turns; null where it is not known.</param>
/// <param name="InductanceHenry">Inductance in henry.</param>
/// <param name="ResistanceOhm">Loss resistance in series at the frequency of the reading, in ohm.</param>
/// <param name="Q">2 pi f L/R; null where there is no loss.</param>
/// <param name="SelfCapacitanceFarad">Capacitance across the winding in farad; null where none is known.</param>
/// <param name="WireLengthMetre">Length of wire in metre; null where it is not known.</param>
public sealed record WindingReading(
    string Name,
    int? Turns,
    double InductanceHenry,
    double ResistanceOhm,
    double? Q,
    double? SelfCapacitanceFarad,
    double? WireLengthMetre);

/// <summary>A coil's own figures at one frequency; those of the coil as a whole are those of its first winding.</summary>
/// <param name="AtHz">Frequency in Hz, above 0.</param>
/// <param name="TemperatureCelsius">Temperature in °C.</param>
/// <param name="Windings">Every winding, at least one: first those of the coil itself, then those of further coils of the stage.</param>
/// <param name="MatrixHenry">Inductance matrix of the coil's sections between taps, in henry, row by row.</param>
/// <param name="Cautions">What lies outside a method's range.</param>
public sealed record CoilReading(
    double AtHz,
    double TemperatureCelsius,
    IReadOnlyList<WindingReading> Windings,
    IReadOnlyList<IReadOnlyList<double>> MatrixHenry,
    IReadOnlyList<Caution> Cautions)
{
    /// <summary>Electromotive force over field in metre, where the coil itself is the antenna; null elsewhere.</summary>
    public double? EffectiveHeightMetre { get; init; }
}
