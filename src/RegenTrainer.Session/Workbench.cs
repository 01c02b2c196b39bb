using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;
using RegenTrainer.Session.Edits;
using RegenTrainer.Session.Keeping;

namespace RegenTrainer.Session;

/// <summary>
/// A design being worked on: its edits and their undoing, its file, and what is kept so that nothing is lost. One thread uses it;
/// file work that may take long goes on behind it and is taken up by <see cref="Tick"/>.
/// </summary>
public sealed class Workbench : IDisposable
{
    private readonly IReadOnlyList<double> _audioHz;
    private readonly Surroundings _around;
    private readonly WorkKeeper _keeper;
    private DesignHistory _history;
    private DocumentFile _file;

    /// <summary>Begins at a stage that was opened.</summary>
    /// <param name="document">The stage.</param>
    /// <param name="start">Where the hands are first.</param>
    /// <param name="audioHz">Audio frequencies of a reading's sidebands in Hz, above 0.</param>
    /// <param name="around">What the session needs of the machine.</param>
    public Workbench(StageDocument document, Setting start, IReadOnlyList<double> audioHz, Surroundings around)
    {
        ArgumentNullException.ThrowIfNull(document);
        (_audioHz, _around) = (audioHz, around);
        _history = new DesignHistory(document.Design);
        _file = new DocumentFile(document, Fingerprint.Of(document.Text), around.Places);
        Model = StageModel.Compile(document.Design);
        Stage = new LiveStage(new StageSolver(Model, audioHz), start);
        _keeper = new WorkKeeper(around);
        _keeper.Begin(document.Path, _file.Fingerprint);
    }

    /// <summary>Where the hands are; it survives changes of the design.</summary>
    public LiveStage Stage { get; }

    /// <summary>The design with all edits, compiled.</summary>
    public StageModel Model { get; private set; }

    /// <summary>The design as it was read or last saved, with its text.</summary>
    public StageDocument Document => _file.Document;

    /// <summary>The design with all edits.</summary>
    public StageDesign Design => _history.Present;

    /// <summary>Whether the design differs from what is in its file or preset.</summary>
    public bool IsChanged { get; private set; }

    /// <summary>The last thing worth telling: of the disk, of recovery, of a home that cannot be written; empty where there is none.</summary>
    public string Notice => _keeper.Notice;

    /// <summary>Steps that can be undone, at most 200.</summary>
    public int UndoCount => _history.UndoCount;

    /// <summary>Steps that can be done again.</summary>
    public int RedoCount => _history.RedoCount;

    /// <summary>Unsaved work of a session that did not end cleanly, the newest one; null where there is none (left).</summary>
    public Recovery? Found => _keeper.Found;

    /// <summary>Paths of the stage files used last, the last one first; at most 10.</summary>
    public IReadOnlyList<string> LastUsed => _keeper.LastUsed;

    private DeviceShelf Shelf => _file.Shelf;

    /// <summary>Changes one value. On a refusal nothing changes; the value there already is no step.</summary>
    /// <param name="key">The field.</param>
    /// <param name="value">The value in SI units; null for the field's default again.</param>
    /// <param name="refusal">What was found and what is expected; empty where it was changed.</param>
    public bool TryChange(string key, FieldValue? value, out string refusal)
    {
        if (TryChangeTogether([(key, value)], out refusal))
        {
            return true;
        }

        // A value and the condition it holds at make sense together only: they go together.
        return value is null && TypedChange.Condition(Design, key) is { } at && Design.Gives(at.Key)
            && FieldCheck.Refusal(at, null) is null && TryChangeTogether([(key, null), (at.Key, null)], out refusal);
    }

    /// <summary>Changes values that make sense together only, in one step. On a refusal nothing changes.</summary>
    /// <param name="changes">Fields with their values in SI units; null for the field's default again.</param>
    /// <param name="refusal">What was found and what is expected; empty where they were changed.</param>
    public bool TryChangeTogether(IReadOnlyList<(string Key, FieldValue? Value)> changes, out string refusal)
    {
        ArgumentNullException.ThrowIfNull(changes);
        if (!DesignEdit.TryMake(Design, changes, Shelf, out StageModel? model, out refusal))
        {
            return false;
        }

        if (model is not null)
        {
            _history.Step(model.Design);
            Show(model);
        }

        return true;
    }

