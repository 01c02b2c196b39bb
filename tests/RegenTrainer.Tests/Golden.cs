using System.Text;

namespace RegenTrainer.Tests;

/// <summary>Compares a text with the one kept in the repository. With UPDATE_GOLDEN=1 in the environment the kept one is written anew.</summary>
internal static class Golden
{
    private const string Solution = "RegenTrainer.sln";
    private static readonly UTF8Encoding _utf8 = new(encoderShouldEmitUTF8Identifier: false);

    /// <summary>The folder of the solution.</summary>
    public static string Root { get; } = FindRoot();

    /// <summary>Fails where the kept text is missing or differs, naming the first line that does.</summary>
    /// <param name="path">Path of the kept text from the solution's folder.</param>
    /// <param name="actual">The text; lines end in LF.</param>
    public static void Matches(string path, string actual) =>
        Matches(Root, path, actual, update: Environment.GetEnvironmentVariable("UPDATE_GOLDEN") == "1");

    internal static void Matches(string root, string path, string actual, bool update)
    {
        string full = Path.Combine(root, path);
        if (update)
        {
            Directory.CreateDirectory(Path.GetDirectoryName(full)!);
            File.WriteAllText(full, actual, _utf8);
            return;
        }

        Assert.True(File.Exists(full), $"{path} is missing; UPDATE_GOLDEN=1 writes it");
        string[] expected = File.ReadAllText(full, _utf8).Split('\n'), found = actual.Split('\n');
        for (int k = 0; k < Math.Max(expected.Length, found.Length); k++)
        {
            string was = k < expected.Length ? expected[k] : "(no such line)", now = k < found.Length ? found[k] : "(no such line)";
            Assert.True(was == now, $"{path}, line {k + 1}\nkept:  {was}\nfound: {now}\nUPDATE_GOLDEN=1 writes it anew");
        }
    }

    private static string FindRoot()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, Solution)))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new DirectoryNotFoundException($"{Solution} is in no folder above {AppContext.BaseDirectory}");
    }
}
