using System.Numerics;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Selectivity;

/// <summary>
/// What the selectivity leaves of a station's programme: both sidebands relative to the carrier, and what an ideal envelope
/// detector hears of them at small depth, (S+ + conj S-)/2.
/// </summary>
public readonly record struct SidebandResponse
{
    /// <summary>Depth of modulation at which distortion is looked at: the 30 % of receiver tests (IEC 60315, from memory).</summary>
    public const double TestDepth = 0.3;

    private readonly Transfer _transfer;

    /// <summary>Looks at a station through the stage in the workspace.</summary>
    /// <param name="ws">Workspace with the pencil of the setting.</param>
    /// <param name="stationHz">Carrier in Hz, above 0.</param>
    public SidebandResponse(StageWorkspace ws, double stationHz)
    {
        _transfer = new Transfer(ws);
        StationHz = stationHz;
        Carrier = _transfer.At(stationHz);
    }

    /// <summary>The carrier in Hz.</summary>
    public double StationHz { get; }

    /// <summary>Response at the carrier, output volt per volt of electromotive force.</summary>
    public Complex Carrier { get; }

    /// <summary>How one audio frequency fares.</summary>
    /// <param name="audioHz">Audio frequency in Hz, from 0, below the carrier.</param>
    public Sideband At(double audioHz)
    {
        Complex upper = _transfer.At(StationHz + audioHz) / Carrier, lower = _transfer.At(StationHz - audioHz) / Carrier;
        return new Sideband(
            audioHz,
            Decibel.FromRatio(Complex.Abs(upper)),
            Decibel.FromRatio(Complex.Abs(lower)),
            Decibel.FromRatio(Complex.Abs(upper + Complex.Conjugate(lower)) / 2));
    }

    /// <summary>The second harmonic in the output of an ideal envelope detector, relative to the fundamental; next to nothing on tune.</summary>
    /// <param name="audioHz">Audio frequency in Hz.</param>
    /// <param name="depth">Depth of modulation, 0 to 1.</param>
    /// <returns>The ratio, by a Fourier sum over the envelope of carrier and both sidebands; 0 where there is no fundamental.</returns>
    public double SecondHarmonic(double audioHz, double depth)
    {
        const int points = 64;
        Complex upper = depth / 2 * _transfer.At(StationHz + audioHz) / Carrier;
        Complex lower = depth / 2 * _transfer.At(StationHz - audioHz) / Carrier;
        (Complex first, Complex second) = (Complex.Zero, Complex.Zero);
        for (int k = 0; k < points; k++)
        {
            Complex turn = Complex.FromPolarCoordinates(1, 2 * Math.PI * k / points);
            double envelope = Complex.Abs(1 + (upper * turn) + (lower * Complex.Conjugate(turn)));
            first += envelope * Complex.Conjugate(turn);
            second += envelope * Complex.Conjugate(turn * turn);
        }

        double fundamental = Complex.Abs(first);
        return fundamental > 0 ? Complex.Abs(second) / fundamental : 0;
    }

    /// <summary>The larger sideband relative to the carrier, as a ratio.</summary>
    /// <param name="audioHz">Audio frequency in Hz.</param>
    public double LargestRatio(double audioHz) => Math.Max(
        Complex.Abs(_transfer.At(StationHz + audioHz) / Carrier), Complex.Abs(_transfer.At(StationHz - audioHz) / Carrier));

    /// <summary>A station beside this one, heard relative to it.</summary>
    /// <param name="offsetHz">Offset in Hz, either sign.</param>
    public Neighbour NeighbourAt(double offsetHz) =>
        new(offsetHz, Decibel.FromRatio(Complex.Abs(_transfer.At(StationHz + offsetHz) / Carrier)));

    /// <summary>The lowest audio frequencies in Hz at which the audio is down by so many dB; null where it is not below 20 kHz.</summary>
    /// <param name="downDb">Losses in dB, above 0 and rising.</param>
    public double?[] AudioDownHz(ReadOnlySpan<double> downDb)
    {
        const double first = 20, last = 20_000, ratio = 1.35;
        SidebandResponse self = this;
        double?[] found = new double?[downDb.Length];
        (double a, double levelA) = (0, 0);
        int next = 0;
        for (double b = first; b <= last && next < found.Length; b *= ratio)
        {
            double levelB = self.At(b).AudioDb;
            while (next < found.Length && levelB <= -downDb[next])
            {
                double down = downDb[next];
                found[next++] = RootSearch.Between(hz => self.At(hz).AudioDb + down, a, levelA + down, b, levelB + down, 1e-10 * b);
            }

            (a, levelA) = (b, levelB);
        }

        return found;
    }
}
