namespace RegenTrainer.EndToEnd.Tests;

/// <summary>The answers shown in docs/commands.md are what the program says; UPDATE_GOLDEN=1 writes them anew.</summary>
public sealed class DocumentedAnswerTests
{
    private const string Opening = "```\n$ regentrainer ";
    private const string Closing = "\n```";
    private const string OnlyFirst = " | head -n ";

    [Fact]
    public async Task Answers_shown_in_the_documentation_are_what_the_program_says()
    {
        string path = Path.Combine(Repository.Root, "docs", "commands.md");
        string kept = File.ReadAllText(path).ReplaceLineEndings("\n"), document = kept;
        int shown = 0;
        for (int at = document.IndexOf(Opening, StringComparison.Ordinal); at >= 0; at = document.IndexOf(Opening, at + 1, StringComparison.Ordinal))
        {
            int lineStart = at + Opening.Length, answerStart = document.IndexOf('\n', lineStart) + 1;
            int answerEnd = document.IndexOf(Closing, answerStart, StringComparison.Ordinal);
            string answer = await Answer(document[lineStart..(answerStart - 1)]);
            document = string.Concat(document.AsSpan(0, answerStart), answer, document.AsSpan(answerEnd));
            shown++;
        }

        Assert.True(shown >= 6, $"only {shown} answers are shown");
        if (Environment.GetEnvironmentVariable("UPDATE_GOLDEN") == "1")
        {
            File.WriteAllText(path, document);
            return;
        }

        Assert.Equal(document, kept);
    }

    private static async Task<string> Answer(string line)
    {
        string[] halves = line.Split(OnlyFirst);
        ProgramRun run = await ProgramRun.With(halves[0].Split(' '));
        Assert.True(run.ExitCode == 0, line + ": " + run.Messages);
        IEnumerable<string> rows = run.Text.ReplaceLineEndings("\n").TrimEnd('\n').Split('\n').Select(row => row.TrimEnd());
        return string.Join('\n', halves.Length > 1 ? rows.Take(int.Parse(halves[1], System.Globalization.CultureInfo.InvariantCulture)) : rows);
    }
}
