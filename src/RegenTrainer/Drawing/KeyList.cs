namespace RegenTrainer.Drawing;

/// <summary>The keys there are, in words, by what they are for.</summary>
internal static class KeyList
{
    private const int KeyWidth = 12;
    private const int Gap = 3;

    private static readonly (string Key, string Does)[] _control =
    [
        ("Left Right", "by 0.5 %"),
        ("Shift, n m", "by 0.05 %"),
        ("Ctrl, N M", "by 5 %"),
        ("Home End", "the stops"),
        ("t", "0.3 dB below tip-over"),
    ];

    private static readonly (string Key, string Does)[] _conditions =
    [
        ("v V", "supply by 0.1 V"),
        ("c C", "temperature by 1 \u00b0C"),
        ("d", "weak, typical, strong"),
    ];

    private static readonly (string Key, string Does)[] _tuning =
    [
        (", .", "dial by one channel"),
        ("< >", "dial by 1 kHz"),
        ("l", "dial locked or follows"),
        ("[ ]", "station by one channel"),
        ("{ }", "station by 1 kHz"),
        ("=", "station back to dial"),
    ];

    private static readonly (string Key, string Does)[] _bench =
    [
        ("e", "parts of the stage"),
        ("u r", "undo, redo"),
        ("w W", "save, save as"),
        ("o", "open another stage"),
        ("p", "pin for comparison"),
        ("Esc", "closes what is open"),
        ("q", "quit"),
    ];

    /// <summary>Draws the keys of the hands and the bench, and those of what is open.</summary>
    public static void Draw(Canvas canvas, Region region, string open, IReadOnlyList<(string Key, string Does)> openKeys)
    {
        int half = (region.Width - Gap) / 2;
        var left = new Region(region.Left, region.Top, half, region.Height);
        left = Group(canvas, left, "control; wheel and drag on the strip", _control);
        left = Group(canvas, left, "battery, room, device", _conditions);
        Group(canvas, left, "here: " + open, openKeys);
        var right = new Region(region.Left + half + Gap, region.Top, half, region.Height);
        right = Group(canvas, right, "tuning", _tuning);
        Group(canvas, right, "bench; digits and clicks open pages", _bench);
    }

    /// <summary>Draws one group and returns what is left of the region.</summary>
    private static Region Group(Canvas canvas, Region region, string heading, IReadOnlyList<(string Key, string Does)> keys)
    {
        int row = region.Top;
        canvas.Put(region.Left, row++, heading, Ink.Heading, region.Right);
        foreach ((string key, string does) in keys)
        {
            canvas.Put(region.Left, row, key, Ink.Text, region.Right);
            canvas.Put(region.Left + KeyWidth, row++, does, Ink.Label, region.Right);
        }

        return region with { Top = row, Height = region.Bottom - row };
    }
}
