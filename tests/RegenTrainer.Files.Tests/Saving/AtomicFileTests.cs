using System.Text;
using RegenTrainer.Files.Saving;

namespace RegenTrainer.Files.Tests.Saving;

public sealed class AtomicFileTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("atomic-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void A_file_is_written_anew_and_replaced()
    {
        string path = At("a.toml");
        Assert.True(AtomicFile.TryWrite(path, "one"u8, null, out string reason), reason);
        Assert.True(AtomicFile.TryWrite(path, "two"u8, null, out reason), reason);
        Assert.Equal("two", File.ReadAllText(path));
        Assert.Equal([path], Directory.GetFiles(_folder));
    }

    [Theory]
    [InlineData(UnixFileMode.UserRead | UnixFileMode.UserWrite)]
    [InlineData(UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.GroupRead | UnixFileMode.GroupWrite | UnixFileMode.OtherRead | UnixFileMode.OtherWrite)]
    public void The_mode_of_a_file_that_is_there_stays(UnixFileMode mode)
    {
        if (OperatingSystem.IsWindows())
        {
            Assert.Skip("Windows has no modes.");
            return;
        }

        string path = At("a.toml");
        File.WriteAllText(path, "one");
        File.SetUnixFileMode(path, mode);
        Assert.True(AtomicFile.TryWrite(path, "two"u8, null, out string reason), reason);
        Assert.Equal(mode, File.GetUnixFileMode(path));
    }

    [Fact]
    public void A_link_stays_a_link()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "Links ask for rights there.");
        Directory.CreateDirectory(At("far"));
        File.WriteAllText(At("far/target.toml"), "one");
        File.CreateSymbolicLink(At("second"), "far/target.toml");
        File.CreateSymbolicLink(At("first"), At("second"));
        File.CreateSymbolicLink(At("dangling"), "far/made.toml");
        Assert.True(AtomicFile.TryWrite(At("first"), "two"u8, null, out string reason), reason);
        Assert.True(AtomicFile.TryWrite(At("dangling"), "three"u8, null, out reason), reason);
        Assert.Equal("two", File.ReadAllText(At("far/target.toml")));
        Assert.Equal("three", File.ReadAllText(At("far/made.toml")));
        Assert.NotNull(new FileInfo(At("first")).LinkTarget);
        Assert.Equal(2, Directory.GetFiles(At("far")).Length);
        File.CreateSymbolicLink(At("round"), At("round"));
        Assert.False(AtomicFile.TryWrite(At("round"), "x"u8, null, out reason));
        Assert.NotEmpty(reason);
    }

    [Fact]
    public void What_cannot_be_written_says_why_and_leaves_nothing_behind()
    {
        Directory.CreateDirectory(At("folder"));
        Refused(At("folder"), "it is a folder; give the name of a file in it");
        Refused(At("no/such.toml"), "its folder is not there; make the folder or choose another");
        Refused(At(new string('x', 300)), null);
        Assert.Empty(Directory.GetFiles(_folder));
    }

    [Fact]
    public void A_file_set_aside_as_read_only_and_a_folder_that_may_not_be_written_are_left_alone()
    {
        if (OperatingSystem.IsWindows() || Environment.IsPrivilegedProcess)
        {
            Assert.Skip("Rights do not bind this user.");
            return;
        }

        string path = At("a.toml");
        File.WriteAllText(path, "one");
        File.SetUnixFileMode(path, UnixFileMode.UserRead);
        Refused(path, "access is denied; choose a place where you may write");
        File.SetUnixFileMode(path, UnixFileMode.UserRead | UnixFileMode.UserWrite);
        File.SetUnixFileMode(_folder, UnixFileMode.UserRead | UnixFileMode.UserExecute);
        Refused(path, "access is denied; choose a place where you may write");
        File.SetUnixFileMode(_folder, UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);
        Assert.Equal("one", File.ReadAllText(path));
        Assert.Equal([path], Directory.GetFiles(_folder));
    }

    /// <summary>Linux answers every write to /dev/full as a full disk does [full(4)].</summary>
    [Fact]
    public void A_full_disk_is_called_so()
    {
        Assert.SkipUnless(File.Exists("/dev/full"), "There is no /dev/full here.");
        IOException full = Assert.Throws<IOException>(() => File.WriteAllText("/dev/full", "x"));
        Assert.Equal("the disk is full; make room or choose another place", FileTrouble.Words(full));
    }

    /// <summary>Readers beside a writer see one whole content or the other, never a part.</summary>
    [Fact]
    public async Task Readers_see_a_whole_file_at_every_moment()
    {
        string path = At("a.toml");
        byte[] small = Encoding.UTF8.GetBytes(new string('a', 10)), large = Encoding.UTF8.GetBytes(new string('b', 200_000));
        Assert.True(AtomicFile.TryWrite(path, small, null, out string reason), reason);
        using var over = new CancellationTokenSource();
        Task<int> reader = Task.Run(
            () =>
            {
                int reads = 0;
                while (!over.IsCancellationRequested)
                {
                    byte[] seen = File.ReadAllBytes(path);
                    Assert.True(seen.SequenceEqual(small) || seen.SequenceEqual(large), $"{seen.Length} bytes");
                    reads++;
                }

                return reads;
            },
            TestContext.Current.CancellationToken);
        for (int k = 0; k < 100; k++)
        {
            Assert.True(AtomicFile.TryWrite(path, k % 2 == 0 ? large : small, null, out reason), reason);
        }

        await over.CancelAsync();
        Assert.True(await reader > 0);
    }

    private static void Refused(string path, string? expected)
    {
        Assert.False(AtomicFile.TryWrite(path, "x"u8, null, out string reason));
        Assert.NotEmpty(reason);
        if (expected is not null)
        {
            Assert.Equal(expected, reason);
        }
    }

    private string At(string name) => Path.Combine(_folder, name);
}
