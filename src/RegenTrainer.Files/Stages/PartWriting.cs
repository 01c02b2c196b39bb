using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Writes a stage's own parts into its text: a part that stayed the same keeps its lines.</summary>
internal static class PartWriting
{
    /// <summary>Writes changed parts anew in their place and takes out those that are gone.</summary>
    public static void Change(TextEdits edits, StageReading reading, StageDesign old, StageDesign design)
    {
        Dictionary<string, Part> wanted = design.ExtraParts.ToDictionary(p => p.Name, StringComparer.Ordinal);

        // Parts in another order are all written anew: a text has no way to tell a part moved from one gone.
        bool ordered = old.ExtraParts.Select(p => p.Name).Where(wanted.ContainsKey)
            .SequenceEqual(design.ExtraParts.Select(p => p.Name).Take(old.ExtraParts.Count(p => wanted.ContainsKey(p.Name))), StringComparer.Ordinal);
        foreach (Part part in old.ExtraParts)
        {
            TomlTable table = reading.PartTables[part.Name];
            TomlSpan body = table.Body!.Value;
            if (!ordered || !wanted.TryGetValue(part.Name, out Part? now))
            {
                edits.RemoveLines(body);
            }
            else if (!PartComparer.Instance.Equals(part, now))
            {
                edits.Replace(body, PartNotation.Write(now).TrimEnd('\n').ReplaceLineEndings(edits.NewLine));
            }
            else
            {
                continue;
            }

            foreach (TomlSpan inner in BodiesBelow(table))
            {
                edits.RemoveLines(inner);
            }
        }
    }

    /// <summary>Puts parts that the text does not have behind everything.</summary>
    public static void Add(TextEdits edits, string text, StageReading reading, StageDesign design)
    {
        string gap = text.EndsWith('\n') ? "" : edits.NewLine;
        foreach (Part part in design.ExtraParts.Where(p => !reading.PartTables.ContainsKey(p.Name)))
        {
            edits.Insert(text.Length, gap + (edits.NewLine + PartNotation.Write(part)).ReplaceLineEndings(edits.NewLine));
            gap = "";
        }
    }

    private static IEnumerable<TomlSpan> BodiesBelow(TomlTable table)
    {
        foreach (TomlEntry entry in table.Entries)
        {
            IEnumerable<TomlTable> inner = entry.Value switch
            {
                TomlTable one => [one],
                TomlTables many => many.Tables,
                _ => [],
            };
            foreach (TomlTable below in inner)
            {
                foreach (TomlSpan span in BodiesBelow(below).Concat(below.Body is { } own ? new[] { own } : []))
                {
                    yield return span;
                }
            }
        }
    }
}
