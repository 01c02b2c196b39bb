using RegenTrainer.Drawing;
using Terminal.Gui.Configuration;
using Terminal.Gui.Drawing;
using Attribute = Terminal.Gui.Drawing.Attribute;

namespace RegenTrainer.Screens;

/// <summary>
/// Colours of the inks, after [Okabe and Ito 2008], chosen for eyes of every kind; the background is the terminal's own. Without
/// colour the inks differ by brightness alone, and by glyph and word as ever.
/// </summary>
internal sealed class Theme
{
    private const string White = "#e4e4e4";
    private const string Grey = "#8a9096";
    private const string SkyBlue = "#56b4e9";
    private const string BluishGreen = "#009e73";
    private const string Yellow = "#f0e442";
    private const string Orange = "#e69f00";
    private const string Vermillion = "#d55e00";

    private readonly Attribute[] _attributes;

    private Theme(bool colour) => _attributes = [.. Enum.GetValues<Ink>().Select(ink => Make(ink, colour))];

    /// <summary>The theme an environment asks for: NO_COLOR, set and not empty, switches colours off (no-color.org).</summary>
    public static Theme Choose(Func<string, string?> variable) => new(string.IsNullOrEmpty(variable("NO_COLOR")));

    /// <summary>How an ink is shown.</summary>
    public Attribute Of(Ink ink) => _attributes[(int)ink];

    /// <summary>How text being typed is shown, and what of it is selected.</summary>
    public Attribute Typed(bool selected) => Of(Ink.Heading) with { Style = selected ? TextStyle.Reverse : TextStyle.Underline };

    /// <summary>Gives the screen library these colours for what it draws by itself, whatever its own settings say.</summary>
    public void Publish()
    {
        Attribute text = Of(Ink.Text), label = Of(Ink.Label), heading = Of(Ink.Heading);
        var scheme = new Scheme
        {
            Normal = text,
            HotNormal = heading,
            Focus = text,
            HotFocus = heading,
            Active = text,
            HotActive = heading,
            Highlight = heading,
            Editable = text,
            ReadOnly = text,
            Disabled = label,
        };
        foreach (string name in (string[])["Base", "Accent", "Dialog", "Menu", "Error"])
        {
            SchemeManager.AddScheme(name, scheme);
        }
    }

    private static Attribute Make(Ink ink, bool colour)
    {
        (string name, TextStyle style) = ink switch
        {
            Ink.Label => (Grey, TextStyle.None),
            Ink.Heading => (White, TextStyle.Bold),
            Ink.Response => (SkyBlue, TextStyle.None),
            Ink.Pinned => (Orange, TextStyle.None),
            Ink.Sidebands => (BluishGreen, TextStyle.None),
            Ink.Idle => (Grey, TextStyle.None),
            Ink.Working => (SkyBlue, TextStyle.None),
            Ink.Edge => (Yellow, TextStyle.Bold),
            Ink.Oscillating => (Vermillion, TextStyle.Bold),
            Ink.Marker => (White, TextStyle.Bold),
            Ink.Caution => (Yellow, TextStyle.None),
            _ => (White, TextStyle.None),
        };
        bool faint = !colour && name == Grey;
        return new Attribute(colour ? new Color(name) : Color.None, Color.None, faint ? TextStyle.Faint : style);
    }
}
