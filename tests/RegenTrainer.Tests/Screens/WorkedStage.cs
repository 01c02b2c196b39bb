using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Screens;
using RegenTrainer.Session;
using Terminal.Gui.Input;
using Glyphs = RegenTrainer.Drawing.Glyphs;

namespace RegenTrainer.Tests.Screens;

/// <summary>A stage file in a folder of its own, worked on at a screen; the user's own places are in that folder too.</summary>
internal sealed class WorkedStage : IDisposable
{
    private readonly BenchScreen _screen;

    /// <summary>Opens it.</summary>
    /// <param name="columns">Width of the screen.</param>
    /// <param name="rows">Height of the screen.</param>
    /// <param name="preset">Whether the stage is the preset itself rather than a file of its text.</param>
    /// <param name="folder">The folder; null for one of its own.</param>
    public WorkedStage(int columns = 80, int rows = 24, bool preset = false, string? folder = null)
    {
        Folder = folder ?? Directory.CreateTempSubdirectory("regentrainer-screen-").FullName;
        File = Path.Combine(Folder, "stage.toml");
        if (!System.IO.File.Exists(File))
        {
            System.IO.File.WriteAllText(File, Presets.Text(Presets.Default));
        }

        string name = preset ? Presets.Default : File;
        StageDocument document = StageDocument.Of(name, StageFiles.Open(name));
        Workbench = new Workbench(document, new Setting(1e6, 50), StageReader.DefaultAudioHz, Around);
        Bench = new Bench(Workbench);
        Theme theme = Theme.Choose(_ => null);
        _screen = new BenchScreen(Bench, Glyphs.Braille, theme);
        Terminal = new HeadlessTerminal(_screen, theme, columns, rows);
    }

    public string Folder { get; }

    public string File { get; }

    public Workbench Workbench { get; }

    public Bench Bench { get; }

    public HeadlessTerminal Terminal { get; }

    public Surroundings Around => Surroundings.OfUser() with
    {
        Places = new Places(Path.Combine(Folder, "config"), Path.Combine(Folder, "state")) { Home = Folder },
    };

    public string Text => Terminal.Text;

    public bool IsStopped => _screen.StopRequested;

    /// <summary>Opens Parts and goes to a field.</summary>
    public void GoTo(string key)
    {
        Terminal.Type("e");
        foreach (Field field in Workbench.Design.Family.Fields)
        {
            if (field.Key == key)
            {
                return;
            }

            Terminal.Press(Key.CursorDown);
        }
    }

    public void Dispose()
    {
        Terminal.Dispose();
        _screen.Dispose();
        Workbench.Dispose();
        if (Directory.Exists(Folder))
        {
            Directory.Delete(Folder, recursive: true);
        }
    }
}
