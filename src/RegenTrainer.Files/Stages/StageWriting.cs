using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>
/// Writes a design into a stage file's text in two steps: what is there is changed or taken out, and what is missing is put
/// in where the changed text has room for it.
/// </summary>
internal static class StageWriting
{
    private const string Name = "stage";

    /// <summary>The text with the design in it.</summary>
    public static string Write(string text, StageDesign design)
    {
        var source = new DesignDevices(design);
        StageReading reading = new(Name, text, source, check: false);
        StageDesign old = reading.Design ?? throw new ArgumentException($"the text has faults: {reading.Faults[0]}", nameof(text));
        if (!ReferenceEquals(old.Family, design.Family))
        {
            throw new ArgumentException($"the text is of the family {old.Family.Name}, not {design.Family.Name}", nameof(design));
        }

        string changed = Change(text, reading, old, design);
        return Add(changed, new StageReading(Name, changed, source, check: false), old, design);
    }

    private static string Change(string text, StageReading reading, StageDesign old, StageDesign design)
    {
        var edits = new TextEdits(text);
        ChangeWord(edits, reading.Root!.Find("title"), old.Title, design.Title);
        ChangeWord(edits, reading.Root.Find("note"), old.Note, design.Note);
        ChangeWord(edits, reading.Entries.GetValueOrDefault("output.node"), old.OutputNode ?? "", design.OutputNode ?? "");
        List<string> gone = [];
        foreach (Field field in design.Family.Fields.Where(f => reading.Entries.ContainsKey(f.Key)))
        {
            TomlEntry entry = reading.Entries[field.Key];
            FieldValue was = old.Values[field.Key];
            if (Wanted(design, field) is not { } now)
            {
                gone.Add(field.Key);
            }
            else if (!ValueNotation.Same(was, now))
            {
                ValueNotation.Change(edits, text, field, entry.Value, was, now);
            }
        }

        Removal.Remove(edits, reading.Root, gone);
        PartWriting.Change(edits, reading, old, design);
        return edits.Apply();
    }

    private static string Add(string text, StageReading reading, StageDesign old, StageDesign design)
    {
        var edits = new TextEdits(text);
        TomlTable root = reading.Root!;
        if (old.Note != design.Note && root.Find("note") is null)
        {
            edits.InsertLineBehind(root.Body!.Value.End, $"note = {Notation.Quoted(design.Note)}");
        }

        var addition = new Addition(edits, text, root);
        foreach (Field field in design.Family.Fields.Where(f => !reading.Entries.ContainsKey(f.Key)))
        {
            if (Wanted(design, field) is { } value)
            {
                addition.Add(field.Key, ValueNotation.Of(field, value));
            }
        }

        addition.AddTables();
        PartWriting.Add(edits, text, reading, design);
        return edits.Apply();
    }

    /// <summary>The value a design wants written: for a socket the device in it, under the name the design's values give it.</summary>
    private static FieldValue? Wanted(StageDesign design, Field field)
    {
        FieldValue? value = design.Values.GetValueOrDefault(field.Key);
        bool other = field.Kind == FieldKind.Device && design.Devices.TryGetValue(field.Key, out Core.Devices.DeviceModel? model)
            && !string.Equals(model.Name, value?.Text, StringComparison.OrdinalIgnoreCase);
        return other ? FieldValue.Of(design.Devices[field.Key].Name) : value;
    }

    private static void ChangeWord(TextEdits edits, TomlEntry? entry, string old, string now)
    {
        if (entry is not null && old != now)
        {
            edits.Replace(entry.Value.Span, Notation.Quoted(now));
        }
    }
}