    /// <summary>
    /// Changes one value to what the builder typed in trade notation: <c>4k7</c>, <c>4k7 5%</c>, <c>180 at 1M</c> for a value with
    /// a condition, a word, a device's name. A tolerance given before stays unless another is typed; nothing typed is the
    /// field's default again.
    /// </summary>
    /// <param name="key">The field.</param>
    /// <param name="text">What was typed.</param>
    /// <param name="refusal">The position, what was found and what is expected; empty where it was changed.</param>
    public bool TryType(string key, string text, out string refusal)
    {
        if (!TypedChange.TryRead(Design, key, text, Shelf, out var changes, out _, out refusal))
        {
            return false;
        }

        return changes.Count == 1 ? TryChange(changes[0].Key, changes[0].Value, out refusal) : TryChangeTogether(changes, out refusal);
    }

    /// <summary>Whether <see cref="TryType"/> would take what was typed; nothing changes.</summary>
    /// <param name="key">The field.</param>
    /// <param name="text">What was typed so far.</param>
    /// <param name="character">The first wrong character, counted from 1; null where no single one is wrong.</param>
    /// <param name="refusal">The position, what was found and what is expected; empty where it can be taken.</param>
    public bool CanType(string key, string text, out int? character, out string refusal) =>
        TypedChange.TryRead(Design, key, text, Shelf, out var changes, out character, out refusal)
        && DesignEdit.TryMake(Design, changes, Shelf, out _, out refusal);

    /// <summary>The value in force as it is typed, so that <see cref="TryType"/> reads it as it is; empty where there is none.</summary>
    public string Typed(string key) => Design.Family.FieldFor(key) is { } field ? TypedChange.Write(Design, field) : "";

    /// <summary>
    /// Changes one value by a step: along the field's preferred series (IEC 60063), a turn, the next word or device that can stand
    /// there, one degree of temperature, else 1 % rounded to three figures.
    /// </summary>
    /// <param name="key">The field.</param>
    /// <param name="up">Upward, or to the next; downward, or to the one before.</param>
    /// <param name="refusal">Why there is no such step; empty where it was taken.</param>
    public bool TryStep(string key, bool up, out string refusal)
    {
        if (Design.Family.FieldFor(key) is not { } field)
        {
            return TryChange(key, null, out refusal);
        }

        string first = "";
        IEnumerable<FieldValue> steps = FieldSteps.From(Design, field, up, Shelf, out string none);
        foreach (FieldValue next in steps)
        {
            if (TryChange(key, TypedChange.WithTolerance(Design, field, next), out refusal))
            {
                return true;
            }

            first = first.Length == 0 ? refusal : first;
        }

        refusal = first.Length == 0 ? none : first;
        return false;
    }

    /// <summary>The names on the shelf that can stand in a device field as the design is now.</summary>
    /// <param name="key">The field; any other has none.</param>
    public IReadOnlyList<string> Devices(string key)
    {
        if (Design.Family.FieldFor(key) is not { Kind: FieldKind.Device })
        {
            return [];
        }

        DeviceShelf shelf = Shelf;
        return [.. shelf.Names.Where(n => DesignEdit.TryMake(Design, [(key, FieldValue.Of(n))], shelf, out _, out _))];
    }

    /// <summary>A type by its name on the shelf; null where there is none or its file has faults.</summary>
    public DeviceModel? Device(string name) => Shelf.Find(name)?.Model;

    /// <summary>Takes the last step of the design back; knob, dial and supply stay.</summary>
    /// <returns>Whether there was one.</returns>
    public bool Undo() => _history.TryUndo() && Show(StageModel.Compile(Design));

    /// <summary>Does a step again that was undone last.</summary>
    /// <returns>Whether there was one.</returns>
    public bool Redo() => _history.TryRedo() && Show(StageModel.Compile(Design));

    /// <summary>Writes the design into its file; only values that differ change in it.</summary>
    /// <param name="evenIfChanged">Whether to write over what another program wrote since it was read.</param>
    public FileAnswer Save(bool evenIfChanged = false) => Saved(_file.Save(Design, evenIfChanged));

    /// <summary>Writes the design into another file, which is its own from then on.</summary>
    /// <param name="path">The file; <c>~/</c> at its start is the user's home.</param>
    /// <param name="replace">Whether a file that is there may be replaced.</param>
    public FileAnswer SaveAs(string path, bool replace = false) => Saved(_file.SaveAs(Design, path, replace));

