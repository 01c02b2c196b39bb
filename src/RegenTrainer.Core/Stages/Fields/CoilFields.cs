using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>A coil with an emitter tap and a base tap, counted from the earthed end: a single layer on a form, or wound on a core.</summary>
public static class CoilFields
{
    /// <summary>Outer diameter of the form.</summary>
    public const string FormDiameter = "coil.form_diameter";

    /// <summary>Diameter of the bare copper.</summary>
    public const string WireDiameter = "coil.wire_diameter";

    /// <summary>Diameter of the wire over its insulation.</summary>
    public const string WireOverInsulation = "coil.wire_over_insulation";

    /// <summary>Distance from turn to turn.</summary>
    public const string Pitch = "coil.pitch";

    /// <summary>Turns of the whole coil.</summary>
    public const string Turns = "coil.turns";

    /// <summary>Turns from the earthed end to the emitter tap.</summary>
    public const string EmitterTap = "coil.taps.emitter";

    /// <summary>Turns from the earthed end to the base tap.</summary>
    public const string BaseTap = "coil.taps.base";

    /// <summary>Q that form and insulation alone would leave.</summary>
    public const string FormLossQ = "coil.form_loss_q";

    /// <summary>Measured Q.</summary>
    public const string MeasuredQ = "coil.q.value";

    /// <summary>Frequency of the measured Q.</summary>
    public const string MeasuredQAt = "coil.q.at";

    /// <summary>The fields, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        CoredCoilFields.CoreKind,
        FieldOf.Length(FormDiameter, "outer diameter of the form", 1e-3, 1) with { Required = true, OnlyWith = CoredCoilFields.WithAir },
        FieldOf.Length(WireDiameter, "diameter of the bare copper", 0.02e-3, 10e-3) with { Required = true, RequiredWith = CoredCoilFields.WithAir },
        FieldOf.Length(WireOverInsulation, "diameter of the wire over its insulation; 1.1 times the copper where not given", 0.02e-3, 20e-3) with
        {
            OnlyWith = CoredCoilFields.WithAir,
        },
        FieldOf.Length(Pitch, "distance from turn to turn; close wound where not given", 0.02e-3, 0.1) with { OnlyWith = CoredCoilFields.WithAir },
        FieldOf.Turns(Turns, "turns of the whole coil"),
        FieldOf.Turns(EmitterTap, "turns from the earthed end to the emitter tap"),
        FieldOf.Turns(BaseTap, "turns from the earthed end to the base tap"),
        FieldOf.Quality(FormLossQ, "Q that the losses of form and insulation alone would leave; none where not given") with
        {
            Tolerance = ToleranceKind.CoilQ,
            OnlyWith = CoredCoilFields.WithAir,
        },
        FieldOf.Quality(MeasuredQ, "measured Q of the coil; that of an air-cored one is computed where not given") with
        {
            Tolerance = ToleranceKind.CoilQ,
            Required = true,
            RequiredWith = CoredCoilFields.WithCore,
        },
        FieldOf.Frequency(MeasuredQAt, "frequency of the measured Q") with { Required = true, RequiredWith = CoredCoilFields.WithCore },
        .. CoredCoilFields.All,
    ];

    /// <summary>Adds the coil from earth over its taps to the top of the tank.</summary>
    internal static void AddParts(StageDesign design, PartList parts, string emitterTap, string baseTap, string tankTop)
    {
        List<(int Turns, string Node)> taps =
        [
            .. new[] { (TurnsOf(design, EmitterTap), emitterTap), (TurnsOf(design, BaseTap), baseTap) }.Distinct().OrderBy(t => t.Item1),
        ];
        List<(string From, string To)> sections = [];
        string below = Part.Earth;
        foreach (string node in taps.Select(t => t.Node).Append(tankTop))
        {
            sections.Add((below, node));
            below = node;
        }

        int[] tapTurns = [.. taps.Select(t => t.Turns)];
        int[] sectionTurns = [.. tapTurns.Append(TurnsOf(design, Turns)).Zip(tapTurns.Prepend(0), (end, start) => end - start)];
        Coil? air = CoredCoilFields.IsAir(design) ? BuildCoil(design, tapTurns) : null;
        parts.Add(new Windings("coil", sections, air is null ? CoredCoilFields.Build(design, tapTurns) : air)
        {
            PickUp = CoilAntennaFields.PickUp(design, sectionTurns, air?.Geometry[0].RadiusMetre ?? 0),
        });
    }

    /// <summary>Adds a fault for every tap off the coil and for wire that does not fit its pitch.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        int turns = TurnsOf(design, Turns);
        foreach (string key in new[] { EmitterTap, BaseTap })
        {
            double tap = design.Number(key);
            if (tap > turns - 1)
            {
                string expected = turns < 2
                    ? "a coil of at least 2 turns, so that a tap has a turn on each side"
                    : $"1 to {turns - 1} turns, so that a turn of the coil's {turns} stays above the tap";
                faults.Add(key, $"a tap at {FaultList.Quantity(tap, Unit.None)} turns", expected);
            }
        }

        if (!CoredCoilFields.IsAir(design))
        {
            CoredCoilFields.Check(design, faults);
            return;
        }

        CheckWire(design, faults);
        if (design.NumberOrNull(MeasuredQ) is null != design.NumberOrNull(MeasuredQAt) is null)
        {
            string missing = design.NumberOrNull(MeasuredQ) is null ? MeasuredQ : MeasuredQAt;
            faults.Missing(missing, "a measured Q together with its frequency");
        }
    }

    private static void CheckWire(StageDesign design, FaultList faults)
    {
        double bare = design.Number(WireDiameter);
        if (design.NumberOrNull(WireOverInsulation) < bare)
        {
            faults.Add(
                WireOverInsulation,
                FaultList.Quantity(design.Number(WireOverInsulation), Unit.Metre),
                $"at least {FaultList.Quantity(bare, Unit.Metre)}, the bare copper");
            return;
        }

        // A pitch written down as the wire's own diameter may differ from it by the rounding of a product.
        double over = BuildWire(design).OverInsulationMetre;
        if (design.NumberOrNull(Pitch) is { } pitch && pitch < over * (1 - 1e-9))
        {
            faults.Add(
                Pitch,
                FaultList.Quantity(pitch, Unit.Metre),
                $"at least {FaultList.Quantity(over, Unit.Metre)}, the wire over its insulation");
        }
    }

    private static Coil BuildCoil(StageDesign design, IReadOnlyList<int> taps)
    {
        Winding winding = Winding.OnForm(
            design.Number(FormDiameter), BuildWire(design), TurnsOf(design, Turns), design.NumberOrNull(Pitch), taps);
        (double Q, double AtHz)? measured = design.NumberOrNull(MeasuredQ) is { } q ? (q, design.Number(MeasuredQAt)) : null;
        return new Coil(winding, design.NumberOrNull(FormLossQ), measured);
    }

    private static Wire BuildWire(StageDesign design) => new(design.Number(WireDiameter), design.NumberOrNull(WireOverInsulation));

    private static int TurnsOf(StageDesign design, string key) => (int)design.Number(key);
}
