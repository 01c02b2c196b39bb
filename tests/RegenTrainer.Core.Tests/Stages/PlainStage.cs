using System.Collections.Immutable;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Families;

namespace RegenTrainer.Core.Tests.Stages;

/// <summary>The plain tank with its defaults, on medium wave.</summary>
internal static class PlainStage
{
    /// <summary>Only what a file must give.</summary>
    public static StageDesign Design { get; } = new StageDesign(
            PlainTank.Instance,
            "Plain tank",
            "",
            ImmutableSortedDictionary<string, FieldValue>.Empty,
            ImmutableSortedDictionary<string, DeviceModel>.Empty,
            [])
        .With("dial.low", FieldValue.Of(530e3))
        .With("dial.high", FieldValue.Of(1700e3))
        .With("dial.capacitor.min", FieldValue.Of(12e-12))
        .With("dial.capacitor.max", FieldValue.Of(365e-12))
        .With("antenna.coupling", FieldValue.Of(5e-12));
}
