using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>What a coil on a rod or ring has in place of its geometry.</summary>
public static class CoredCoilFields
{
    /// <summary>What the coil is wound on.</summary>
    public const string Core = "coil.core";

    /// <summary>Inductance factor of the core.</summary>
    public const string InductanceFactor = "coil.inductance_factor";

    /// <summary>Coupling between the sections of the winding.</summary>
    public const string SectionCoupling = "coil.section_coupling";

    /// <summary>Capacitance across the winding.</summary>
    public const string SelfCapacitance = "coil.self_capacitance";

    /// <summary>Length of one turn of wire.</summary>
    public const string TurnLength = "coil.turn_length";

    /// <summary>A coil without a core.</summary>
    public const string Air = "air";

    /// <summary>A coil on a ferrite rod.</summary>
    public const string Rod = "rod";

    /// <summary>A coil on a closed ring.</summary>
    public const string Ring = "ring";

    /// <summary>Holds for coils without a core.</summary>
    internal static FieldCondition WithAir { get; } = new(Core, [Air]);

    /// <summary>Holds for coils on a core.</summary>
    internal static FieldCondition WithCore { get; } = new(Core, [Rod, Ring]);

    /// <summary>What the coil is wound on.</summary>
    public static Field CoreKind { get; } =
        FieldOf.Choice(Core, "what the coil is wound on: nothing but its form, a ferrite rod, or a closed ring", Air, Air, Rod, Ring);

    /// <summary>The fields, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        new(InductanceFactor, "inductance factor A_L of the core: inductance over turns squared", FieldKind.Quantity, Unit.Henry, 0.1e-9, 100e-6)
        {
            Required = true,
            OnlyWith = WithCore,
            Tolerance = ToleranceKind.Coil,
        },
        new(
            SectionCoupling,
            "coupling factor between the sections; 0.90 on a rod and 0.99 on a ring where not given",
            FieldKind.Quantity,
            Unit.None,
            0,
            0.999)
        {
            OnlyWith = WithCore,
        },
        FieldOf.Stray(SelfCapacitance, "capacitance across a winding on a core", 0) with { OnlyWith = WithCore },
        FieldOf.Length(TurnLength, "length of one turn of wire on a core; its resistance counts where it is given", 1e-3, 1) with
        {
            OnlyWith = WithCore,
        },
    ];

    /// <summary>Whether the coil has no core.</summary>
    internal static bool IsAir(StageDesign design) => design.Word(Core) == Air;

    /// <summary>The coil of a design with a core.</summary>
    internal static CoredCoil Build(StageDesign design, IReadOnlyList<int> taps) => new(
        design.Number(InductanceFactor),
        (int)design.Number(CoilFields.Turns),
        taps,
        design.NumberOrNull(SectionCoupling) ?? (design.Word(Core) == Rod ? CoredCoil.UsualRodCoupling : CoredCoil.UsualRingCoupling),
        (design.Number(CoilFields.MeasuredQ), design.Number(CoilFields.MeasuredQAt)),
        design.Number(SelfCapacitance),
        BuildWire(design));

    /// <summary>Adds a fault for a wire half described or with more loss than the measured Q leaves.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        if (design.NumberOrNull(CoilFields.WireDiameter) is null != design.NumberOrNull(TurnLength) is null)
        {
            string missing = design.NumberOrNull(TurnLength) is null ? TurnLength : CoilFields.WireDiameter;
            faults.Missing(missing, "diameter and turn length of the wire together, or neither");
        }
        else if (BuildWire(design) is { } wire)
        {
            double turns = design.Number(CoilFields.Turns);
            double reactance = 2 * Math.PI * design.Number(CoilFields.MeasuredQAt) * design.Number(InductanceFactor) * turns * turns;
            double most = reactance / (turns * wire.OhmPerTurn(20));
            if (design.Number(CoilFields.MeasuredQ) >= most)
            {
                faults.Add(
                    CoilFields.MeasuredQ,
                    FaultList.Quantity(design.Number(CoilFields.MeasuredQ), Unit.None),
                    $"less than {QuantityText.Write(most, Unit.None)}, what the resistance of the wire alone leaves");
            }
        }
    }

    private static TurnWire? BuildWire(StageDesign design) =>
        design.NumberOrNull(CoilFields.WireDiameter) is { } bare && design.NumberOrNull(TurnLength) is { } length ? new TurnWire(bare, length) : null;
}
