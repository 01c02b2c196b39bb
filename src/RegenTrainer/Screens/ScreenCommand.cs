using RegenTrainer.Core.Stages;
using RegenTrainer.Drawing;
using RegenTrainer.Session;

namespace RegenTrainer.Screens;

/// <summary>Opens the screen of a stage.</summary>
internal static class ScreenCommand
{
    /// <summary>Whether there is a terminal to open it on.</summary>
    public static bool CanRun() => TuiHost.CanRun();

    /// <summary>Shows a stage until its user quits.</summary>
    /// <param name="document">The stage.</param>
    /// <param name="start">Where the hands are first.</param>
    /// <param name="audioHz">Audio frequencies of a reading's sidebands in Hz, above 0.</param>
    /// <param name="glyphs">The glyphs asked for; null chooses by the terminal.</param>
    /// <param name="describeFault">Keeps the particulars of a fault and says in one line where.</param>
    /// <returns>0, 70 after a fault, 128 and the number of a signal.</returns>
    public static int Run(
        StageDocument document, Setting start, IReadOnlyList<double> audioHz, GlyphSet? glyphs, Func<Exception, string> describeFault)
    {
        using var workbench = new Workbench(document, start, audioHz, Surroundings.OfUser());
        var bench = new Bench(workbench);
        Theme theme = Theme.Choose(Environment.GetEnvironmentVariable);
        Glyphs chosen = Glyphs.Of(GlyphChoice.Choose(glyphs, Environment.GetEnvironmentVariable));
        int exit = TuiHost.Run(() => new BenchScreen(bench, chosen, theme), theme, describeFault);
        if (exit != 0)
        {
            // A signal or a fault ended the screen, not its user: what was not saved is offered at the next start.
            workbench.LeaveRecovery();
        }

        return exit;
    }
}
