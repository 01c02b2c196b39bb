using System.Collections.Immutable;
using CsCheck;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;

namespace RegenTrainer.Core.Tests.Stages;

/// <summary>Designs with any values their fields allow: each is either refused with reasons or can be built, and nothing throws.</summary>
public sealed class AnyDesignTests
{
    [Fact]
    public void A_tapped_coil_of_any_values_is_refused_or_built() => RefusedOrBuilt(DefaultStage.Design, 300);

    [Fact]
    public void A_plain_tank_of_any_values_is_refused_or_built() => RefusedOrBuilt(PlainStage.Design, 300);

    /// <summary>Around a stage that works, few values clash: most of what is changed alone can be built.</summary>
    [Fact]
    public void The_default_stage_with_any_one_value_changed_is_refused_or_built()
    {
        ImmutableArray<Field> fields = [.. TappedCoil.Instance.Fields.Where(f => f.Kind is not FieldKind.Device and not FieldKind.Pairs)];
        Gen.Select(Gen.Int[0, fields.Length - 1], Gen.Double[0, 1]).Sample(
            (index, share) => Settle(DefaultStage.Design.With(fields[index].Key, ValueOf(fields[index], share))),
            iter: 500,
            threads: 1);
    }

    private static void RefusedOrBuilt(StageDesign start, int count)
    {
        ImmutableArray<Field> fields = [.. start.Family.Fields.Where(f => f.Kind is not FieldKind.Device)];
        Gen.Double[0, 1].Array[fields.Length].Sample(
            shares =>
            {
                ImmutableSortedDictionary<string, FieldValue> values = start.Values;
                for (int i = 0; i < fields.Length; i++)
                {
                    values = values.SetItem(fields[i].Key, ValueOf(fields[i], shares[i]));
                }

                // Values that mean nothing with the choices made are all refused: what is left is the design that may be sound.
                StageDesign whole = start with { Values = values };
                Settle(whole with
                {
                    Values = values.RemoveRange(fields.Where(f => f.OnlyWith?.Holds(whole.WordOrNull) == false).Select(f => f.Key)),
                });
            },
            iter: count,
            threads: 1);
    }

    private static void Settle(StageDesign design)
    {
        IReadOnlyList<FieldFault> faults = design.Family.Check(design);
        if (faults.Count > 0)
        {
            Assert.All(faults, f => Assert.False(string.IsNullOrWhiteSpace(f.Key + f.Found) || string.IsNullOrWhiteSpace(f.Expected)));
            return;
        }

        StageCircuit circuit = design.Family.Expand(design);
        Assert.Contains(circuit.Parts, p => p.Nodes.Contains(circuit.OutputNode));
        Assert.True(circuit.Control!.Law.ValueAtStart >= 0);
    }

    /// <summary>A value of a field, by its share of the range: by ratio where the range allows it.</summary>
    private static FieldValue ValueOf(Field field, double share)
    {
        switch (field.Kind)
        {
            case FieldKind.Choice:
                return FieldValue.Of(field.Choices[Math.Min((int)(share * field.Choices.Count), field.Choices.Count - 1)]);
            case FieldKind.Pairs:
                return new FieldValue(null, null, null)
                {
                    Pairs = [(0, 0), (share * field.Maximum, 0.1 * share * field.Maximum), (field.Maximum, field.Maximum)],
                };
            default:
                double number = field.Minimum > 0
                    ? field.Minimum * Math.Pow(field.Maximum / field.Minimum, share)
                    : field.Minimum + (share * (field.Maximum - field.Minimum));
                number = Math.Clamp(number, field.Minimum, field.Maximum);
                return FieldValue.Of(field.Kind == FieldKind.Count ? Math.Round(number) : number);
        }
    }
}
