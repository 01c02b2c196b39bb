using System.Globalization;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Antennas;

/// <summary>
/// A wire that leads up from the earth to its height and, where it is longer, on level from there, open at its far end: a line
/// of the wire's mean characteristic impedance [Schelkunoff 1941, Howe 1914]. Holds up to a quarter wave.
/// </summary>
/// <remarks>
/// The upright part has Z = 60 (ln(2 h/a) - 1) ohm, the level part that of a line over ground, 60 arcosh(h/a) ohm; their
/// influence on each other is left out. An even charge is assumed: the capacitance comes out within 12 % of that with the charge
/// as it spreads by itself. The ground is taken as a good conductor.
/// </remarks>
public sealed record WireOverGround
{
    /// <summary>Share of the wire's whole capacitance in the branch of the first resonance [Foster 1924].</summary>
    private const double FirstBranch = 8.0 / (Math.PI * Math.PI);

    private const double OhmPerNeper = 60.0;

    /// <summary>Describes a wire.</summary>
    /// <param name="lengthMetre">Length of the wire from the earth to its far end in m, from the height to 1 km.</param>
    /// <param name="heightMetre">Height of the level part, or of the top, over ground in m, 0.1 to 300.</param>
    /// <param name="diameterMetre">Diameter of the wire in m, 10 um to a tenth of the height.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    public WireOverGround(double lengthMetre, double heightMetre, double diameterMetre)
    {
        HeightMetre = Guard.InRange(heightMetre, 0.1, 300.0, nameof(heightMetre));
        LengthMetre = Guard.InRange(lengthMetre, heightMetre, 1000.0, nameof(lengthMetre));
        DiameterMetre = Guard.InRange(diameterMetre, 10e-6, 0.1 * heightMetre, nameof(diameterMetre));
        double overRadius = 2.0 * heightMetre / diameterMetre;
        double upright = OhmPerNeper * (Math.Log(2.0 * overRadius) - 1.0);
        double level = OhmPerNeper * Math.Acosh(overRadius);
        double rest = lengthMetre - heightMetre;
        Farad = ((heightMetre / upright) + (rest / level)) / PhysicalConstants.SpeedOfLight;
        Henry = ((heightMetre * upright) + (rest * level)) / PhysicalConstants.SpeedOfLight;
    }

    /// <summary>Length of the wire in m.</summary>
    public double LengthMetre { get; }

    /// <summary>Height over ground in m.</summary>
    public double HeightMetre { get; }

    /// <summary>Diameter of the wire in m.</summary>
    public double DiameterMetre { get; }

    /// <summary>Capacitance of the whole wire to ground in F, at frequencies far below its quarter wave.</summary>
    public double Farad { get; }

    /// <summary>Inductance of the whole wire in H, as if one current flowed all along it.</summary>
    public double Henry { get; }

    /// <summary>Frequency in Hz at which the wire is a quarter wave: the end of the range.</summary>
    public double QuarterWaveHz => 0.25 / Math.Sqrt(Henry * Farad);

    /// <summary>Inductance in H of the branch that resonates at the quarter wave.</summary>
    public double BranchHenry => 0.5 * Henry;

    /// <summary>Capacitance in F in series with <see cref="BranchHenry"/>.</summary>
    public double BranchFarad => FirstBranch * Farad;

    /// <summary>
    /// Capacitance in F across both: what the higher resonances leave. The three stand for the open line, -j Z cot, within 0.5 %
    /// of its current up to the quarter wave.
    /// </summary>
    public double ShuntFarad => (1.0 - FirstBranch) * Farad;

    /// <summary>
    /// Effective height in m: the electromotive force at the foot over the field. The current falls as a sine towards the far
    /// end; only the upright part counts. Above the quarter wave the value there.
    /// </summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is not above 0.</exception>
    public double EffectiveHeightMetre(double hz)
    {
        double whole = 0.5 * Math.PI * Math.Min(1.0, Guard.Positive(hz, nameof(hz)) / QuarterWaveHz);
        double upright = whole * HeightMetre / LengthMetre;
        double mean = (Math.Cos(whole - upright) - Math.Cos(whole)) / (upright * Math.Sin(whole));
        return HeightMetre * mean;
    }

    /// <summary>Radiation resistance at the foot in ohm: 160 (pi h/lambda)^2 of the effective height h [Rüdenberg 1908], within 10 % up to a quarter wave.</summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is not above 0.</exception>
    public double RadiationOhm(double hz)
    {
        double waves = EffectiveHeightMetre(hz) * hz / PhysicalConstants.SpeedOfLight;
        return 160.0 * Math.PI * Math.PI * waves * waves;
    }

    /// <summary>Says where the wire is longer than its lumped equivalent stands for.</summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    public IReadOnlyList<Caution> CautionsAt(double hz) => hz <= QuarterWaveHz ? [] :
    [
        new Caution(
            "long-wire-too-long",
            string.Create(
                CultureInfo.InvariantCulture,
                $"The antenna wire of {LengthMetre:0.##} m is longer than a quarter wave at {hz / 1000.0:0.##} kHz; what stands for it holds up to {QuarterWaveHz / 1000.0:0.##} kHz.")),
    ];
}
