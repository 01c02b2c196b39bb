using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Takes values out of a text: with their line, or out of braces with the comma that parts them from a neighbour.</summary>
internal static class Removal
{
    /// <summary>Takes out the values of dotted keys, and tables in braces that are left with nothing in them.</summary>
    public static void Remove(TextEdits edits, TomlTable root, IReadOnlyCollection<string> keys)
    {
        if (keys.Count > 0)
        {
            Remove(edits, root, "", keys.ToHashSet(StringComparer.Ordinal));
        }
    }

    private static void Remove(TextEdits edits, TomlTable table, string path, HashSet<string> gone)
    {
        foreach (TomlEntry entry in table.Entries)
        {
            string key = path + entry.Key;
            if (entry.Value is TomlTable inner && !gone.Contains(key) && gone.Any(g => g.StartsWith(key + ".", StringComparison.Ordinal)))
            {
                if (inner.IsInline && Empties(inner, key, gone))
                {
                    gone.Add(key);
                }
                else
                {
                    Remove(edits, inner, key + ".", gone);
                }
            }
        }

        bool[] leaves = [.. table.Entries.Select(e => gone.Contains(path + e.Key))];
        int lastKept = Array.LastIndexOf(leaves, false);
        for (int k = 0; k < leaves.Length; k++)
        {
            if (!leaves[k])
            {
                continue;
            }

            TomlSpan line = table.Entries[k].Line;
            if (!table.IsInline)
            {
                edits.RemoveLines(line);
            }
            else if (k < lastKept)
            {
                edits.Replace(new TomlSpan(line.Offset, table.Entries[k + 1].Line.Offset - line.Offset), "");
            }
            else
            {
                int before = table.Entries[k - 1].Line.End;
                edits.Replace(new TomlSpan(before, line.End - before), "");
            }
        }
    }

    /// <summary>Whether all values of a table in braces go.</summary>
    private static bool Empties(TomlTable table, string path, HashSet<string> gone) =>
        table.Entries.All(e => gone.Contains($"{path}.{e.Key}") || (e.Value is TomlTable inner && Empties(inner, $"{path}.{e.Key}", gone)));
}
