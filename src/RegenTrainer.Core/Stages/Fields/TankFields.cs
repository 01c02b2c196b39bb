using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>A plain tank: one inductance with a constant Q, and an ideal feedback element across it.</summary>
public static class TankFields
{
    /// <summary>Inductance of the tank.</summary>
    public const string Inductance = "tank.inductance";

    /// <summary>Q of the inductance.</summary>
    public const string Q = "tank.q";

    /// <summary>Transconductance of the feedback element at a factor of 1.</summary>
    public const string Transconductance = "feedback.transconductance";

    /// <summary>
    /// The fields, in the order of the documentation. With the defaults 12 to 365 pF cover the medium waves and the tank tips
    /// over within the travel of a factor of 0 to 0.03.
    /// </summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        new(Inductance, "inductance of the tank", FieldKind.Quantity, Unit.Henry, 10e-9, 100e-3)
        {
            Default = 250e-6,
            Tolerance = ToleranceKind.Coil,
        },
        FieldOf.Quality(Q, "Q of the inductance") with { Default = 100, Tolerance = ToleranceKind.CoilQ },
        new(Transconductance, "transconductance of the feedback at a factor of 1", FieldKind.Quantity, Unit.Siemens, 1e-9, 10)
        {
            Default = 1e-3,
        },
    ];

    /// <summary>Adds the inductance and a feedback element that drives current into the tank in phase with its voltage.</summary>
    internal static void AddParts(StageDesign design, PartList parts, double factor, string tankTop)
    {
        parts.Add(new Inductor("tank coil", tankTop, Part.Earth, design.Number(Inductance), Q: design.Number(Q)));
        parts.Add(new Feedback("feedback", tankTop, Part.Earth, Part.Earth, tankTop, design.Number(Transconductance), factor)
        {
            Role = PartRole.Regeneration,
        });
    }
}
