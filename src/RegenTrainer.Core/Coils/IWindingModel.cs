using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>The sections that make up one winding, end to end.</summary>
/// <param name="FirstSection">Index of the section at the winding's start.</param>
/// <param name="SectionCount">Number of sections in series, 1 or more.</param>
/// <param name="SelfCapacitanceFarad">Capacitance across the whole winding in F; 0 where it has none or none is stated.</param>
/// <param name="WireLengthMetre">Length of wire in m; 0 where it is not known.</param>
/// <param name="Turns">Number of turns; 0 where it is not known.</param>
public readonly record struct WindingSpan(
    int FirstSection, int SectionCount, double SelfCapacitanceFarad, double WireLengthMetre, int Turns);

/// <summary>
/// Coupled inductive sections, as a circuit sees them: a section is what lies between neighbouring taps. All sections
/// point the same way round the axis, so a winding's inductance is the plain sum over its part of the matrix.
/// </summary>
public interface IWindingModel
{
    /// <summary>Number of sections, all windings together.</summary>
    int SectionCount { get; }

    /// <summary>The windings in order; their sections follow one another without a gap.</summary>
    IReadOnlyList<WindingSpan> Windings { get; }

    /// <summary>Capacitance across each winding in F, in the order of <see cref="Windings"/>; 0 where none.</summary>
    IReadOnlyList<double> SelfCapacitanceFarad { get; }

    /// <summary>Element of the inductance matrix in H; the matrix is symmetric and positive definite.</summary>
    /// <param name="i">Row, 0 to <see cref="SectionCount"/> - 1.</param>
    /// <param name="j">Column, 0 to <see cref="SectionCount"/> - 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is no such section.</exception>
    double Henry(int i, int j);

    /// <summary>Resistance of a section to direct current in ohm.</summary>
    /// <param name="section">0 to <see cref="SectionCount"/> - 1.</param>
    /// <param name="temperatureCelsius">Temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is no such section, or the temperature lies outside that range.</exception>
    double DcOhm(int section, double temperatureCelsius);

    /// <summary>Fills in the loss-resistance matrix at a frequency in ohm, by rows; it is symmetric and never negative as a quadratic form.</summary>
    /// <param name="hz">Frequency in Hz, 0 or more.</param>
    /// <param name="temperatureCelsius">Temperature in °C, -100 to 200.</param>
    /// <param name="matrix">Room for exactly <see cref="SectionCount"/> squared elements; all are overwritten.</param>
    /// <exception cref="ArgumentOutOfRangeException">Frequency or temperature lies outside its range.</exception>
    /// <exception cref="ArgumentException">The room has another size.</exception>
    void SeriesOhm(double hz, double temperatureCelsius, Span<double> matrix);

    /// <summary>What lies outside the range its method was checked for, at a frequency.</summary>
    /// <param name="hz">Frequency in Hz, 0 or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is negative or not finite.</exception>
    IReadOnlyList<Caution> CautionsAt(double hz);
}
