using RegenTrainer.Core.Antennas;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads what makes a part an antenna: the wire behind an electromotive force, or windings that pick up the field.</summary>
internal static class PickUpTable
{
    private const string Shares = "shares";

    /// <summary>The antenna with its wire, where one is described.</summary>
    public static Antenna WithWire(TableReader table, Antenna antenna)
    {
        if (table.Inner("wire", required: false, "wire = { length = .., height = .., diameter = .. }") is not { } inner)
        {
            return antenna;
        }

        double? length = inner.Quantity("length", Unit.Metre, 0.1, 1000, required: true);
        double? height = inner.Quantity("height", Unit.Metre, 0.1, 300, required: true);
        double? diameter = inner.Quantity("diameter", Unit.Metre, 10e-6, 0.1, required: true);
        inner.Finish();
        if (height > length || diameter > 0.1 * height)
        {
            string key = height > length ? "height" : "diameter";
            TomlValue there = inner.Table.Find(key)!.Value;
            table.Refuse(there.At, there.Phrase, key == "height" ? "at most the length of the wire" : "at most a tenth of the height");
            return antenna;
        }

        return length is { } l && height is { } h && diameter is { } d ? antenna with { Wire = new WireOverGround(l, h, d) } : antenna;
    }

    /// <summary>The windings with what they pick up, where they are an antenna.</summary>
    public static Windings? WithPickUp(TableReader table, Windings? windings)
    {
        if (table.Inner("picks_up", required: false, "picks_up = { shares = [..], area = .. }") is not { } inner)
        {
            return windings;
        }

        int before = table.Faults.Count;
        double? area = inner.Quantity("area", Unit.None, 1e-9, 1e6, required: false);
        List<double> shares = [];
        foreach (TomlValue item in inner.List(Shares, required: true, "a list of shares, one for each section"))
        {
            if (item is TomlNumber { Number: >= -1 and <= 1 } share)
            {
                shares.Add(share.Number);
            }
            else
            {
                table.Refuse(item.At, item.Phrase, "a share from -1 to 1");
            }
        }

        inner.Finish();
        if (windings is not null && table.Faults.Count == before && shares.Count != windings.Model.SectionCount)
        {
            table.Refuse(inner.Table.Find(Shares)!.Value.At, $"{shares.Count} shares", $"{windings.Model.SectionCount}: one for each section");
        }

        return table.Faults.Count == before && windings is not null ? windings with { PickUp = new CoilPickUp(shares, area) } : windings;
    }
}
