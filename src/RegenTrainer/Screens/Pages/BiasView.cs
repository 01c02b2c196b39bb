using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Pages;

/// <summary>Page 8: the operating point.</summary>
internal sealed class BiasView(Bench bench) : IPage, IDisposable
{
    private readonly LatestRequest<StageRequest, BiasAnswer> _answers = new((request, _) => BiasAnswer.Of(request), cutShort: false);
    private readonly LatestRequest<StageRequest, BiasAnswer> _pinnedAnswers = new((request, _) => BiasAnswer.Of(request), cutShort: false);
    private bool _nodes;

    /// <inheritdoc/>
    public char Digit => '8';

    /// <inheritdoc/>
    public string Name => "Bias";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys => [("Tab", "voltages of the nodes")];

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => 2;

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage)
    {
        _answers.Ask(new StageRequest(bench.Stage.Solver, stage.Setting));
        if (bench.Pinned is { } pinned)
        {
            _pinnedAnswers.Ask(new StageRequest(pinned.Solver, pinned.Stage.Setting));
        }

        BiasAnswer? against = bench.Pinned is null ? null : _pinnedAnswers.Latest?.Result;
        BiasPage.Draw(canvas, region, new BiasPicture(_answers.Latest?.Result, _answers.IsWorking, against, _nodes));
    }

    /// <inheritdoc/>
    public bool Press(Key key)
    {
        bool tab = key == Key.Tab || key == Key.Tab.WithShift;
        _nodes ^= tab;
        return tab;
    }

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row) => false;

    /// <inheritdoc/>
    public bool Poll() => _answers.Poll() | _pinnedAnswers.Poll();

    /// <inheritdoc/>
    public void Dispose()
    {
        _answers.Dispose();
        _pinnedAnswers.Dispose();
    }
}
