using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Files.Toml;

/// <summary>Takes values out of a table one by one, notes every fault, and at the end every key nobody asked for.</summary>
internal sealed class TableReader(string file, TomlTable table, List<FileFault> faults)
{
    private readonly HashSet<string> _asked = new(StringComparer.Ordinal);

    public string File => file;

    public TomlTable Table => table;

    public List<FileFault> Faults => faults;

    /// <summary>A reader of another table of the same file.</summary>
    public TableReader Into(TomlTable inner) => new(file, inner, faults);

    public bool Has(string key) => table.Find(key) is not null;

    public void Refuse(TomlPlace at, string found, string expected) => faults.Add(new FileFault(file, at.Line, at.Column, found, expected));

    /// <summary>The value of a key; a missing one is a fault where it is required.</summary>
    public TomlValue? Value(string key, bool required, string meaning)
    {
        _asked.Add(key);
        TomlValue? value = table.Find(key)?.Value;
        if (value is null && required)
        {
            Refuse(table.At, $"no {key}", meaning);
        }

        return value;
    }

    public string? Text(string key, bool required, string meaning)
    {
        switch (Value(key, required, meaning))
        {
            case null:
                return null;
            case TomlText text:
                return text.Text;
            case { } other:
                Refuse(other.At, other.Phrase, meaning + " in quotes");
                return null;
        }
    }

    public double? Quantity(string key, Unit unit, double minimum, double maximum, bool required)
    {
        TomlValue? value = Value(key, required, QuantityValues.Expected(unit, minimum, maximum));
        return value is null ? null : QuantityValues.Read(this, value, unit, minimum, maximum);
    }

    public int? Count(string key, int minimum, int maximum, bool required)
    {
        TomlValue? value = Value(key, required, $"a whole number from {minimum} to {maximum}");
        return value is null ? null : Whole(value, minimum, maximum);
    }

    public int? Whole(TomlValue value, int minimum, int maximum)
    {
        if (value is TomlNumber { IsWhole: true } number && number.Number >= minimum && number.Number <= maximum)
        {
            return (int)number.Number;
        }

        Refuse(value.At, value.Phrase, $"a whole number from {minimum} to {maximum}");
        return null;
    }

    /// <summary>One of a list of words.</summary>
    public string? Choice(string key, IReadOnlyList<string> words, bool required)
    {
        string expected = Words(words);
        switch (Value(key, required, expected))
        {
            case null:
                return null;
            case TomlText text when words.Contains(text.Text, StringComparer.Ordinal):
                return text.Text;
            case { } other:
                Refuse(other.At, other.Phrase, expected);
                return null;
        }
    }

    /// <summary>A table of this key.</summary>
    public TableReader? Inner(string key, bool required, string meaning)
    {
        switch (Value(key, required, meaning))
        {
            case null:
                return null;
            case TomlTable inner:
                return Into(inner);
            case { } other:
                Refuse(other.At, other.Phrase, meaning);
                return null;
        }
    }

    /// <summary>A list of this key; empty where it is missing or something else.</summary>
    public IReadOnlyList<TomlValue> List(string key, bool required, string meaning)
    {
        switch (Value(key, required, meaning))
        {
            case null:
                return [];
            case TomlList list:
                return list.Items;
            case TomlTables tables:
                return tables.Tables;
            case { } other:
                Refuse(other.At, other.Phrase, meaning);
                return [];
        }
    }

    /// <summary>Faults for every key that was not asked for.</summary>
    public void Finish()
    {
        foreach (TomlEntry entry in table.Entries)
        {
            if (!_asked.Contains(entry.Key))
            {
                Refuse(entry.KeyAt, $"the unknown key \"{entry.Key}\"", Nearest.Words(entry.Key, _asked));
            }
        }
    }

    /// <summary>A list of words for a message.</summary>
    public static string Words(IReadOnlyList<string> words) =>
        words.Count == 1 ? $"\"{words[0]}\"" : "one of " + string.Join(", ", words.Select(w => $"\"{w}\""));
}
