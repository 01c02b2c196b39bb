using System.Buffers;
using System.Text.Encodings.Web;
using System.Text.Json;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Files.Reports;

/// <summary>The frame of every answer in JSON: schema, stage, setting, cautions, then the figures at top level.</summary>
internal static class Report
{
    private static readonly JsonWriterOptions _options = new()
    {
        Indented = true,
        NewLine = "\n",
        // Every string went through Printable; the units of the cautions stay readable.
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>Writes an answer as UTF-8 text that ends with a line feed.</summary>
    /// <param name="subject">The word of the schema, e.g. <c>reading</c>.</param>
    /// <param name="stage">Title of the stage; null where the answer belongs to none.</param>
    /// <param name="setting">The values in force; null where none matter.</param>
    /// <param name="cautions">The cautions so far; figures that are not finite add theirs.</param>
    /// <param name="figures">Writes the figures; called twice and must write the same each time.</param>
    public static byte[] Write(
        string subject, string? stage, SettingKeys? setting, IReadOnlyList<Caution> cautions, Action<FigureWriter> figures)
    {
        // The cautions stand before the figures, so figures that are not finite are looked for first.
        IReadOnlyList<string> notFinite = Once(new ArrayBufferWriter<byte>(), writer =>
        {
            setting?.Write(writer);
            figures(writer);
        });
        Caution[] all = [.. cautions, .. notFinite.Select(key => new Caution("not-finite", $"{key} is not a finite number here"))];
        var buffer = new ArrayBufferWriter<byte>();
        Once(buffer, writer =>
        {
            writer.Word("schema", $"regentrainer.{subject}/1");
            writer.Word("stage", stage);
            if (setting is null)
            {
                writer.Nothing("setting");
            }
            else
            {
                writer.Group("setting", setting.Write);
            }

            writer.List("cautions", all, (w, caution) =>
            {
                w.Word("code", caution.Code);
                w.Word("text", caution.Text);
            });
            figures(writer);
        });
        buffer.Write("\n"u8);
        return buffer.WrittenSpan.ToArray();
    }

    private static IReadOnlyList<string> Once(ArrayBufferWriter<byte> buffer, Action<FigureWriter> write)
    {
        using var json = new Utf8JsonWriter(buffer, _options);
        var writer = new FigureWriter(json);
        json.WriteStartObject();
        write(writer);
        json.WriteEndObject();
        json.Flush();
        return writer.NotFinite;
    }
}
