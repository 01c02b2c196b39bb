namespace RegenTrainer.Files.Tests;

/// <summary>Texts that are compared with a file in the source tree; UPDATE_GOLDEN=1 writes them anew, a missing one fails.</summary>
internal static class Golden
{
    public static void Check(string actual, string name) => CheckAt(actual, "tests", "RegenTrainer.Files.Tests", "Golden", name);

    /// <summary>Compares with a file of the documentation or elsewhere in the source tree.</summary>
    public static void CheckAt(string actual, params string[] place)
    {
        (string path, string name) = (Path.Combine([Root(), .. place]), place[^1]);
        actual = actual.ReplaceLineEndings("\n").TrimEnd('\n') + "\n";
        if (Environment.GetEnvironmentVariable("UPDATE_GOLDEN") == "1")
        {
            Directory.CreateDirectory(Path.GetDirectoryName(path)!);
            File.WriteAllText(path, actual);
        }

        Assert.True(File.Exists(path), $"{name} is missing: run UPDATE_GOLDEN=1 dotnet test and read what it wrote");
        Assert.Equal(File.ReadAllText(path).ReplaceLineEndings("\n"), actual);
    }

    private static string Root()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "RegenTrainer.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("RegenTrainer.sln is not above the tests");
    }
}
