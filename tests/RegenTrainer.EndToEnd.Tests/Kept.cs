namespace RegenTrainer.EndToEnd.Tests;

/// <summary>Pictures of the screen kept in the documentation; UPDATE_GOLDEN=1 writes them anew, a missing one fails.</summary>
internal static class Kept
{
    private const string Before = "```text screen ";
    private const string After = "\n```";

    /// <summary>Compares a text with a file.</summary>
    public static void Check(string actual, params string[] place)
    {
        string path = Path.Combine([Repository.Root, .. place]);
        actual = actual.ReplaceLineEndings("\n").TrimEnd('\n') + "\n";
        if (Update)
        {
            Directory.CreateDirectory(Path.GetDirectoryName(path)!);
            File.WriteAllText(path, actual);
        }

        Assert.True(File.Exists(path), $"{place[^1]} is missing: run UPDATE_GOLDEN=1 dotnet test and look at what it wrote");
        Assert.Equal(File.ReadAllText(path).ReplaceLineEndings("\n"), actual);
    }

    /// <summary>Compares a text with the picture of a name that stands in a document.</summary>
    public static void CheckInside(string actual, string name, params string[] place)
    {
        string opening = Before + name + "\n";
        string path = Path.Combine([Repository.Root, .. place]);
        string document = File.ReadAllText(path).ReplaceLineEndings("\n");
        int start = document.IndexOf(opening, StringComparison.Ordinal) + opening.Length;
        int end = document.IndexOf(After, start, StringComparison.Ordinal);
        Assert.True(start > opening.Length && end >= start, $"{place[^1]} has no picture {name} of the screen");
        if (Update)
        {
            File.WriteAllText(path, string.Concat(document.AsSpan(0, start), actual, document.AsSpan(end)));
            return;
        }

        Assert.Equal(document[start..end], actual);
    }

    private static bool Update => Environment.GetEnvironmentVariable("UPDATE_GOLDEN") == "1";
}
