using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>Round copper wire with its insulation.</summary>
public sealed record Wire
{
    /// <summary>Outer over bare diameter where the insulation is not stated: enamelled wire, from memory.</summary>
    public const double UsualInsulation = 1.1;

    /// <summary>Describes a wire by its diameters.</summary>
    /// <param name="bareDiameterMetre">Diameter of the copper in m, 1 um to 20 mm.</param>
    /// <param name="overInsulationMetre">Diameter over the insulation in m, from the bare diameter to 100 mm; 1.1 times bare when left out.</param>
    /// <exception cref="ArgumentOutOfRangeException">A diameter lies outside its range.</exception>
    public Wire(double bareDiameterMetre, double? overInsulationMetre = null)
    {
        BareDiameterMetre = Guard.InRange(bareDiameterMetre, 1e-6, 0.02, nameof(bareDiameterMetre));
        OverInsulationMetre = Guard.InRange(
            overInsulationMetre ?? (UsualInsulation * bareDiameterMetre), bareDiameterMetre, 0.1, nameof(overInsulationMetre));
    }

    /// <summary>Diameter of the copper in m.</summary>
    public double BareDiameterMetre { get; }

    /// <summary>Diameter over the insulation in m.</summary>
    public double OverInsulationMetre { get; }
}
