namespace RegenTrainer.Drawing;

/// <summary>The keys there are, in words.</summary>
internal static class KeyList
{
    private const int KeyWidth = 12;
    private const int Gap = 3;

    private static readonly (string Key, string Does)[] _hands =
    [
        ("Left Right", "control by 0.5 %"),
        ("with Shift", "by 0.05 %, also n m"),
        ("with Ctrl", "by 5 %, also N M"),
        ("Home End", "the stops"),
        ("t", "0.3 dB below tip-over"),
        ("mouse", "wheel and drag on strip"),
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
        ("?", "these keys"),
        ("Esc", "closes what is open"),
        ("q", "quit"),
    ];

    public static void Draw(Canvas canvas, Region region)
    {
        canvas.Put(region.Left, region.Top, "keys (? or Esc closes)", Ink.Heading, region.Right);
        int half = (region.Width - Gap) / 2;
        Column(canvas, new Region(region.Left, region.Top + 2, half, region.Height - 2), _hands);
        Column(canvas, new Region(region.Left + half + Gap, region.Top + 2, half, region.Height - 2), _tuning);
    }

    private static void Column(Canvas canvas, Region region, (string Key, string Does)[] keys)
    {
        int row = region.Top;
        foreach ((string key, string does) in keys)
        {
            canvas.Put(region.Left, row, key, Ink.Text, region.Right);
            canvas.Put(region.Left + KeyWidth, row++, does, Ink.Label, region.Right);
        }
    }
}
