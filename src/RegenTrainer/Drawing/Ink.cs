namespace RegenTrainer.Drawing;

/// <summary>What a mark on the screen means; a theme turns it into a colour, and every meaning has a glyph or word besides.</summary>
internal enum Ink
{
    /// <summary>Figures and words.</summary>
    Text,

    /// <summary>Labels, scales and rules: less than the figures.</summary>
    Label,

    /// <summary>What stands out among words: the title, the open page.</summary>
    Heading,

    /// <summary>The response.</summary>
    Response,

    /// <summary>What is pinned for comparison.</summary>
    Pinned,

    /// <summary>The span of the programme's sidebands.</summary>
    Sidebands,

    /// <summary>The control's travel where the device damps or hardly helps.</summary>
    Idle,

    /// <summary>The travel one works in.</summary>
    Working,

    /// <summary>The last decibel before tip-over.</summary>
    Edge,

    /// <summary>Oscillation.</summary>
    Oscillating,

    /// <summary>Where the control stands.</summary>
    Marker,

    /// <summary>Cautions.</summary>
    Caution,
}

/// <summary>One cell of the screen.</summary>
/// <param name="Grapheme">What stands there; empty in the second column of a wide character.</param>
/// <param name="Ink">What it means.</param>
internal readonly record struct DrawnCell(string Grapheme, Ink Ink);

/// <summary>A rectangle of the screen, in cells.</summary>
/// <param name="Left">First column.</param>
/// <param name="Top">First row.</param>
/// <param name="Width">Columns.</param>
/// <param name="Height">Rows.</param>
internal readonly record struct Region(int Left, int Top, int Width, int Height)
{
    /// <summary>The column after the last.</summary>
    public int Right => Left + Width;

    /// <summary>The row after the last.</summary>
    public int Bottom => Top + Height;
}
