namespace RegenTrainer.Files.Reports;

/// <summary>The faults of a stage file as JSON, schema <c>regentrainer.check/1</c>.</summary>
public static class CheckJson
{
    /// <summary>Writes the faults found as UTF-8 text.</summary>
    /// <param name="stage">The stage's title; null where the file could not be read.</param>
    /// <param name="faults">The faults; none for a sound stage.</param>
    public static byte[] Write(string? stage, IReadOnlyList<FileFault> faults) =>
        Report.Write("check", stage, null, [], writer => writer.List("faults", faults, (w, fault) =>
        {
            w.Word("file", fault.File);
            w.Whole("line", fault.Line);
            w.Whole("column", fault.Column);
            w.Word("found", fault.Found);
            w.Word("expected", fault.Expected);
        }));
}
