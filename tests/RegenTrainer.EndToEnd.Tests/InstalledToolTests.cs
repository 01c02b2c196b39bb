using System.Diagnostics;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>The program as a tool of the .NET command line: packed, installed from that folder, run by its own name.</summary>
public sealed class InstalledToolTests
{
    private static readonly TimeSpan _patience = TimeSpan.FromSeconds(100);

    [Fact]
    public async Task The_packed_tool_installs_and_answers()
    {
        string folder = Directory.CreateTempSubdirectory("regentrainer-tool-").FullName;
        try
        {
            string package = Path.Combine(folder, "package"), tools = Path.Combine(folder, "tools");
            string project = Path.Combine(Repository.Root, "src", "RegenTrainer"), configuration = Path.GetFileName(Path.GetDirectoryName(AppContext.BaseDirectory.TrimEnd(Path.DirectorySeparatorChar))!);
            await Run("dotnet", "pack", project, "--no-build", "-c", configuration, "-o", package);
            await Run("dotnet", "tool", "install", "RegenTrainer", "--tool-path", tools, "--source", package);
            string answer = await Run(Path.Combine(tools, "regentrainer"), "reading", "tapped-coil-npn");
            ProgramRun direct = await ProgramRun.With("reading", "tapped-coil-npn");
            Assert.Equal(direct.Text, answer);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    public static TheoryData<string, string[]> Completions => new()
    {
        { "regentrainer read", ["reading"] },
        { "regentrainer reading tapped-coil-np", ["tapped-coil-npn"] },
        { "regentrainer reading tapped-coil-npn --gra", ["--grade"] },
        { "regentrainer reading tapped-coil-npn --grade ", ["strong", "typical", "weak"] },
        { "regentrainer reading tapped-coil-npn --device BC5", ["BC547B", "BC557B"] },
        { "regentrainer completions ", ["bash"] },
    };

    [Theory]
    [MemberData(nameof(Completions))]
    public async Task Bash_completes_what_can_follow(string line, string[] expected)
    {
        if (OperatingSystem.IsWindows())
        {
            Assert.Skip("bash is a shell of other systems");
        }

        // The words are split as bash would before it calls the function.
        const string script = """
            regentrainer() { dotnet "$PROGRAM" "$@"; }
            source <(regentrainer completions bash)
            read -ra COMP_WORDS <<< "$COMP_LINE"
            [[ $COMP_LINE == *' ' ]] && COMP_WORDS+=('')
            COMP_POINT=${#COMP_LINE} COMP_CWORD=$((${#COMP_WORDS[@]} - 1))
            _regentrainer
            printf '%s\n' "${COMPREPLY[@]}"
            """;
        string answer = await RunWith("bash", new() { ["PROGRAM"] = ProgramRun.ProgramPath, ["COMP_LINE"] = line }, "--noprofile", "--norc", "-c", script);
        string[] words = [.. answer.Split('\n', StringSplitOptions.RemoveEmptyEntries).Where(w => !w.StartsWith('-') || line.EndsWith("--gra", StringComparison.Ordinal))];
        Assert.Equal(expected, words);
    }

    private static Task<string> Run(string program, params string[] arguments) => RunWith(program, [], arguments);

    private static async Task<string> RunWith(string program, Dictionary<string, string> variables, params string[] arguments)
    {
        var start = new ProcessStartInfo(program) { UseShellExecute = false, RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = Path.GetTempPath() };
        foreach (string argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        foreach ((string name, string value) in variables)
        {
            start.Environment[name] = value;
        }

        using Process process = Process.Start(start)!;
        using var cut = new CancellationTokenSource(_patience);
        Task<string> results = process.StandardOutput.ReadToEndAsync(cut.Token), messages = process.StandardError.ReadToEndAsync(cut.Token);
        try
        {
            await Task.WhenAll(results, messages, process.WaitForExitAsync(cut.Token));
        }
        finally
        {
            if (!process.HasExited)
            {
                process.Kill(entireProcessTree: true);
            }
        }

        Assert.True(process.ExitCode == 0, $"{program} {string.Join(' ', arguments)}: {await results}{await messages}");
        return await results;
    }
}
