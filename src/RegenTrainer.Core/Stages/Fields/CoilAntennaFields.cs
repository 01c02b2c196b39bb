using RegenTrainer.Core.Antennas;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>Antennas that are the coil of the tank itself: an air-cored loop and a ferrite rod.</summary>
public static class CoilAntennaFields
{
    /// <summary>Diameter of the rod.</summary>
    public const string RodDiameter = "antenna.rod.diameter";

    /// <summary>Effective permeability of the rod.</summary>
    public const string RodPermeability = "antenna.rod.permeability";

    /// <summary>The air-cored coil picks up the field.</summary>
    public const string Loop = "loop";

    /// <summary>The coil on its rod picks up the field.</summary>
    public const string Rod = "rod";

    private static readonly FieldCondition _withRod = new(AntennaFields.Kind, [Rod]);

    /// <summary>The antenna of a stage whose coil can be one, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        .. AntennaFields.With(Loop, Rod),
        FieldOf.Length(RodDiameter, "diameter of the rod", 1e-3, 0.1) with { Required = true, OnlyWith = _withRod },
        new(
            RodPermeability,
            "effective permeability of the rod at the coil: what its length leaves of the material's",
            FieldKind.Quantity,
            Unit.None,
            1,
            1000)
        {
            Required = true,
            OnlyWith = _withRod,
        },
    ];

    /// <summary>What the coil picks up by itself; null with another kind of antenna.</summary>
    /// <param name="design">The design.</param>
    /// <param name="sectionTurns">Turns of each section of the coil.</param>
    /// <param name="turnRadiusMetre">Radius of a turn of an air-cored coil in m.</param>
    internal static CoilPickUp? PickUp(StageDesign design, IReadOnlyList<int> sectionTurns, double turnRadiusMetre)
    {
        switch (design.Word(AntennaFields.Kind))
        {
            case Loop:
                return CoilPickUp.OfTurns(sectionTurns, Math.PI * turnRadiusMetre * turnRadiusMetre);
            case Rod:
                double radius = 0.5 * design.Number(RodDiameter);
                return CoilPickUp.OfTurns(sectionTurns, Math.PI * radius * radius, design.Number(RodPermeability));
            default:
                return null;
        }
    }

    /// <summary>Adds a fault for an antenna that the coil is not.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        string kind = design.Word(AntennaFields.Kind);
        string core = design.Word(CoredCoilFields.Core);
        string needed = kind == Loop ? CoredCoilFields.Air : CoredCoilFields.Rod;
        if (kind is Loop or Rod && core != needed)
        {
            faults.Add(
                AntennaFields.Kind,
                $"\"{kind}\" with {CoredCoilFields.Core} = \"{core}\"",
                $"{CoredCoilFields.Core} = \"{needed}\" with it: the coil itself is the antenna");
        }

        AntennaFields.Check(design, faults);
    }
}
