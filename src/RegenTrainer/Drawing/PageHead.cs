using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>The first two rows: which stage and where the hands are; the pages.</summary>
internal static class PageHead
{
    /// <summary>Rows the head takes.</summary>
    public const int Rows = 2;

    private const string Keys = "? keys";
    private const int ShortestTitle = 12;

    /// <summary>Draws the title line, cut or shortened so that where the hands are always stands whole.</summary>
    /// <param name="canvas">The screen.</param>
    /// <param name="stage">The stage.</param>
    /// <param name="changed">Whether there are unsaved edits: a star follows the title.</param>
    public static void Title(Canvas canvas, StageSnapshot stage, bool changed)
    {
        string title = changed ? stage.Title + " *" : stage.Title;
        string rule = " " + canvas.Glyphs.Rule + canvas.Glyphs.Rule + " ";
        int titleWidth = Printable.Width(title);
        string[] parts = Parts(stage, shortened: false);
        if (Room(canvas, rule, parts) < titleWidth)
        {
            parts = Parts(stage, shortened: true);
        }

        if (Room(canvas, rule, parts) < Math.Min(ShortestTitle, titleWidth))
        {
            parts = parts[..^1];
        }

        int room = Math.Max(0, Room(canvas, rule, parts));
        int column = changed && titleWidth > room
            ? canvas.Put(canvas.Put(1, 0, Printable.Fit(stage.Title, Math.Max(0, room - 2)), Ink.Heading), 0, " *", Ink.Heading)
            : canvas.Put(1, 0, Printable.Fit(title, room), Ink.Heading);
        foreach (string part in parts)
        {
            column = canvas.Put(column, 0, rule, Ink.Label);
            column = canvas.Put(column, 0, part, part == Keys ? Ink.Label : Ink.Text);
        }
    }

    /// <summary>Draws the bar of the pages there are, and beside it what is pinned.</summary>
    public static void Pages(Canvas canvas, IReadOnlyList<PageTab> pages, string pinned)
    {
        int column = 0;
        foreach (PageTab page in pages)
        {
            column = canvas.Put(column + 1, 1, (page.Open ? canvas.Glyphs.OpenPage : " ") + page.Text, page.Open ? Ink.Heading : Ink.Label);
        }

        if (pinned.Length > 0)
        {
            int room = canvas.Width - 1 - (column + 2);
            canvas.PutBefore(canvas.Width - 1, 1, Printable.Fit("pinned: " + pinned, Math.Max(0, room)), Ink.Pinned);
        }
    }

    /// <summary>The index of the page whose tab stands in a column of the bar; -1 where none does.</summary>
    public static int PageAt(IReadOnlyList<PageTab> pages, int column)
    {
        int from = 1;
        for (int k = 0; k < pages.Count; k++)
        {
            int to = from + 1 + pages[k].Text.Length;
            if (column >= from && column < to)
            {
                return k;
            }

            from = to + 1;
        }

        return -1;
    }

    private static int Room(Canvas canvas, string rule, string[] parts) =>
        canvas.Width - 2 - parts.Sum(part => canvas.WidthOf(part) + rule.Length);

    private static string[] Parts(StageSnapshot stage, bool shortened)
    {
        SettingInForce setting = stage.Reading.Setting;
        double dialHz = stage.Setting.DialHz;
        bool locked = setting.DialMode == DialMode.Locked;
        string dial = "dial " + Figures.Dial(dialHz);
        string station = "station " + Figures.Dial(setting.StationHz);
        if (!shortened)
        {
            return [dial + (locked ? ", locked" : ", follows"), station, Socket(setting, ", ", named: true), Keys];
        }

        dial += locked ? " locked" : "";
        string socket = Socket(setting, " ", named: false);
        return Math.Abs(setting.StationHz - dialHz) < 0.5 ? [dial, socket, Keys] : [dial, station, socket, Keys];
    }

    private static string Socket(SettingInForce setting, string between, bool named)
    {
        string?[] parts =
        [
            setting.Device,
            setting.Device is not null && (named || setting.Grade != Grade.Typical) ? setting.Grade.ToString().ToLowerInvariant() : null,
            setting.SupplyVolt is { } volt ? Figures.Fixed(volt, "0.0##") + " V" : null,
            Figures.Fixed(setting.TemperatureCelsius, "0.#") + " \u00b0C",
        ];
        return string.Join(between, parts.Where(part => part is not null));
    }
}
