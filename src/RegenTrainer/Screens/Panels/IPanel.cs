using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>What stands in place of the page until it is closed: the keys, the parts, a list, a question.</summary>
internal interface IPanel
{
    /// <summary>Whether typed characters are text here rather than keys of the hands.</summary>
    bool TakesText { get; }

    /// <summary>Whether it has done its work and is to be closed.</summary>
    bool IsDone { get; }

    /// <summary>What it is called in the list of keys.</summary>
    string Name { get; }

    /// <summary>Its own keys in words, at most four; none where they stand in the panel itself.</summary>
    IReadOnlyList<(string Key, string Does)> Keys { get; }

    /// <summary>The line of text that is open over it; null where none is.</summary>
    Entry? Entry { get; }

    /// <summary>Evenly spaced points of the response it shows in a region.</summary>
    int ResponsePoints(Region region, Glyphs glyphs);

    /// <summary>Draws the panel.</summary>
    void Draw(Canvas canvas, Region region, StageSnapshot stage);

    /// <summary>Does what a key means here; false leaves it to the hands. Escape is the screen's and closes the panel.</summary>
    bool Press(Key key);

    /// <summary>Does what a click on a cell of the region means; false where it means nothing.</summary>
    bool Click(Region region, int column, int row);

    /// <summary>Closes what is open inside of it; false where nothing is, so that Escape closes the panel itself.</summary>
    bool StepBack();

    /// <summary>Called once as it closes, however it does.</summary>
    void Close();
}
