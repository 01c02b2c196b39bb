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
    /// <param name="solver">The stage.</param>
    /// <param name="start">Where the hands are first.</param>
    /// <param name="glyphs">The glyphs asked for; null chooses by the terminal.</param>
    /// <param name="describeFault">Keeps the particulars of a fault and says in one line where.</param>
    /// <returns>0, 70 after a fault, 128 and the number of a signal.</returns>
    public static int Run(IStageSolver solver, Setting start, GlyphSet? glyphs, Func<Exception, string> describeFault)
    {
        var bench = new Bench(new LiveStage(solver, start));
        Theme theme = Theme.Choose(Environment.GetEnvironmentVariable);
        Glyphs chosen = Glyphs.Of(GlyphChoice.Choose(glyphs, Environment.GetEnvironmentVariable));
        return TuiHost.Run(() => new BenchScreen(bench, chosen, theme), theme, describeFault);
    }
}
