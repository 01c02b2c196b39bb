using RegenTrainer.Drawing;

namespace RegenTrainer.Screens;

/// <summary>A line of text being typed over a panel.</summary>
/// <param name="text">What it begins with.</param>
/// <param name="place">Where it stands in a panel's region; one row.</param>
/// <param name="typed">Told of every change by its typist.</param>
internal sealed class Entry(string text, Func<Region, Region> place, Action<string> typed)
{
    /// <summary>The text now.</summary>
    public string Text { get; set; } = text;

    /// <summary>Where it stands in a panel's region.</summary>
    public Region Place(Region panel) => place(panel);

    /// <summary>Takes a change by its typist.</summary>
    public void Type(string changed)
    {
        Text = changed;
        typed(changed);
    }
}
