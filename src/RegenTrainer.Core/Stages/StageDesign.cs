using System.Collections.Immutable;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Stages;

/// <summary>What was built: a circuit family with its values, the devices in their sockets and the stage's own parts.</summary>
/// <param name="Family">The circuit family.</param>
/// <param name="Title">The stage's title, up to 200 characters.</param>
/// <param name="Note">The builder's note, up to 5,000 characters.</param>
/// <param name="Values">The values given, by dotted key; what is absent has the field's default.</param>
/// <param name="Devices">The device of each <see cref="FieldKind.Device"/> field, by dotted key.</param>
/// <param name="ExtraParts">Parts beyond the family's own; all parts of a <c>parts</c> circuit.</param>
/// <param name="OutputNode">The output node a <c>parts</c> circuit names; null elsewhere.</param>
public sealed record StageDesign(
    Family Family,
    string Title,
    string Note,
    ImmutableSortedDictionary<string, FieldValue> Values,
    ImmutableSortedDictionary<string, DeviceModel> Devices,
    ImmutableArray<Part> ExtraParts,
    string? OutputNode = null)
{
    /// <summary>The number in force for a key: the given one or the field's default; null where neither exists.</summary>
    public double? NumberOrNull(string key) =>
        Values.TryGetValue(key, out FieldValue? value) ? value.Number : Family.FieldFor(key)?.Default;

    /// <summary>The number in force for a key.</summary>
    /// <exception cref="InvalidOperationException">The design has no such number: it was not checked.</exception>
    public double Number(string key) => NumberOrNull(key) ?? throw new InvalidOperationException($"the design has no value for {key}");

    /// <summary>The word in force for a key.</summary>
    /// <exception cref="InvalidOperationException">The design has no such word: it was not checked.</exception>
    public string Word(string key) => WordOrNull(key) ?? throw new InvalidOperationException($"the design has no value for {key}");

    /// <summary>The word in force for a key, or null.</summary>
    public string? WordOrNull(string key) =>
        Values.TryGetValue(key, out FieldValue? value) ? value.Text : Family.FieldFor(key)?.DefaultText;

    /// <summary>The device of a kind in a socket; null where there is none.</summary>
    public T? DeviceOrNull<T>(string key)
        where T : DeviceModel => Devices.GetValueOrDefault(key) as T;

    /// <summary>The device of a kind in a socket.</summary>
    /// <exception cref="InvalidOperationException">There is none: the design was not checked.</exception>
    public T Device<T>(string key)
        where T : DeviceModel => DeviceOrNull<T>(key) ?? throw new InvalidOperationException($"the design has no device of its kind for {key}");

    /// <summary>Whether the design gives a value of its own for a key.</summary>
    public bool Gives(string key) => Values.ContainsKey(key);

    /// <summary>The same design with one value replaced.</summary>
    public StageDesign With(string key, FieldValue value) => this with { Values = Values.SetItem(key, value) };
}
