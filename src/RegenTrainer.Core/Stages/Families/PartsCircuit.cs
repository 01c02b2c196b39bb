using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Expansion;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages.Families;

/// <summary>
/// Any circuit, given as parts at nodes. One capacitor has the role tuning; at most one resistor or feedback element has the
/// role regeneration, and its control comes from the potentiometer or the factor of the stage.
/// </summary>
public sealed class PartsCircuit : Family
{
    private PartsCircuit()
        : base(
            "parts",
            "Any circuit, given as parts at nodes.",
            [
                .. DialFields.Band,
                .. PotentiometerFields.With(required: false),
                .. FactorFields.With(null),
                BiasFields.Battery,
                .. RangeFields.Supply,
                .. RangeFields.Temperature,
                .. ToleranceFields.All,
            ])
    {
    }

    /// <summary>The family.</summary>
    public static PartsCircuit Instance { get; } = new();

    /// <inheritdoc/>
    public override IReadOnlyList<FieldFault> Check(StageDesign design)
    {
        FaultList faults = new();
        DialFields.Check(design, faults);
        switch (Regeneration(design))
        {
            case Resistor when design.NumberOrNull(PotentiometerFields.Total) is null:
                faults.Missing(PotentiometerFields.Total, "the potentiometer behind the part with the role \"regeneration\"");
                break;
            case Resistor:
                PotentiometerFields.Check(design, faults);
                break;
            case Feedback:
                FactorFields.Check(design, faults);
                break;
            default:
                break;
        }

        RangeFields.Check(design, SupplyVolt(design), faults);
        CircuitCheck.Check(design.ExtraParts, design.OutputNode, faults);
        return faults.Faults;
    }

    /// <inheritdoc/>
    public override StageCircuit Expand(StageDesign design)
    {
        RegenerationControl? control = Regeneration(design) switch
        {
            Resistor => new RegenerationControl(PotentiometerFields.Build(design), Unit.Ohm),
            Feedback => new RegenerationControl(FactorFields.Build(design), Unit.None),
            _ => null,
        };
        string output = design.OutputNode ?? throw new InvalidOperationException("the design names no output node: it was not checked");
        return new StageCircuit(design.ExtraParts, output, DialFields.Build(design), control, SupplyVolt(design));
    }

    private static Part? Regeneration(StageDesign design) => design.ExtraParts.FirstOrDefault(p => p.Role == PartRole.Regeneration);

    /// <summary>The size of the first supply's voltage: the one a setting's supply stands for.</summary>
    private static double? SupplyVolt(StageDesign design) =>
        design.ExtraParts.OfType<Supply>().FirstOrDefault() is { } supply ? Math.Abs(supply.Volt) : null;
}
