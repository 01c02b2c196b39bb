using Xunit.Sdk;

namespace RegenTrainer.Tests;

public sealed class GoldenTests : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("golden");

    public void Dispose() => _folder.Delete(recursive: true);

    [Fact]
    public void A_missing_text_fails() =>
        Assert.Throws<TrueException>(() => Golden.Matches(_folder.FullName, "screens/none.txt", "a\n", update: false));

    [Fact]
    public void What_was_written_matches_and_anything_else_does_not()
    {
        Golden.Matches(_folder.FullName, "screens/one.txt", "a\n\u2588\n", update: true);
        Golden.Matches(_folder.FullName, "screens/one.txt", "a\n\u2588\n", update: false);
        foreach (string other in new[] { "a\n\u2588", "a\n\u2588\n\n", "a\n\u2591\n", "" })
        {
            Assert.Throws<TrueException>(() => Golden.Matches(_folder.FullName, "screens/one.txt", other, update: false));
        }
    }

    [Fact]
    public void The_root_is_where_the_solution_is() => Assert.True(File.Exists(Path.Combine(Golden.Root, "RegenTrainer.sln")));
}
