using System.Text;
using RegenTrainer.Core.Regeneration;

namespace RegenTrainer.Drawing;

/// <summary>Which characters a terminal can show.</summary>
internal enum GlyphSet
{
    /// <summary>All, braille patterns too.</summary>
    Braille,

    /// <summary>Those of the fonts of text consoles: block elements, but no braille.</summary>
    Blocks,

    /// <summary>ASCII (ISO/IEC 646) alone.</summary>
    Ascii,
}

/// <summary>The characters of a glyph set, each with one meaning.</summary>
internal sealed class Glyphs
{
    /// <summary>Bits of a braille pattern by column and row of the dot (Unicode, Braille Patterns).</summary>
    private static readonly byte[] _brailleBits = [0x01, 0x02, 0x04, 0x40, 0x08, 0x10, 0x20, 0x80];

    private readonly string[] _patterns;
    private readonly Dictionary<char, string> _spelling;

    private Glyphs(GlyphSet set, int dotsAcross, int dotsDown, string[] patterns, Dictionary<char, string> spelling)
    {
        (Set, DotsAcross, DotsDown, _patterns, _spelling) = (set, dotsAcross, dotsDown, patterns, spelling);
    }

    public static Glyphs Braille { get; } = new(
        GlyphSet.Braille, 2, 4, [.. Enumerable.Range(0, 256).Select(bits => bits == 0 ? " " : ((char)(0x2800 + bits)).ToString())], [])
    {
        Shade = "\u2822",
        Damped = "\u00b7",
        Idle = "\u2591",
        Working = "\u2592",
        Edge = "\u2593",
        TipOver = "\u2503",
        Oscillating = "\u00d7",
        Marker = "\u25b2",
        Rule = "\u2500",
        Tick = "\u2534",
        Upright = "\u2502",
        OpenPage = "\u25b8",
    };

    public static Glyphs Blocks { get; } = new(
        GlyphSet.Blocks,
        1,
        2,
        [" ", "\u2580", "\u2584", "\u2588"],
        new() { ['\u2212'] = "-", ['\u2026'] = "~", ['\u2014'] = "-", ['\u221e'] = "inf" })
    {
        Shade = "\u2591",
        Damped = "\u00b7",
        Idle = "\u2591",
        Working = "\u2592",
        Edge = "\u2593",
        TipOver = "\u2588",
        Oscillating = "x",
        Marker = "^",
        Rule = "\u2500",
        Tick = "\u2534",
        Upright = "\u2502",
        OpenPage = ">",
    };

    public static Glyphs Ascii { get; } = new(
        GlyphSet.Ascii,
        1,
        1,
        [" ", "*"],
        new()
        {
            ['\u2212'] = "-",
            ['\u2026'] = "~",
            ['\u2014'] = "-",
            ['\u221e'] = "inf",
            ['\u00b1'] = "+/-",
            ['\u00b7'] = "/",
            ['\u00b5'] = "u",
            ['\u2126'] = "ohm",
            ['\u03a9'] = "ohm",
            ['\u2500'] = "-",
        })
    {
        Shade = ":",
        Damped = ",",
        Idle = ".",
        Working = "=",
        Edge = "#",
        TipOver = "|",
        Oscillating = "x",
        Marker = "^",
        Rule = "-",
        Tick = "+",
        Upright = "|",
        OpenPage = ">",
    };

    public GlyphSet Set { get; }

    /// <summary>Dots of a plot in one cell, side by side.</summary>
    public int DotsAcross { get; }

    /// <summary>Dots of a plot in one cell, one above the other.</summary>
    public int DotsDown { get; }

    /// <summary>An uninterrupted curve.</summary>
    public Stroke Solid { get; } = new(1, 0);

    /// <summary>A dotted curve.</summary>
    public Stroke Dotted => Set == GlyphSet.Braille ? new(1, 3) : new(1, 1);

    /// <summary>A dashed curve.</summary>
    public Stroke Dashed => Set == GlyphSet.Braille ? new(6, 4) : new(3, 2);

    /// <summary>Under the curve, where the programme's sidebands are.</summary>
    public required string Shade { get; init; }

    public required string Damped { get; init; }

    public required string Idle { get; init; }

    public required string Working { get; init; }

    public required string Edge { get; init; }

    public required string TipOver { get; init; }

    public required string Oscillating { get; init; }

    /// <summary>Where the control stands.</summary>
    public required string Marker { get; init; }

    public required string Rule { get; init; }

    public required string Tick { get; init; }

    /// <summary>An upright line: the cursor of a plot.</summary>
    public required string Upright { get; init; }

    public required string OpenPage { get; init; }

    public static Glyphs Of(GlyphSet set) => set switch
    {
        GlyphSet.Blocks => Blocks,
        GlyphSet.Ascii => Ascii,
        _ => Braille,
    };

    /// <summary>The bit of a dot in a cell's pattern.</summary>
    public byte Bit(int across, int down) => Set == GlyphSet.Braille ? _brailleBits[(across * 4) + down] : (byte)(1 << down);

    /// <summary>The character of a cell with these dots.</summary>
    public string Pattern(byte bits) => _patterns[bits];

    /// <summary>The character that fills a stretch of the strip.</summary>
    public string Of(Regime regime) => regime switch
    {
        Regime.Damped => Damped,
        Regime.Idle => Idle,
        Regime.Working => Working,
        Regime.Edge => Edge,
        _ => Oscillating,
    };

    /// <summary>A text spelled with the characters of the set; what has no spelling becomes a question mark in ASCII.</summary>
    public string Spell(string text)
    {
        if (Set == GlyphSet.Braille || System.Text.Ascii.IsValid(text))
        {
            return text;
        }

        var spelled = new StringBuilder(text.Length + 8);
        for (int k = 0; k < text.Length; k++)
        {
            char c = text[k];
            if (c == '\u00b0' && Set == GlyphSet.Ascii)
            {
                // 186 deg, but 20 C.
                spelled.Append(k + 1 < text.Length && text[k + 1] == 'C' ? "" : " deg");
            }
            else if (_spelling.TryGetValue(c, out string? other))
            {
                spelled.Append(other);
            }
            else if (Set != GlyphSet.Ascii || char.IsAscii(c))
            {
                spelled.Append(c);
            }
            else if (!char.IsLowSurrogate(c))
            {
                spelled.Append('?');
            }
        }

        return spelled.ToString();
    }
}
