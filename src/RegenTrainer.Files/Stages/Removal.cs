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
        IReadOnlyList<(string Key, TomlEntry Entry)> written = table.Written;
        bool[] leaves = [.. written.Select(w => Leaves(w.Entry.Value, path + w.Key, gone))];
        int lastKept = Array.LastIndexOf(leaves, false);
        for (int k = 0; k < leaves.Length; k++)
        {
            TomlSpan line = written[k].Entry.Line;
            if (!leaves[k])
            {
                if (written[k].Entry.Value is TomlTable braces)
                {
                    Remove(edits, braces, $"{path}{written[k].Key}.", gone);
                }
            }
            else if (!table.IsInline)
            {
                edits.RemoveLines(line);
            }
            else if (k < lastKept)
            {
                edits.Replace(new TomlSpan(line.Offset, written[k + 1].Entry.Line.Offset - line.Offset), "");
            }
            else
            {
                int before = written[k - 1].Entry.Line.End;
                edits.Replace(new TomlSpan(before, line.End - before), "");
            }
        }

        Below(edits, table, path, gone);
    }

    /// <summary>Goes on into the tables under headers of their own.</summary>
    private static void Below(TextEdits edits, TomlTable table, string path, HashSet<string> gone)
    {
        foreach (TomlEntry entry in table.Entries)
        {
            if (entry.Value is TomlTable { IsInline: false, IsDotted: false } headed)
            {
                Remove(edits, headed, $"{path}{entry.Key}.", gone);
            }
            else if (entry.Value is TomlTable { IsDotted: true } dotted)
            {
                Below(edits, dotted, $"{path}{entry.Key}.", gone);
            }
        }
    }

    /// <summary>Whether a value goes: itself, or all there is in its braces.</summary>
    private static bool Leaves(TomlValue value, string key, HashSet<string> gone)
    {
        if (gone.Contains(key) || value is not TomlTable braces)
        {
            return gone.Contains(key);
        }

        IReadOnlyList<(string Key, TomlEntry Entry)> inside = braces.Written;
        return inside.Count > 0 && inside.All(i => Leaves(i.Entry.Value, $"{key}.{i.Key}", gone));
    }
}
