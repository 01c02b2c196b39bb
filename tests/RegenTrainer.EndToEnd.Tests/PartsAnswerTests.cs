using System.Text.Json;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>A stage printed as parts at nodes, saved and read again, answers like the stage.</summary>
public sealed class PartsAnswerTests
{
    private const double Tolerance = 1e-9;

    public static TheoryData<string, string> Settings => new MatrixTheoryData<string, string>(
        ["tapped-coil-npn", "tapped-coil-pnp", "tapped-coil-follower-off", "plain-tank", "crystal-set"],
        ["--dial 550k --travel 20", "--dial 1M --travel 50 --station 1004k --grade weak", "--dial 1.6M --travel 35 --supply 2.6 --temperature 5"]);

    [Theory]
    [MemberData(nameof(Settings))]
    public async Task Parts_read_like_the_stage_they_came_from(string preset, string options)
    {
        // The plain tank has neither device nor supply.
        string[] setting = preset == "plain-tank" ? [.. options.Split(" --supply")[0].Split(" --grade")[0].Split(' ')] : options.Split(' ');
        ProgramRun parts = await ProgramRun.With("check", preset, "--parts");
        Assert.Equal(0, parts.ExitCode);
        using var file = new TemporaryStage(parts.Text);
        ProgramRun[] runs = await Task.WhenAll(
            ProgramRun.With(["reading", preset, .. setting, "--json"]), ProgramRun.With(["reading", file.Path, .. setting, "--json"]));
        Assert.All(runs, run => Assert.True(run.ExitCode == 0, run.Messages));
        Assert.True(Figures(runs[0].Json, runs[1].Json, "") > 30);
    }

    /// <summary>Compares every figure and word but the stage's own names; returns how many.</summary>
    private static int Figures(JsonElement one, JsonElement other, string key)
    {
        if (key is "stage" or "title" or "file")
        {
            return 0;
        }

        Assert.True(one.ValueKind == other.ValueKind, $"{key}: {one} and {other}");
        switch (one.ValueKind)
        {
            case JsonValueKind.Object:
                return one.EnumerateObject().Sum(pair => Figures(pair.Value, other.GetProperty(pair.Name), pair.Name));
            case JsonValueKind.Array:
                Assert.True(one.GetArrayLength() == other.GetArrayLength(), key);
                return one.EnumerateArray().Zip(other.EnumerateArray(), (a, b) => Figures(a, b, key)).Sum();
            case JsonValueKind.Number:
                (double a, double b) = (one.GetDouble(), other.GetDouble());
                double scale = key.EndsWith("_db", StringComparison.Ordinal) || key.EndsWith("_degrees", StringComparison.Ordinal) ? 1 : 0;
                Assert.True(Math.Abs(a - b) <= Tolerance * Math.Max(scale, Math.Max(Math.Abs(a), Math.Abs(b))), $"{key}: {a:R} and {b:R}");
                return 1;
            default:
                Assert.True(one.ToString() == other.ToString(), $"{key}: {one} and {other}");
                return 1;
        }
    }
}
