using System.Diagnostics;
using System.Text;
using System.Text.Json;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>One run of the real program to its end.</summary>
/// <param name="ExitCode">What it ended with.</param>
/// <param name="Results">Standard output.</param>
/// <param name="Messages">Standard error.</param>
internal sealed record ProgramRun(int ExitCode, byte[] Results, string Messages)
{
    private static readonly TimeSpan _patience = TimeSpan.FromSeconds(30);

    /// <summary>The program as it was built beside the tests.</summary>
    public static string ProgramPath => Path.Combine(AppContext.BaseDirectory, "RegenTrainer.dll");

    /// <summary>Standard output as text.</summary>
    public string Text => Encoding.UTF8.GetString(Results);

    /// <summary>Standard output as JSON.</summary>
    public JsonElement Json => JsonDocument.Parse(Results).RootElement;

    /// <summary>Runs the program with arguments; standard input is closed.</summary>
    public static Task<ProgramRun> With(params string[] arguments) => In(null, arguments);

    /// <summary>Runs the program in a folder.</summary>
    public static async Task<ProgramRun> In(string? folder, params string[] arguments)
    {
        using Process process = Start(folder, arguments);
        using var cut = new CancellationTokenSource(_patience);
        try
        {
            using var results = new MemoryStream();
            Task copying = process.StandardOutput.BaseStream.CopyToAsync(results, cut.Token);
            Task<string> messages = process.StandardError.ReadToEndAsync(cut.Token);
            await Task.WhenAll(copying, messages, process.WaitForExitAsync(cut.Token));
            return new ProgramRun(process.ExitCode, results.ToArray(), await messages);
        }
        finally
        {
            if (!process.HasExited)
            {
                process.Kill();
            }
        }
    }

    /// <summary>Starts the program and hands it over running.</summary>
    public static Process Start(string? folder, params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet")
        {
            UseShellExecute = false,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardErrorEncoding = Encoding.UTF8,
            WorkingDirectory = folder ?? Path.GetTempPath(),
        };
        start.ArgumentList.Add(ProgramPath);
        foreach (string argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        Process process = Process.Start(start) ?? throw new InvalidOperationException("the program did not start");
        process.StandardInput.Close();
        return process;
    }
}
