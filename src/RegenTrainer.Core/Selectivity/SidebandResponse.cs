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

    /// <summary>The second harmonic that unlike sidebands make in an ideal envelope detector, relative to the fundamental; 0 on tune.</summary>
    /// <param name="audioHz">Audio frequency in Hz.</param>
    /// <param name="depth">Depth of modulation, 0 to 1.</param>
    public double SecondHarmonic(double audioHz, double depth)
    {
        // Of 1 + a e^jx + b e^-jx the part in quadrature with the carrier, of amplitude |a - conj b|, lengthens the phasor by
        // half its square, which is a constant and a second harmonic of |a - conj b|^2/4.
        Complex upper = depth / 2 * _transfer.At(StationHz + audioHz) / Carrier;
        Complex lower = depth / 2 * _transfer.At(StationHz - audioHz) / Carrier;
        Complex inPhase = upper + Complex.Conjugate(lower), quadrature = upper - Complex.Conjugate(lower);
        double fundamental = Complex.Abs(inPhase);
        return fundamental > 0 ? Complex.Abs(quadrature * quadrature) / 4 / fundamental : 0;
    }

    /// <summary>The larger sideband relative to the carrier, as a ratio.</summary>
    /// <param name="audioHz">Audio frequency in Hz.</param>
    public double LargestRatio(double audioHz) => Math.Max(
        Complex.Abs(_transfer.At(StationHz + audioHz) / Carrier), Complex.Abs(_transfer.At(StationHz - audioHz) / Carrier));

    /// <summary>A station beside this one, heard relative to it.</summary>
    /// <param name="offsetHz">Offset in Hz, either sign.</param>
    public Neighbour NeighbourAt(double offsetHz) =>
        new(offsetHz, Decibel.FromRatio(Complex.Abs(_transfer.At(StationHz + offsetHz) / Carrier)));

    /// <summary>The lowest audio frequency at which the audio is down by so many dB; null where it is not below 20 kHz.</summary>
    /// <param name="downDb">Loss in dB, above 0.</param>
    public double? AudioDownHz(double downDb)
    {
        const double first = 20, last = 20_000, ratio = 1.35;
        SidebandResponse self = this;
        double Excess(double hz) => self.At(hz).AudioDb + downDb;
        (double a, double fa) = (0, downDb);
        for (double b = first; b <= last; b *= ratio)
        {
            double fb = Excess(b);
            if (fb <= 0)
            {
                return RootSearch.Between(Excess, a, fa, b, fb, 1e-10 * b);
            }

            (a, fa) = (b, fb);
        }

        return null;
    }
}
