using System.Text;
using RegenTrainer.Core.Devices;
using RegenTrainer.Files.Devices;

namespace RegenTrainer.Files.Tests;

/// <summary>Files on disk: what cannot be read says why, and devices beside a stage come before those that ship.</summary>
public sealed class StageFilesTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("stages").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void A_preset_opens_by_name()
    {
        OpenedFile file = StageFiles.Open("plain-tank");
        Assert.True(file.IsPreset);
        Assert.Equal("Tern Point plain tank", file.Design!.Title);
    }

    [Fact]
    public void A_byte_order_mark_is_no_part_of_the_text()
    {
        string path = Put("marked.toml", [.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(Presets.Text(Presets.Default))]);
        OpenedFile file = StageFiles.Open(path);
        Assert.NotNull(file.Design);
        Assert.Equal(Presets.Text(Presets.Default), file.Text);
    }

    [Fact]
    public void What_is_no_text_is_refused_with_its_place()
    {
        // 0xE9 is an accented e of ISO 8859-1, which nothing in UTF-8 starts with before a blank; two-byte characters count once.
        string path = Put("latin.toml", [.. Encoding.UTF8.GetBytes("# µ\n# cafµ"), 0xE9, (byte)' ']);
        string message = StageFiles.Open(path).Message!;
        Assert.Contains("it is no UTF-8 text: byte E9 in line 2, column 7 belongs to no character", message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_of_a_megabyte_is_read_and_one_byte_more_is_not()
    {
        string text = Presets.Text(Presets.Default);
        byte[] full = Encoding.ASCII.GetBytes(text + "#" + new string('x', 1_000_000 - text.Length - 1));
        Assert.NotNull(StageFiles.Open(Put("full.toml", full)).Design);
        OpenedFile over = StageFiles.Open(Put("over.toml", [.. full, (byte)'x']));
        Assert.Null(over.Design);
        Assert.Equal("at most 1 MB", Assert.Single(over.Faults).Expected);
        Assert.Contains("more than 1 MB", StageFiles.Open(Put("far.toml", [.. full, .. full])).Message!, StringComparison.Ordinal);
    }

    [Fact]
    public void What_is_not_there_names_the_presets_and_cannot_reach_the_terminal()
    {
        string message = StageFiles.Open("no\u001b[31msuch").Message!;
        Assert.DoesNotContain('\u001b', message);
        Assert.Contains($"there is no such file; presets are {Presets.Names[0]}", message, StringComparison.Ordinal);
        Assert.Contains("it is a folder", StageFiles.Open(_folder).Message!, StringComparison.Ordinal);
    }

    [Fact]
    public void A_device_beside_the_stage_comes_before_the_one_that_ships()
    {
        Put("Bc547B.toml", Encoding.UTF8.GetBytes(Device("BC547B").Replace("typical = 290", "typical = 300", StringComparison.Ordinal)));
        OpenedFile file = StageFiles.Open(Put("stage.toml", Encoding.UTF8.GetBytes(Presets.Text(Presets.Default))));
        Assert.Equal(300, file.Design!.Device<BipolarModel>("devices.main").CurrentGain.Typical);
        Assert.Equal(290, ((BipolarModel)DeviceShelf.Shipped.Find("BC547B")!.Model!).CurrentGain.Typical);
    }

    [Fact]
    public void Faults_of_a_device_file_are_told_with_those_of_the_stage()
    {
        Put("bc547b.toml", Encoding.UTF8.GetBytes(Device("BC547B").Replace("polarity = \"npn\"", "polarity = \"both\"", StringComparison.Ordinal)));
        string path = Put("stage.toml", Encoding.UTF8.GetBytes(Presets.Text(Presets.Default)));
        IReadOnlyList<FileFault> faults = StageFiles.Open(path).Faults;
        Assert.Equal([(path, 24, 8), (path, 25, 12), ("bc547b.toml", 4, 12)], faults.Select(f => (f.File, f.Line, f.Column)));
    }

    [Fact]
    public void A_device_file_of_a_later_format_is_refused_and_not_passed_over()
    {
        Put("bc547b.toml", Encoding.UTF8.GetBytes(Device("BC547B").Replace("device/1", "device/2", StringComparison.Ordinal)));
        Assert.Null(DeviceShelf.Beside(_folder).Find("BC547B")!.Model);
    }

    [Fact]
    public void A_stage_file_named_as_a_device_is_no_device()
    {
        Put("bc547b.toml", Encoding.UTF8.GetBytes(Presets.Text(Presets.Default)));
        Put("other.toml", Encoding.UTF8.GetBytes(Presets.Text(Presets.Default)));
        DeviceShelf shelf = DeviceShelf.Beside(_folder);
        Assert.NotNull(shelf.Find("BC547B")!.Model);
        Assert.DoesNotContain("other", shelf.Names, StringComparer.OrdinalIgnoreCase);
    }

    private static string Device(string name)
    {
        using Stream stream = typeof(Presets).Assembly.GetManifestResourceStream($"presets/devices/{name.ToLowerInvariant()}.toml")!;
        using StreamReader reader = new(stream);
        return reader.ReadToEnd();
    }

    private string Put(string name, byte[] bytes)
    {
        string path = Path.Combine(_folder, name);
        File.WriteAllBytes(path, bytes);
        return path;
    }
}
