using System.Globalization;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>
/// A tapped winding on a rod or ring: its inductance is the core's factor times turns squared, its loss that of a measured Q. One
/// coupling factor holds between all sections, and the whole winding has the factor times turns squared whatever the taps are.
/// </summary>
public sealed class CoredCoil : IWindingModel
{
    /// <summary>Coupling between sections of a winding on a rod, from memory.</summary>
    public const double UsualRodCoupling = 0.90;

    /// <summary>Coupling between sections of a winding on a ring, from memory.</summary>
    public const double UsualRingCoupling = 0.99;

    // A measured Q is taken as measured in a room.
    private const double MeasuringCelsius = 20.0;

    // Core and winding losses change over an octave by more than a measured figure is worth.
    private const double MostRatio = 2.0;

    private readonly CoupledSections _sections;
    private readonly double[] _ohmAtMeasuring;

    /// <summary>Computes a coil on a core.</summary>
    /// <param name="henryPerTurnSquared">Inductance factor of the core, A_L, in H, above 0.</param>
    /// <param name="turns">Turns of the whole winding, 1 to 5000.</param>
    /// <param name="tapTurns">Taps as turns from the start, strictly increasing, each 1 to <paramref name="turns"/> - 1; at most 64.</param>
    /// <param name="sectionCoupling">Coupling between any two sections, 0 to below 1.</param>
    /// <param name="measured">Q of the whole winding measured at a frequency in Hz at 20 °C, each above 0.</param>
    /// <param name="selfCapacitanceFarad">Capacitance across the winding in F, 0 or more.</param>
    /// <param name="wire">Copper wire and the length of a turn of it; null where its resistance does not matter.</param>
    /// <exception cref="ArgumentException">A value lies outside its range, or the wire alone has more loss than the measured Q.</exception>
    public CoredCoil(
        double henryPerTurnSquared,
        int turns,
        IReadOnlyList<int> tapTurns,
        double sectionCoupling,
        (double Q, double AtHz) measured,
        double selfCapacitanceFarad = 0.0,
        TurnWire? wire = null)
    {
        HenryPerTurnSquared = Guard.Positive(henryPerTurnSquared, nameof(henryPerTurnSquared));
        Turns = Guard.InRange(turns, 1, Winding.MostTurns, nameof(turns));
        TapTurns = Winding.CheckedTaps(tapTurns, turns);
        SectionCoupling = Guard.InRange(sectionCoupling, 0.0, Math.BitDecrement(1.0), nameof(sectionCoupling));
        MeasuredQ = (Guard.Positive(measured.Q, nameof(measured)), Guard.Positive(measured.AtHz, nameof(measured)));
        Wire = wire;
        int[] sectionTurns = [.. TapTurns.Append(turns).Zip(TapTurns.Prepend(0), (end, start) => end - start)];
        _ohmAtMeasuring = [.. sectionTurns.Select(count => count * (wire?.OhmPerTurn(MeasuringCelsius) ?? 0.0))];
        double henry = henryPerTurnSquared * turns * turns;
        double share = _ohmAtMeasuring.Sum() / (2.0 * Math.PI * measured.AtHz * henry / measured.Q);
        double q = share < 1.0
            ? measured.Q / (1.0 - share)
            : throw new ArgumentException("The wire alone has more loss than the measured Q leaves.", nameof(measured));
        SectionTurns = sectionTurns;
        _sections = CoupledSections.OnCore(henryPerTurnSquared, sectionTurns, sectionCoupling, q, selfCapacitanceFarad);
        Windings = [.. _sections.Windings.Select(span => span with { WireLengthMetre = turns * (wire?.TurnLengthMetre ?? 0.0) })];
    }

    /// <summary>Inductance factor of the core, A_L, in H.</summary>
    public double HenryPerTurnSquared { get; }

    /// <summary>Turns of the whole winding.</summary>
    public int Turns { get; }

    /// <summary>Taps as turns from the start, increasing.</summary>
    public IReadOnlyList<int> TapTurns { get; }

    /// <summary>Turns of each section.</summary>
    public IReadOnlyList<int> SectionTurns { get; }

    /// <summary>Coupling between any two sections.</summary>
    public double SectionCoupling { get; }

    /// <summary>The measured Q of the whole winding, with its frequency in Hz.</summary>
    public (double Q, double AtHz) MeasuredQ { get; }

    /// <summary>The wire; null where it is not known.</summary>
    public TurnWire? Wire { get; }

    /// <inheritdoc/>
    public int SectionCount => _sections.SectionCount;

    /// <inheritdoc/>
    public IReadOnlyList<WindingSpan> Windings { get; }

    /// <inheritdoc/>
    public IReadOnlyList<double> SelfCapacitanceFarad => _sections.SelfCapacitanceFarad;

    /// <inheritdoc/>
    public double Henry(int i, int j) => _sections.Henry(i, j);

    /// <inheritdoc/>
    public double DcOhm(int section, double temperatureCelsius)
    {
        int index = Guard.InRange(section, 0, SectionCount - 1, nameof(section));
        double warm = PhysicalConstants.CopperConductivityAt(MeasuringCelsius) / PhysicalConstants.CopperConductivityAt(temperatureCelsius);
        return _ohmAtMeasuring[index] * warm;
    }

    /// <summary>
    /// Fills in the loss-resistance matrix: the wire's resistance to direct current on the diagonal, and the rest of the measured
    /// loss as a constant loss tangent of the shared field.
    /// </summary>
    /// <inheritdoc/>
    public void SeriesOhm(double hz, double temperatureCelsius, Span<double> matrix)
    {
        _sections.SeriesOhm(hz, temperatureCelsius, matrix);
        for (int section = 0; section < SectionCount; section++)
        {
            matrix[(section * SectionCount) + section] += DcOhm(section, temperatureCelsius);
        }
    }

    /// <inheritdoc/>
    public IReadOnlyList<Caution> CautionsAt(double hz)
    {
        double ratio = Guard.NotNegative(hz, nameof(hz)) / MeasuredQ.AtHz;
        return ratio is >= 1.0 / MostRatio and <= MostRatio ? [] :
        [
            new Caution(
                "core-q-far",
                string.Create(
                    CultureInfo.InvariantCulture,
                    $"The Q of the winding on its core was measured at {MeasuredQ.AtHz / 1000.0:0.###} kHz; {hz / 1000.0:0.###} kHz is over an octave away.")),
        ];
    }
}
