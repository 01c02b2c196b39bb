using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Pages;

/// <summary>One page of the bench: what it shows between head and foot, and the keys that are its own.</summary>
internal interface IPage
{
    /// <summary>The digit that opens it.</summary>
    char Digit { get; }

    /// <summary>Its name in the bar of pages.</summary>
    string Name { get; }

    /// <summary>Its own keys in words, at most four.</summary>
    IReadOnlyList<(string Key, string Does)> Keys { get; }

    /// <summary>Evenly spaced points of the response it shows in a region.</summary>
    int ResponsePoints(Region region, Glyphs glyphs);

    /// <summary>Draws the page.</summary>
    void Draw(Canvas canvas, Region region, StageSnapshot stage);

    /// <summary>Does what one of Up, Down, PageUp, PageDown, Enter and Tab means here; false where it means nothing.</summary>
    bool Press(Key key);

    /// <summary>Does what a click on a cell of the region means; false where it means nothing.</summary>
    bool Click(Region region, int column, int row);

    /// <summary>Takes up what has been worked out since the last call; true where that changes what is shown.</summary>
    bool Poll();
}
