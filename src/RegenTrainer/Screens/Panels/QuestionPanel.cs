using RegenTrainer.Drawing;
using RegenTrainer.Session;
using Terminal.Gui.Input;

namespace RegenTrainer.Screens.Panels;

/// <summary>An answer to a question.</summary>
/// <param name="Key">The letter that gives it.</param>
/// <param name="Words">What it says.</param>
/// <param name="Do">What follows.</param>
internal sealed record Answer(char Key, string Words, Action Do);

/// <summary>A question with a few answers; Escape answers none of them and changes nothing.</summary>
/// <param name="heading">The question.</param>
/// <param name="words">What there is to know.</param>
/// <param name="answers">The answers; the last way out stands below them.</param>
/// <param name="escape">What Escape means.</param>
internal sealed class QuestionPanel(string heading, string words, IReadOnlyList<Answer> answers, string escape) : IPanel
{
    private readonly Pick _pick = new(answers.Count, 0);
    private int _answersTop;

    /// <inheritdoc/>
    public string Name => "question";

    /// <inheritdoc/>
    public IReadOnlyList<(string Key, string Does)> Keys => [];

    /// <inheritdoc/>
    public Entry? Entry => null;

    /// <summary>Keys of the hands would be taken for answers.</summary>
    public bool TakesText => true;

    /// <inheritdoc/>
    public bool IsDone { get; private set; }

    /// <inheritdoc/>
    public int ResponsePoints(Region region, Glyphs glyphs) => 2;

    /// <inheritdoc/>
    public void Draw(Canvas canvas, Region region, StageSnapshot stage)
    {
        canvas.Put(region.Left, region.Top, heading, Ink.Heading, region.Right);
        int row = canvas.PutWrapped(region with { Top = region.Top + 1, Height = region.Height - 3 - answers.Count }, words, Ink.Text);
        _answersTop = row + 1;
        PickList.Draw(canvas, Answers(region), [.. answers.Select(answer => $"{answer.Key}    {answer.Words}")], _pick.Selected, 0);
        canvas.Put(region.Left + PickList.MarkWidth, _answersTop + answers.Count, "Esc  " + escape, Ink.Label, region.Right);
    }

    /// <inheritdoc/>
    public bool Press(Key key)
    {
        if (_pick.Move(key))
        {
            return true;
        }

        int character = key.IsAlt || key.IsCtrl ? 0 : key.AsRune.Value;
        if ((key == Key.Enter ? answers[_pick.Selected] : answers.FirstOrDefault(a => a.Key == character)) is { } answer)
        {
            Give(answer);
            return true;
        }

        return false;
    }

    /// <inheritdoc/>
    public bool Click(Region region, int column, int row)
    {
        bool? again = _pick.Click(Answers(region), column, row);
        if (again == true)
        {
            Give(answers[_pick.Selected]);
        }

        return again is not null;
    }

    /// <inheritdoc/>
    public bool StepBack() => false;

    /// <inheritdoc/>
    public void Close()
    {
    }

    private Region Answers(Region region) => region with { Top = _answersTop, Height = answers.Count };

    private void Give(Answer answer)
    {
        IsDone = true;
        answer.Do();
    }
}
