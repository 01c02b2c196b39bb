using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Expansion;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages.Families;

/// <summary>A tank of one inductance with a constant Q, and an ideal feedback element with a factor the control turns.</summary>
public sealed class PlainTank : Family
{
    private const string TankTop = "tank top";

    private PlainTank()
        : base(
            "plain-tank",
            "A tank with a constant Q and an ideal feedback element: regeneration without a device.",
            [
                .. DialFields.All,
                .. TankFields.All,
                DetectorFields.Socket,
                .. FactorFields.With(0.03),
                .. AntennaFields.All,
                .. DetectorFields.OnTank,
                .. OutputFields.LoadBehind(1e-12, 1e6),
                .. RangeFields.Temperature,
                .. ToleranceFields.All,
            ])
    {
    }

    /// <summary>The family.</summary>
    public static PlainTank Instance { get; } = new();

    /// <inheritdoc/>
    public override IReadOnlyList<FieldFault> Check(StageDesign design)
    {
        FaultList faults = new();
        if (!ChoiceCheck.Check(design, faults))
        {
            return faults.Faults;
        }

        DialFields.Check(design, faults);
        FactorFields.Check(design, faults);
        AntennaFields.Check(design, faults);
        SocketCheck.Check(design, faults);
        DetectorFields.Check(design, faults);
        RangeFields.Check(design, null, faults);
        CircuitCheck.CheckExpansion(this, design, faults);
        return faults.Faults;
    }

    /// <inheritdoc/>
    public override StageCircuit Expand(StageDesign design)
    {
        PartList parts = new();
        RegenerationControl control = new(FactorFields.Build(design), Unit.None);
        DialFields.AddParts(design, parts, TankTop);
        TankFields.AddParts(design, parts, control.Law.ValueAtStart, TankTop);
        AntennaFields.AddParts(design, parts, TankTop);
        string output = design.Word(OutputFields.Kind) == OutputFields.CrystalSet
            ? DetectorFields.AddParts(design, parts, TankTop)
            : OutputFields.AddLoad(design, parts, TankTop);
        parts.AddRange(design.ExtraParts);
        return new StageCircuit(parts.Parts, output, DialFields.Build(design), control, null);
    }
}