    /// <summary>Opens another stage in place of this one, whose unsaved edits and steps are gone: the caller asks first.</summary>
    /// <param name="presetOrPath">A preset's name, or a path; a file of that name wins.</param>
    /// <returns>Done, or OpenElsewhere where it was opened and another program has it open too; else why it was not.</returns>
    public FileAnswer Open(string presetOrPath)
    {
        OpenedFile opened = StageFiles.Open(presetOrPath, _around.Places);
        if (opened.Design is null)
        {
            string more = opened.Faults.Count > 1 ? $" (and {opened.Faults.Count - 1} more)" : "";
            return new FileAnswer(FileOutcome.Refused, Printable.Text(opened.Message ?? opened.Faults[0] + more));
        }

        StageDocument document = StageDocument.Of(presetOrPath, opened);
        Begin(document, Fingerprint.Of(document.Text));
        string name = Printable.Text(document.Name);
        return _keeper.OpenElsewhere
            ? new FileAnswer(FileOutcome.OpenElsewhere, Notice)
            : new FileAnswer(FileOutcome.Done, $"opened {name}");
    }

    /// <summary>
    /// Takes the work found in place of this design, whose unsaved edits and steps are gone: the caller asks first. Where it
    /// cannot be read any more a notice says so and its file stays.
    /// </summary>
    public void TakeRecovery()
    {
        if (_keeper.Content is not { } content)
        {
            return;
        }

        StageReadResult result = StageText.Read(content.Text, content.Name, DocumentFile.ShelfOf(content.Path, _around.Places));
        if (result.Design is not { } design)
        {
            _keeper.Leave($"what was found cannot be read ({result.Faults[0]}); it stays in {Printable.Text(Found!.StoredIn)}");
            return;
        }

        string old = Found!.StoredIn;
        Begin(new StageDocument(design, content.Text, content.Path, content.Name), content.Fingerprint);
        _keeper.Taken(old, Unsaved());
    }

    /// <summary>Deletes the work found; the next older one, if any, is found then.</summary>
    public void DropRecovery() => _keeper.Drop();

    /// <summary>
    /// Does what is due, about once each turn of the screen: keeps unsaved work within a second of an edit, looks at most once a
    /// second whether the file changed on disk, and takes up what came of both. It never waits for a disk.
    /// </summary>
    public void Tick() => _keeper.Tick(IsChanged ? Unsaved() : null);

    /// <summary>Lets go of the notice, read by the builder.</summary>
    public void DismissNotice() => _keeper.Dismiss();

    /// <summary>Keeps unsaved work now, and leaves it for the next start: for an end that nobody asked for.</summary>
    public void LeaveRecovery() => _keeper.LeaveBehind(IsChanged ? Unsaved() : null);

    /// <summary>Ends cleanly: what was kept for recovery is removed, unless <see cref="LeaveRecovery"/> left it.</summary>
    public void Dispose() => _keeper.Dispose();

    private void Begin(StageDocument document, string fingerprint)
    {
        bool sameFile = document.Path is not null && document.Path == Document.Path;
        _history = new DesignHistory(document.Design);
        _file = new DocumentFile(document, fingerprint, _around.Places);
        Model = StageModel.Compile(document.Design);
        Stage.Replace(new StageSolver(Model, _audioHz), sameFile ? Stage.Setting : Hands(Stage.Setting, Model.Circuit.Dial));
        IsChanged = !_file.TextIsInFile;
        DismissNotice();
        _keeper.Edited();
        _keeper.Begin(document.Path, fingerprint);
    }

    /// <summary>The hands on another stage: control, temperature and grade stay; what was set for the old one is let go.</summary>
    private static Setting Hands(Setting setting, Dial dial) => setting with
    {
        DialHz = setting.DialHz >= dial.LowHz && setting.DialHz <= dial.HighHz ? setting.DialHz : Steps.MiddleOfBand(dial),
        StationHz = null,
        SupplyVolt = null,
        Device = null,
        DialMode = DialMode.Follows,
        LockedFarad = null,
    };

    private bool Show(StageModel model)
    {
        Model = model;
        Stage.Replace(new StageSolver(model, _audioHz));
        IsChanged = !_file.TextIsInFile || !DesignComparison.Same(Design, Document.Design);
        _keeper.Edited();
        return true;
    }

    private FileAnswer Saved(FileAnswer answer)
    {
        if (answer.Outcome == FileOutcome.Done)
        {
            IsChanged = false;
            DismissNotice();
            _keeper.Edited();
            _keeper.Begin(Document.Path, _file.Fingerprint);
        }

        return answer;
    }

    /// <summary>The unsaved work as it is now; its text is worked out by the one who asks, on whatever thread.</summary>
    private Func<RecoveryContent> Unsaved()
    {
        (StageDocument document, StageDesign design, string fingerprint) = (Document, Design, _file.Fingerprint);
        DateTimeOffset at = _around.Clock.GetUtcNow();
        return () => new RecoveryContent(
            document.Name, document.Path, at, _around.Process, fingerprint, StageText.Write(document.Text, design));
    }
}
