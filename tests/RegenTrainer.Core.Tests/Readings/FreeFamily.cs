using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>A stage given straight as parts and laws, for circuits no family offers.</summary>
internal sealed class FreeFamily(IReadOnlyList<Part> parts, string output, Dial dial, IControlLaw? law, Unit unit)
    : Family("free", "A circuit of a test's own.", [])
{
    public static StageDesign Design(
        IReadOnlyList<Part> parts, string output, VariableCapacitor capacitor, IControlLaw? law = null, Unit unit = Unit.Ohm) => new(
            new FreeFamily(parts, output, new Dial(530e3, 1700e3, 10e3, capacitor), law, unit), "free", "",
            ImmutableSortedDictionary<string, FieldValue>.Empty, ImmutableSortedDictionary<string, DeviceModel>.Empty, []);

    public override IReadOnlyList<FieldFault> Check(StageDesign design) => [];

    public override StageCircuit Expand(StageDesign design) =>
        new(parts, output, dial, law is null ? null : new RegenerationControl(law, unit), null);
}
