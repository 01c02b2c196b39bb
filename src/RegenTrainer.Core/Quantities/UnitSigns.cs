namespace RegenTrainer.Core.Quantities;

/// <summary>The signs, names and prefixes that quantities are written with.</summary>
internal static class UnitSigns
{
    /// <summary>The sign written, then every spelling read, and the letter that may stand for the point.</summary>
    private static readonly Dictionary<Unit, Entry> _entries = new()
    {
        [Unit.None] = new("a plain number", "a number such as 84 or 0.12", "", null, []),
        [Unit.Ohm] = new("ohm", "a resistance such as 4k7", "\u03a9", 'R', ["\u03a9", "\u2126", "R", "ohm", "ohms", "Ohm", "Ohms", "OHM"]),
        [Unit.Farad] = new("farad", "a capacitance such as 4n7", "F", 'F', ["F", "farad", "farads"]),
        [Unit.Henry] = new("henry", "an inductance such as 240u", "H", 'H', ["H", "henry", "henrys", "henries"]),
        [Unit.Hertz] = new("hertz", "a frequency such as 530k", "Hz", null, ["Hz", "hz", "HZ", "hertz"]),
        [Unit.Volt] = new("volt", "a voltage such as 4.5 V", "V", 'V', ["V", "volt", "volts"]),
        [Unit.Ampere] = new("ampere", "a current such as 2 mA", "A", 'A', ["A", "amp", "amps", "ampere", "amperes"]),
        [Unit.Watt] = new("watt", "a power such as 500 mW", "W", 'W', ["W", "watt", "watts"]),
        [Unit.Metre] = new("metre", "a length such as 0.4 mm", "m", null, ["m", "metre", "metres", "meter", "meters"]),
        [Unit.Celsius] = new(
            "degree Celsius", "a temperature such as 35 \u00b0C", "\u00b0C", null, ["\u00b0C", "\u00baC", "\u2103", "C", "celsius", "Celsius"]),
        [Unit.Percent] = new("percent", "a share such as 5%", "%", null, ["%", "percent"]),
        [Unit.Degree] = new("degree", "an angle such as 270\u00b0", "\u00b0", null, ["\u00b0", "\u00ba", "deg", "degree", "degrees"]),
        [Unit.Second] = new("second", "a time such as 20 ms", "s", null, ["s", "second", "seconds"]),
        [Unit.Siemens] = new("siemens", "a conductance such as 40 mS", "S", null, ["S", "siemens"]),
        [Unit.Decibel] = new("decibel", "a level such as -6 dB", "dB", null, ["dB", "db", "DB", "decibel", "decibels"]),
        [Unit.AmpereHour] = new("ampere-hour", "a charge such as 2 Ah", "Ah", null, ["Ah", "ampere-hour", "ampere-hours"]),
    };

    /// <summary>The name in the singular, for messages.</summary>
    public static string Name(Unit unit) => EntryOf(unit).Name;

    /// <summary>What a text of this unit looks like, for messages.</summary>
    public static string Example(Unit unit) => EntryOf(unit).Example;

    /// <summary>The sign of the unit; empty for a plain number.</summary>
    public static string Sign(Unit unit) => EntryOf(unit).Sign;

    /// <summary>The letter that stands for the point where there is no prefix (IEC 60062), if the unit has one.</summary>
    public static char? PointLetter(Unit unit) => EntryOf(unit).PointLetter;

    /// <summary>The spellings read for a unit.</summary>
    public static IReadOnlyList<string> Spellings(Unit unit) => EntryOf(unit).Spellings;

    /// <summary>Whether k, m and the like may stand before the unit.</summary>
    public static bool TakesPrefix(Unit unit) =>
        unit is not (Unit.Percent or Unit.Degree or Unit.Celsius or Unit.Decibel);

    /// <summary>The unit a word spells, other than the wanted one.</summary>
    public static Unit? OtherUnit(ReadOnlySpan<char> word, Unit wanted)
    {
        foreach ((Unit unit, Entry entry) in _entries)
        {
            foreach (string spelling in entry.Spellings)
            {
                if (unit != wanted && word.SequenceEqual(spelling))
                {
                    return unit;
                }
            }
        }

        return null;
    }

    /// <summary>The power of ten of a prefix letter; null where the letter is none. L is milli for ohm alone (IEC 60062).</summary>
    public static int? Power(char letter, Unit unit) => letter switch
    {
        _ when !TakesPrefix(unit) => null,
        'f' => -15,
        'p' => -12,
        'n' => -9,
        'u' or '\u00b5' or '\u03bc' => -6,
        'm' => -3,
        'L' when unit == Unit.Ohm => -3,
        'k' or 'K' => 3,
        'M' => 6,
        'G' => 9,
        'T' => 12,
        _ => null,
    };

    /// <summary>The prefix letter of a power of ten; empty for 0, null where there is none.</summary>
    public static string? Prefix(int power, string micro) => power switch
    {
        -15 => "f",
        -12 => "p",
        -9 => "n",
        -6 => micro,
        -3 => "m",
        0 => "",
        3 => "k",
        6 => "M",
        9 => "G",
        12 => "T",
        _ => null,
    };

    private static Entry EntryOf(Unit unit) =>
        _entries.TryGetValue(unit, out Entry? entry)
            ? entry
            : throw new ArgumentOutOfRangeException(nameof(unit), $"unit is {(int)unit}; it must be a unit by name.");

    private sealed record Entry(string Name, string Example, string Sign, char? PointLetter, IReadOnlyList<string> Spellings);
}
