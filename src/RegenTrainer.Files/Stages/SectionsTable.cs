using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads windings that are stated by the inductance of their sections and by coupling.</summary>
internal static class SectionsTable
{
    private const int MostSections = 65;
    private const string Pattern = "a coupling [section, section, factor]";

    /// <summary>The part; null with its faults noted.</summary>
    public static Windings? Read(TableReader table, string name)
    {
        int before = table.Faults.Count;
        List<InductiveSection> sections = [];
        List<(string, string)> nodes = [];
        IReadOnlyList<TomlValue> items = table.List("sections", required: true, "a list of sections { between = [..], inductance = .. }");
        if (items.Count is 0 or > MostSections)
        {
            table.Refuse(table.Table.Find("sections")!.Value.At, $"{items.Count} sections", $"1 to {MostSections}");
            return null;
        }

        foreach (TomlValue item in items)
        {
            Section(table, item, sections, nodes);
        }

        double capacitance = table.Quantity("self_capacitance", Unit.Farad, 0, 1e-6, required: false) ?? 0;
        List<SectionCoupling> couplings = Couplings(table, items.Count);
        if (table.Faults.Count > before)
        {
            return null;
        }

        try
        {
            return new Windings(name, nodes, new CoupledSections(sections, couplings, [new WindingSpan(0, sections.Count, capacitance, 0, 0)]));
        }
        catch (ArgumentException)
        {
            // Every factor alone is possible: what is still refused is all of them together.
            table.Refuse(
                table.Table.Find("coupling")?.Value.At ?? table.Table.At,
                "couplings that no windings have together",
                "lower factors between sections that are coupled to the same third one");
            return null;
        }
    }

    private static void Section(TableReader table, TomlValue item, List<InductiveSection> sections, List<(string, string)> nodes)
    {
        if (item is not TomlTable inner)
        {
            table.Refuse(item.At, item.Phrase, "a section { between = [..], inductance = .. }");
            return;
        }

        TableReader reader = table.Into(inner);
        (string From, string To)? between = PartTable.Pair(reader, "between");
        double? henry = reader.Quantity("inductance", Unit.Henry, 1e-12, 1e3, required: true);
        double? q = reader.Quantity("q", Unit.None, 0.1, 1e9, required: false);
        double ohm = reader.Quantity("resistance", Unit.Ohm, 0, 1e9, required: false) ?? 0;
        reader.Finish();
        if (between is { } ends && henry is { } value)
        {
            sections.Add(new InductiveSection(value, q, ohm));
            nodes.Add(ends);
        }
    }

    private static List<SectionCoupling> Couplings(TableReader table, int sections)
    {
        List<SectionCoupling> couplings = [];
        HashSet<(int, int)> named = [];
        foreach (TomlValue item in table.List("coupling", required: false, "a list of couplings [[section, section, factor], ...]"))
        {
            if (item is not TomlList { Items: [TomlNumber first, TomlNumber second, TomlNumber factor] })
            {
                table.Refuse(item.At, item.Phrase, Pattern);
            }
            else if (sections < 2)
            {
                table.Refuse(item.At, "a coupling in windings of one section", "at least two sections");
            }
            else
            {
                int? one = table.Whole(first, 1, sections), other = table.Whole(second, 1, sections);
                if (one is not { } i || other is not { } j)
                {
                    continue;
                }

                if (i == j)
                {
                    table.Refuse(second.At, "a section coupled to itself", Pattern);
                }
                else if (!named.Add((Math.Min(i, j), Math.Max(i, j))))
                {
                    table.Refuse(item.At, $"sections {i} and {j} a second time", "each pair once");
                }
                else if (!(Math.Abs(factor.Number) < 1))
                {
                    table.Refuse(factor.At, factor.Phrase, "a factor between -1 and 1, neither itself");
                }
                else
                {
                    couplings.Add(new SectionCoupling(i - 1, j - 1, factor.Number));
                }
            }
        }

        return couplings;
    }
}
