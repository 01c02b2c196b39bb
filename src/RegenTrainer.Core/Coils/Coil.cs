using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>
/// An air-cored coil of copper wire: one or several single-layer windings on one axis, from their geometry. All windings
/// run the same way round. Figures of the coil as a whole are those of its first winding from end to end.
/// </summary>
public sealed class Coil : IWindingModel
{
    // A measured Q is taken as measured in a room.
    private const double MeasuringCelsius = 20.0;

    private readonly Winding[] _windings;
    private readonly WindingSpan[] _spans;
    private readonly double[] _selfCapacitanceFarad;
    private readonly double[] _proximityFactors;
    private readonly double[] _henry;
    private readonly double[] _wireMetre;
    private readonly double[] _wireSquareMetre;
    private readonly double _formLossPerOhm;
    private readonly double _lossScale;
    private readonly bool _lossMeasured;

    /// <summary>Computes a coil of one winding.</summary>
    /// <param name="winding">The winding.</param>
    /// <param name="formLossQ">Q that the loss of form and insulation alone would leave, 1 to 1e6; no such loss when left out.</param>
    /// <param name="measured">Q of the coil measured at a frequency in Hz at 20 °C, each above 0; it scales all losses.</param>
    /// <param name="distribution">How the current fills the wire.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    public Coil(
        Winding winding,
        double? formLossQ = null,
        (double Q, double AtHz)? measured = null,
        CurrentDistribution distribution = CurrentDistribution.Surface)
        : this([winding], formLossQ, measured, distribution)
    {
    }

    /// <summary>Computes a coil of several windings on one axis.</summary>
    /// <param name="windings">The windings, at least one, nowhere touching each other.</param>
    /// <param name="formLossQ">Q that the loss of form and insulation alone would leave, 1 to 1e6; no such loss when left out.</param>
    /// <param name="measured">Q of the first winding, end to end, measured at a frequency in Hz at 20 °C, each above 0; it scales all losses.</param>
    /// <param name="distribution">How the current fills the wire.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    /// <exception cref="ArgumentException">There is no winding, or turns of two windings lie in the same place.</exception>
    public Coil(
        IReadOnlyList<Winding> windings,
        double? formLossQ = null,
        (double Q, double AtHz)? measured = null,
        CurrentDistribution distribution = CurrentDistribution.Surface)
    {
        ArgumentNullException.ThrowIfNull(windings);
        _windings = [.. windings];
        if (_windings.Length == 0 || Array.Exists(_windings, winding => winding is null))
        {
            throw new ArgumentException("A coil has at least one winding.", nameof(windings));
        }

        _spans = new WindingSpan[_windings.Length];
        _proximityFactors = new double[_windings.Length];
        for (int index = 0; index < _windings.Length; index++)
        {
            Winding winding = _windings[index];
            bool alone = winding.Turns == 1;
            _spans[index] = new WindingSpan(
                SectionCount, winding.SectionCount, alone ? 0.0 : SelfCapacitance(winding), winding.WireLengthMetre, winding.Turns);
            _proximityFactors[index] =
                alone ? 1.0 : MedhurstTables.ProximityFactor(Math.Min(1.0, winding.WireOverPitch), winding.LengthOverDiameter);
            SectionCount += winding.SectionCount;
        }

        _selfCapacitanceFarad = Array.ConvertAll(_spans, span => span.SelfCapacitanceFarad);
        _henry = InductanceMatrix(distribution);
        _wireMetre = new double[SectionCount];
        _wireSquareMetre = new double[SectionCount];
        MeasureWire();
        TotalHenry = SumOverFirst(_henry);
        (FormLossQ, MeasuredQ) = (formLossQ, measured);
        _formLossPerOhm = formLossQ is { } loss ? 1.0 / Guard.InRange(loss, 1.0, 1e6, nameof(formLossQ)) : 0.0;
        _lossScale = 1.0;
        if (measured is { } found)
        {
            double q = Guard.Positive(found.Q, nameof(measured));
            double hz = Guard.Positive(found.AtHz, nameof(measured));
            _lossScale = Q(hz, MeasuringCelsius) / q;
            _lossMeasured = true;
        }
    }

    /// <summary>Q that the loss of form and insulation alone would leave; null for no such loss.</summary>
    public double? FormLossQ { get; }

    /// <summary>The measured Q that scales all losses, with its frequency in Hz; null for computed losses.</summary>
    public (double Q, double AtHz)? MeasuredQ { get; }

    /// <inheritdoc/>
    public int SectionCount { get; }

    /// <inheritdoc/>
    public IReadOnlyList<WindingSpan> Windings => _spans;

    /// <inheritdoc/>
    public IReadOnlyList<double> SelfCapacitanceFarad => _selfCapacitanceFarad;

    /// <summary>The windings the coil was computed from.</summary>
    public IReadOnlyList<Winding> Geometry => _windings;

    /// <summary>Inductance of the first winding from end to end in H.</summary>
    public double TotalHenry { get; }

    /// <summary>Length of wire in the first winding in m.</summary>
    public double WireLengthMetre => _spans[0].WireLengthMetre;

    /// <inheritdoc/>
    public double Henry(int i, int j)
    {
        int row = Guard.InRange(i, 0, SectionCount - 1, nameof(i));
        int column = Guard.InRange(j, 0, SectionCount - 1, nameof(j));
        return _henry[(row * SectionCount) + column];
    }

    /// <inheritdoc/>
    public double DcOhm(int section, double temperatureCelsius)
    {
        int index = Guard.InRange(section, 0, SectionCount - 1, nameof(section));
        return _wireMetre[index] / (PhysicalConstants.CopperConductivityAt(temperatureCelsius) * _wireSquareMetre[index]);
    }

    /// <summary>
    /// Fills in the loss-resistance matrix: the loss of the wire [Butterworth 1925, Medhurst 1947] on the diagonal, by its length;
    /// that of form and insulation as 2 pi f L/Q over the whole matrix; all of it scaled where a Q was measured.
    /// </summary>
    /// <inheritdoc/>
    public void SeriesOhm(double hz, double temperatureCelsius, Span<double> matrix)
    {
        double frequency = Guard.NotNegative(hz, nameof(hz));
        if (matrix.Length != _henry.Length)
        {
            throw new ArgumentException($"The matrix needs room for {_henry.Length} elements, not {matrix.Length}.", nameof(matrix));
        }

        double formScale = _lossScale * 2.0 * Math.PI * frequency * _formLossPerOhm;
        for (int element = 0; element < matrix.Length; element++)
        {
            matrix[element] = formScale * _henry[element];
        }

        for (int index = 0; index < _spans.Length; index++)
        {
            WindingSpan span = _spans[index];
            double ratio = _lossScale * ResistanceRatio(index, frequency, temperatureCelsius);
            for (int section = span.FirstSection; section < span.FirstSection + span.SectionCount; section++)
            {
                matrix[(section * SectionCount) + section] += ratio * DcOhm(section, temperatureCelsius);
            }
        }
    }

    /// <summary>Loss resistance of the first winding from end to end in ohm.</summary>
    /// <param name="hz">Frequency in Hz, 0 or more.</param>
    /// <param name="temperatureCelsius">Temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside its range.</exception>
    public double OhmAt(double hz, double temperatureCelsius)
    {
        double frequency = Guard.NotNegative(hz, nameof(hz));
        double direct = 0.0;
        for (int section = 0; section < _spans[0].SectionCount; section++)
        {
            direct += DcOhm(section, temperatureCelsius);
        }

        double wire = direct * ResistanceRatio(0, frequency, temperatureCelsius);
        return _lossScale * (wire + (2.0 * Math.PI * frequency * TotalHenry * _formLossPerOhm));
    }

    /// <summary>Q of the first winding from end to end, 2 pi f L/R, its self-capacitance left out.</summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <param name="temperatureCelsius">Temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument lies outside its range.</exception>
    public double Q(double hz, double temperatureCelsius)
    {
        double frequency = Guard.Positive(hz, nameof(hz));
        return 2.0 * Math.PI * frequency * TotalHenry / OhmAt(frequency, temperatureCelsius);
    }

    /// <inheritdoc/>
    public IReadOnlyList<Caution> CautionsAt(double hz) =>
        CoilCautions.Collect(_windings, Guard.NotNegative(hz, nameof(hz)), !_lossMeasured);

    private static double SelfCapacitance(Winding winding) =>
        MedhurstTables.SelfCapacitanceFarad(winding.LengthOverDiameter, 2.0 * winding.RadiusMetre);

    private double ResistanceRatio(int winding, double hz, double temperatureCelsius)
    {
        double radius = 0.5 * _windings[winding].Wire.BareDiameterMetre;
        return WireLoss.Ratio(WireLoss.RadiusOverSkinDepth(radius, hz, temperatureCelsius), _proximityFactors[winding]);
    }

    private double[] InductanceMatrix(CurrentDistribution distribution)
    {
        double[] matrix = new double[SectionCount * SectionCount];
        for (int row = 0; row < _windings.Length; row++)
        {
            TurnSums.Fill(_windings[row], _windings[row], distribution, matrix, SectionCount, _spans[row].FirstSection, _spans[row].FirstSection);
            for (int column = row + 1; column < _windings.Length; column++)
            {
                TurnSums.Fill(
                    _windings[row], _windings[column], distribution, matrix, SectionCount, _spans[row].FirstSection, _spans[column].FirstSection);
            }
        }

        // Above the diagonal was summed; below is the same by reciprocity.
        for (int row = 0; row < SectionCount; row++)
        {
            for (int column = 0; column < row; column++)
            {
                matrix[(row * SectionCount) + column] = matrix[(column * SectionCount) + row];
            }
        }

        return matrix;
    }

    private void MeasureWire()
    {
        for (int index = 0; index < _windings.Length; index++)
        {
            Winding winding = _windings[index];
            double diameter = winding.Wire.BareDiameterMetre;
            for (int section = 0; section < winding.SectionCount; section++)
            {
                int turns = winding.FirstTurn(section + 1) - winding.FirstTurn(section);
                _wireMetre[_spans[index].FirstSection + section] = turns * winding.TurnLengthMetre;
                _wireSquareMetre[_spans[index].FirstSection + section] = 0.25 * Math.PI * diameter * diameter;
            }
        }
    }

    private double SumOverFirst(double[] matrix)
    {
        double sum = 0.0;
        for (int row = 0; row < _spans[0].SectionCount; row++)
        {
            for (int column = 0; column < _spans[0].SectionCount; column++)
            {
                sum += matrix[(row * SectionCount) + column];
            }
        }

        return sum;
    }
}
