using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Drawing;

/// <summary>What the Parts panel shows beside the stage itself.</summary>
/// <param name="Rows">The rows of the list.</param>
/// <param name="Selected">The selected one; always a field.</param>
/// <param name="Top">The first row to be seen.</param>
/// <param name="Design">The design with all edits.</param>
/// <param name="Saved">The design as it is in the file.</param>
/// <param name="Coil">The coil at the dial; null where there is none.</param>
internal sealed record PartsPicture(
    IReadOnlyList<PartRow> Rows, int Selected, int Top, StageDesign Design, StageDesign Saved, CoilReading? Coil)
{
    /// <summary>What can be picked for the selected field; null where no such list is open.</summary>
    public PickPicture? Pick { get; init; }

    /// <summary>Why what was typed or asked for cannot be; empty where nothing is wrong.</summary>
    public string Refusal { get; init; } = "";

    /// <summary>Characters before the first wrong one of what is typed; null where nothing is typed or wrong.</summary>
    public int? FaultAt { get; init; }

    /// <summary>The keys of the moment, in words.</summary>
    public string Hint { get; init; } = "";
}

/// <summary>A list that is open.</summary>
/// <param name="Heading">What its columns are.</param>
/// <param name="Entries">Its entries.</param>
/// <param name="Selected">The selected one.</param>
/// <param name="Top">The first to be seen.</param>
internal sealed record PickPicture(string Heading, IReadOnlyList<string> Entries, int Selected, int Top);
