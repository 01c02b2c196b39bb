using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Readings;

/// <summary>Reads coils by themselves, away from the stage around them.</summary>
public static class CoilReader
{
    /// <summary>The coils among a stage's parts: coupled windings and lone inductors, in the order of the parts.</summary>
    /// <param name="parts">The parts of a stage.</param>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <param name="celsius">Temperature in °C, -100 to 200.</param>
    /// <returns>The reading; null where there is no coil.</returns>
    /// <exception cref="ArgumentOutOfRangeException">Frequency or temperature lies outside its range.</exception>
    public static CoilReading? TryRead(IReadOnlyList<Part> parts, double hz, double celsius)
    {
        Guard.Positive(hz, nameof(hz));
        CoilReading? whole = null;
        foreach (Part part in parts)
        {
            CoilReading? one = part switch
            {
                Windings windings => Read(windings.Name, windings.Model, hz, celsius) with
                {
                    EffectiveHeightMetre = windings.EffectiveHeightMetre(hz),
                },
                Inductor inductor => Lone(inductor, hz, celsius),
                _ => null,
            };
            whole = (whole, one) switch
            {
                (null, _) => one,
                (_, null) => whole,
                _ => whole with
                {
                    Windings = [.. whole.Windings, .. one.Windings],
                    Cautions = [.. whole.Cautions, .. one.Cautions],
                    EffectiveHeightMetre = whole.EffectiveHeightMetre ?? one.EffectiveHeightMetre,
                },
            };
        }

        return whole;
    }

    /// <summary>One coil of one or several windings.</summary>
    /// <param name="name">The builder's name of it.</param>
    /// <param name="model">The coil.</param>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <param name="celsius">Temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">Frequency or temperature lies outside its range.</exception>
    public static CoilReading Read(string name, IWindingModel model, double hz, double celsius)
    {
        Guard.Positive(hz, nameof(hz));
        int n = model.SectionCount;
        var ohm = new double[n * n];
        model.SeriesOhm(hz, celsius, ohm);
        var matrix = new double[n][];
        for (int row = 0; row < n; row++)
        {
            matrix[row] = new double[n];
            for (int column = 0; column < n; column++)
            {
                matrix[row][column] = model.Henry(row, column);
            }
        }

        WindingReading[] windings = [.. model.Windings.Select(span => Winding(name, span, matrix, ohm, hz))];
        return new CoilReading(hz, celsius, windings, matrix, [.. model.CautionsAt(hz)]);
    }

    private static WindingReading Winding(string name, in WindingSpan span, double[][] matrix, double[] ohm, double hz)
    {
        (double inductance, double resistance) = (0, 0);
        int end = span.FirstSection + span.SectionCount;
        for (int row = span.FirstSection; row < end; row++)
        {
            for (int column = span.FirstSection; column < end; column++)
            {
                inductance += matrix[row][column];
                resistance += ohm[(row * matrix.Length) + column];
            }
        }

        return new WindingReading(
            name,
            span.Turns > 0 ? span.Turns : null,
            inductance,
            resistance,
            Q(inductance, resistance, hz),
            span.SelfCapacitanceFarad > 0 ? span.SelfCapacitanceFarad : null,
            span.WireLengthMetre > 0 ? span.WireLengthMetre : null);
    }

    private static CoilReading Lone(Inductor inductor, double hz, double celsius)
    {
        double reactance = 2 * Math.PI * hz * inductor.Henry;
        double ohm = inductor.SeriesOhm + (inductor.Q is { } q ? reactance / q : 0);
        var winding = new WindingReading(inductor.Name, null, inductor.Henry, ohm, Q(inductor.Henry, ohm, hz), null, null);
        return new CoilReading(hz, celsius, [winding], [[inductor.Henry]], []);
    }

    private static double? Q(double henry, double ohm, double hz) => ohm > 0 ? 2 * Math.PI * hz * henry / ohm : null;
}
