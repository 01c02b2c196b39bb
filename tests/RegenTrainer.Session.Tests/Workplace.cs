using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Session.Keeping;

namespace RegenTrainer.Session.Tests;

/// <summary>A folder for stage files and a home of its own, both gone with it.</summary>
internal sealed class Workplace : IDisposable
{
    private readonly List<Workbench> _benches = [];

    public Workplace()
    {
        Folder = Directory.CreateTempSubdirectory("workplace-").FullName;
        Places = new Places(Path.Combine(Folder, "config", "regentrainer"), Path.Combine(Folder, "state", "regentrainer")) { Home = Folder };
    }

    public string Folder { get; }

    public Places Places { get; init; }

    public ManualClock Clock { get; } = new();

    /// <summary>A process that ended: the system starts none with this number.</summary>
    public static ProcessMark Ended { get; } = new(0x7FFFFFF0, 1);

    public string Put(string name, string text)
    {
        string path = At(name);
        File.WriteAllText(path, text);
        return path;
    }

    public string PutPreset(string name = "stage.toml", string preset = Presets.Default) => Put(name, Presets.Text(preset));

    public string At(string name) => Path.Combine(Folder, name);

    public Workbench Open(string presetOrPath = Presets.Default, ProcessMark? process = null)
    {
        OpenedFile file = StageFiles.Open(presetOrPath, Places);
        Assert.True(file.Design is not null, file.Message ?? string.Join('\n', file.Faults));
        var bench = new Workbench(
            StageDocument.Of(presetOrPath, file), new Setting(1e6, 50), StageReader.DefaultAudioHz, new Surroundings(Places, Clock, process ?? ProcessMark.Own));
        _benches.Add(bench);
        return bench;
    }

    public IReadOnlyList<string> Recoveries() =>
        Directory.Exists(Places.State) ? Directory.GetFiles(Places.State, "recovery-*.toml") : [];

    /// <summary>Lets the screen turn until something holds; the file work behind it has 10 s of real time.</summary>
    public static void Until(Workbench bench, Func<bool> holds)
    {
        for (int turn = 0; !holds(); turn++)
        {
            Assert.True(turn < 1000, "it did not come about: " + bench.Notice);
            bench.Tick();
            Thread.Sleep(10);
        }
    }

    /// <summary>Lets a second go by with the screen turning, and the file work of it end.</summary>
    public void Second(Workbench bench)
    {
        Clock.Go(1);
        bench.Tick();
        for (int turn = 0; turn < 30; turn++)
        {
            Thread.Sleep(5);
            bench.Tick();
        }
    }

    public void Dispose()
    {
        _benches.ForEach(b => b.Dispose());
        Directory.Delete(Folder, recursive: true);
    }
}
