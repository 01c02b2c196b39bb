using System.Globalization;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Screens.Panels;
using RegenTrainer.Session;

namespace RegenTrainer.Screens;

/// <summary>
/// Saving, opening, recovering and quitting: asks wherever something could be lost or written over, and otherwise does it. It is
/// called by keys alone, so that no question can stand in the way of a signal or a fault.
/// </summary>
/// <param name="workbench">The design and its file.</param>
/// <param name="panels">Where questions open.</param>
/// <param name="tell">Tells how it went.</param>
/// <param name="quit">Ends the screen.</param>
internal sealed class FileDesk(Workbench workbench, PanelStack panels, Action<string> tell, Action quit)
{
    private const string StaysOpen = "stay here";

    private string ShownName => Printable.Text(workbench.Document.Name);

    /// <summary>Saves into the stage's file.</summary>
    public void Save() => Save(() => { });

    /// <summary>Saves into another file, which is the stage's own from then on.</summary>
    public void SaveAs() => AskPath("it is the stage's own file from then on", StartPath(), () => { });

    /// <summary>Opens another stage.</summary>
    public void Open()
    {
        if (!workbench.IsChanged)
        {
            AskStage();
            return;
        }

        Ask(
            "open another stage?",
            $"{ShownName} has edits that are not saved; another stage takes its place.",
            StaysOpen,
            new Answer('s', "save them first", () => Save(AskStage)),
            new Answer('l', "leave them unsaved", AskStage));
    }

    /// <summary>Ends, and asks first where there are edits that are not saved.</summary>
    public void Quit()
    {
        if (!workbench.IsChanged)
        {
            quit();
            return;
        }

        Ask(
            "quit?",
            $"{ShownName} has edits that are not saved.",
            StaysOpen,
            new Answer('s', "save them and quit", () => Save(quit)),
            new Answer('l', "leave them unsaved and quit", quit));
    }

    /// <summary>Offers the unsaved work of a session that did not end cleanly, if any was found.</summary>
    public void OfferRecovery()
    {
        if (workbench.Found is not { } found)
        {
            return;
        }

        string at = found.At.ToLocalTime().ToString("d MMMM yyyy, HH:mm", CultureInfo.InvariantCulture);
        string where = found.Path is { } path ? $"It belongs to {Printable.Text(path)}, which is untouched." : "It was never saved to a file.";
        Ask(
            "take up unsaved work?",
            $"A session on {Printable.Text(found.Name)} ended without saving. Its edits were kept on {at}. {where}",
            "decide at the next start; they stay kept",
            new Answer('t', "take it up: the edits come back, still unsaved", Take),
            new Answer('d', "drop it: the edits are gone for good", Drop));
    }

    private void Take()
    {
        workbench.TakeRecovery();
        panels.CloseAll();
        tell(workbench.IsChanged ? "the edits are back; w saves them" : "");
        OfferRecovery();
    }

    private void Drop()
    {
        workbench.DropRecovery();
        OfferRecovery();
    }

    private void Save(Action then) => Settle(workbench.Save(), null, then);

    /// <summary>Goes on with what a file had to say to a save.</summary>
    /// <param name="answer">How it went.</param>
    /// <param name="path">The path that was asked for; null for the stage's own.</param>
    /// <param name="then">What follows once it is saved.</param>
    private void Settle(FileAnswer answer, string? path, Action then)
    {
        var elsewhere = new Answer('a', "save under another name", () => AskPath("", path ?? StartPath(), then));
        switch (answer.Outcome)
        {
            case FileOutcome.NeedsPath:
                AskPath(answer.Words, StartPath(), then);
                break;
            case FileOutcome.ChangedOnDisk:
                Ask(
                    "write over it?",
                    answer.Words,
                    "write nothing",
                    elsewhere,
                    new Answer('o', "write over what is there now", () => Settle(workbench.Save(evenIfChanged: true), path, then)));
                break;
            case FileOutcome.Exists:
                Ask(
                    "replace it?",
                    answer.Words,
                    "write nothing",
                    elsewhere,
                    new Answer('r', "replace what is there", () => Settle(workbench.SaveAs(path!, replace: true), path, then)));
                break;
            case FileOutcome.Refused:
                Ask("it is not saved", answer.Words, "leave it unsaved for now", elsewhere);
                break;
            default:
                tell(answer.Words);
                then();
                break;
        }
    }

    private void AskPath(string words, string path, Action then) => panels.Open(new PathPanel(
        words,
        path,
        typed =>
        {
            FileAnswer answer = workbench.SaveAs(typed);
            if (answer.Outcome == FileOutcome.Refused)
            {
                return answer.Words;
            }

            Settle(answer, typed, then);
            return "";
        }));

    private void AskStage() => panels.Open(new OpenPanel(
        StageChoices.Of(workbench.LastUsed, "."),
        typed =>
        {
            FileAnswer answer = workbench.Open(typed);
            if (answer.Outcome is not (FileOutcome.Done or FileOutcome.OpenElsewhere))
            {
                return answer.Words;
            }

            // What lies beneath belongs to the stage that was there before.
            panels.CloseAll();
            tell(answer.Words);
            if (answer.Outcome == FileOutcome.OpenElsewhere)
            {
                Ask(
                    "it is open elsewhere",
                    answer.Words,
                    "go on with it",
                    new Answer('a', "save it under another name and go on with that", SaveAs),
                    new Answer('o', "open another stage", AskStage));
            }

            return "";
        }));

    /// <summary>The stage's own path, or its name in the folder the program was started in.</summary>
    private string StartPath() =>
        workbench.Document.Path ?? (workbench.Document.Name.EndsWith(".toml", StringComparison.Ordinal) ? workbench.Document.Name : workbench.Document.Name + ".toml");

    private void Ask(string heading, string words, string escape, params Answer[] answers) =>
        panels.Open(new QuestionPanel(heading, words, answers, escape));
}
