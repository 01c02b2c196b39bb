using RegenTrainer.Files;
using Terminal.Gui.Input;

namespace RegenTrainer.Tests.Screens;

[Collection(OneTerminal.Name)]
public sealed class PartsPanelTests
{
    public static TheoryData<int, int> Sizes => new() { { 80, 24 }, { 100, 30 }, { 140, 45 } };

    [Theory]
    [MemberData(nameof(Sizes))]
    public void The_panel_fits_and_closes_to_the_page_as_it_was(int columns, int rows)
    {
        using var work = new WorkedStage(columns, rows);
        string page = work.Text;
        work.GoTo("coil.turns");
        foreach (string shown in (string[])["turns of the whole coil", "1 to 5000", "= 84", "coil", "effective Q", "tips over at", "Esc closes"])
        {
            Assert.Contains(shown, work.Text, StringComparison.Ordinal);
        }

        work.Terminal.Press(Key.Esc);
        Assert.Equal(page, work.Text);
    }

    [Fact]
    public void Turns_step_by_one_the_stage_follows_and_undo_brings_the_same_screen_back()
    {
        using var work = new WorkedStage();
        work.GoTo("coil.turns");
        string before = work.Text;
        work.Terminal.Type("----");
        Assert.Equal(80, work.Workbench.Design.Number("coil.turns"));
        Assert.Contains("= 80", work.Text, StringComparison.Ordinal);
        Assert.Contains("Tern Point preselector *", work.Terminal.Rows[0], StringComparison.Ordinal);
        Assert.Contains("given, not saved yet", work.Text, StringComparison.Ordinal);
        Assert.NotSame(work.Bench.Before!.Curve, work.Bench.Stage.Snapshot(100).Curve);
        work.Terminal.Type("uuuu");
        Assert.Contains("undone: coil.turns is 84, was 83", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.CursorUp, Key.CursorDown);
        Assert.Equal(before, work.Text);
        work.Terminal.Type("r");
        Assert.Equal(83, work.Workbench.Design.Number("coil.turns"));
    }

    [Theory]
    [InlineData("bias.collector_resistor", "+", 750)]   // IEC 60063, E24: 680, 750
    [InlineData("bias.collector_resistor", "-", 620)]
    [InlineData("bias.base_coupling", "+", 270e-12)]    // E12: 220, 270
    [InlineData("range.temperature.high", "+", 41)]
    public void A_step_goes_along_the_preferred_series(string key, string step, double expected)
    {
        using var work = new WorkedStage();
        work.GoTo(key);
        work.Terminal.Type(step);
        Assert.Equal(expected, work.Workbench.Design.Number(key), expected * 1e-12);
    }

    [Fact]
    public void Typing_is_checked_at_every_key_and_taken_by_Enter_alone()
    {
        using var work = new WorkedStage();
        work.GoTo("bias.collector_resistor");
        string before = work.Text;
        work.Terminal.Press(Key.Enter);
        work.Terminal.Type("4k7x");
        Assert.Contains("at character 4: found `x`, expected", work.Terminal.Rows[17], StringComparison.Ordinal);
        int field = work.Terminal.Rows.ToList().FindIndex(row => row.Contains("4k7x", StringComparison.Ordinal));
        int column = work.Terminal.Rows[field].IndexOf('x', StringComparison.Ordinal);
        int marked = field == 16 ? field - 1 : field + 1;
        Assert.Equal("^", work.Terminal.CellAt(column, marked).Grapheme);
        work.Terminal.Press(Key.Enter);
        Assert.Contains("at character 4", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Esc);
        Assert.Equal(before, work.Text);
        Assert.Equal(680, work.Workbench.Design.Number("bias.collector_resistor"));

        work.Terminal.Press(Key.Enter);
        work.Terminal.Type("4k7");
        Assert.DoesNotContain("character", work.Text, StringComparison.Ordinal);
        Assert.Equal(680, work.Workbench.Design.Number("bias.collector_resistor"));
        work.Terminal.Press(Key.Enter);
        Assert.Equal(4700, work.Workbench.Design.Number("bias.collector_resistor"));
        Assert.Contains("= 4k7", work.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Keys_of_the_hands_are_text_in_an_open_field_and_keys_without_one()
    {
        using var work = new WorkedStage();
        work.GoTo("coil.turns");
        work.Terminal.Press(Key.CursorRight);
        Assert.Equal(50.5, work.Bench.Stage.Setting.TravelPercent);
        work.Terminal.Press(Key.Enter);
        work.Terminal.Type("q1u.");
        work.Terminal.Press(Key.CursorLeft, Key.CursorDown);
        Assert.Contains("q1u.", work.Text, StringComparison.Ordinal);
        Assert.False(work.IsStopped);
        Assert.Equal((50.5, 1e6), (work.Bench.Stage.Setting.TravelPercent, work.Bench.Stage.Setting.DialHz));
        work.Terminal.Press(Key.Esc);
        work.Terminal.Type(".");
        Assert.Equal(1010e3, work.Bench.Stage.Setting.DialHz);
    }

    [Fact]
    public void The_library_has_no_menu_of_its_own_to_show_in_a_field()
    {
        using var work = new WorkedStage();
        work.GoTo("coil.turns");
        work.Terminal.Press(Key.Enter);
        string before = work.Text;
        work.Terminal.Press(Key.F10.WithShift, Key.Z.WithCtrl);
        work.Terminal.Move(30, work.Terminal.Rows.ToList().FindIndex(row => row.Contains("\u25b8 turns", StringComparison.Ordinal)), MouseFlags.RightButtonClicked);
        Assert.Equal(before, work.Text);
        work.Terminal.Press(Key.Esc, Key.Esc);
        Assert.False(work.IsStopped);
    }

    [Theory]
    [InlineData("coil.turns", "0", "1 to 5000")]
    [InlineData("coil.taps.base", "84", "1 to 83 turns")]
    [InlineData("coil.turns", "84.5", "whole number")]
    [InlineData("coil.form_diameter", "3 q", "metre")]
    [InlineData("coil.form_diameter", "3k", "1 mm to 1 m")]
    public void What_cannot_be_is_refused_with_what_was_expected(string key, string typed, string expected)
    {
        using var work = new WorkedStage();
        double before = work.Workbench.Design.Number(key);
        work.GoTo(key);
        work.Terminal.Press(Key.Enter);
        work.Terminal.Type(typed);
        Assert.Contains(expected, work.Terminal.Rows[17], StringComparison.Ordinal);
        work.Terminal.Press(Key.Enter);
        Assert.Contains(expected, work.Terminal.Rows[17], StringComparison.Ordinal);
        Assert.Equal(before, work.Workbench.Design.Number(key));
    }

    [Fact]
    public void A_field_begins_with_the_value_it_has()
    {
        using var work = new WorkedStage();
        work.GoTo("bias.base_coupling");
        work.Terminal.Press(Key.Enter, Key.Enter);
        Assert.False(work.Workbench.IsChanged);
        work.Terminal.Press(Key.Enter, Key.End);
        work.Terminal.Type("x");
        Assert.Contains("220px", work.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Delete_is_the_default_again_and_what_must_be_given_stays()
    {
        using var work = new WorkedStage();
        work.GoTo("dial.stray");
        work.Terminal.Type("+");
        work.Terminal.Press(Key.Delete);
        Assert.False(work.Workbench.Design.Gives("dial.stray"));
        Assert.Contains("default, not saved yet", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Esc);
        work.GoTo("coil.turns");
        work.Terminal.Press(Key.Delete);
        Assert.Contains("found nothing, expected turns of the whole coil", work.Terminal.Rows[17], StringComparison.Ordinal);
    }

    [Fact]
    public void Choices_and_devices_are_picked_from_lists()
    {
        using var work = new WorkedStage(100, 30);
        work.GoTo("dial.capacitor.law");
        work.Terminal.Press(Key.Enter, Key.CursorDown);
        Assert.Contains("\u25b8 straight-line-wavelength", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Enter);
        Assert.Equal("straight-line-wavelength", work.Workbench.Design.Word("dial.capacitor.law"));

        // The spread stands in the device's file: current gain 200, 290, 450; transition frequency from 150, typically 300 MHz.
        work.Terminal.Press(Key.Esc);
        work.GoTo("devices.main");
        work.Terminal.Press(Key.Enter);
        Assert.Contains("\u25b8 BC547B    200/290/450  150/300/\u2014", work.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("BC557B", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.CursorUp, Key.Enter);
        Assert.Equal("2N5088", work.Workbench.Design.Word("devices.main"));
        Assert.Contains("350/570/900", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Enter, Key.Esc);
        Assert.Contains("regenerating device", work.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_table_of_pairs_is_edited_in_the_file()
    {
        using var work = new WorkedStage();
        work.GoTo("dial.capacitor.table");
        work.Terminal.Press(Key.Enter);
        Assert.Contains("edited in the file", work.Terminal.Rows[17], StringComparison.Ordinal);
    }

    [Fact]
    public void Page_keys_and_Tab_move_through_the_list_and_stop_at_its_ends()
    {
        using var work = new WorkedStage();
        work.Terminal.Type("e");
        work.Terminal.Press(Key.CursorUp, Key.PageUp);
        Assert.Contains("\u25b8 low", work.Text, StringComparison.Ordinal);
        work.Terminal.Press([.. Enumerable.Repeat(Key.PageDown, 10)]);
        Assert.Contains("\u25b8 potentiometer", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Tab);
        Assert.Contains("\u25b8 low", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Tab);
        Assert.Equal(" coil", work.Terminal.Rows[3][..30].TrimEnd());
        Assert.Contains("\u25b8 " + work.Workbench.Design.Family.Fields.First(f => f.Key.StartsWith("coil.", StringComparison.Ordinal)).Key["coil.".Length..].Replace('_', ' '), work.Terminal.Rows[4], StringComparison.Ordinal);
        work.Terminal.Press(Key.Tab.WithShift);
        Assert.Contains("\u25b8 low", work.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_click_selects_a_second_one_edits_and_the_wheel_moves()
    {
        using var work = new WorkedStage();
        work.Terminal.Type("e");
        int row = work.Terminal.Rows.ToList().FindIndex(r => r.Contains("trimmer", StringComparison.Ordinal));
        work.Terminal.Move(8, row, MouseFlags.LeftButtonPressed);
        Assert.Contains("\u25b8 trimmer", work.Text, StringComparison.Ordinal);
        work.Terminal.Move(8, row, MouseFlags.WheeledDown);
        Assert.Contains("\u25b8 stray", work.Text, StringComparison.Ordinal);
        work.Terminal.Move(8, row, MouseFlags.WheeledUp);
        work.Terminal.Move(8, row, MouseFlags.LeftButtonPressed);
        work.Terminal.Type("9p");
        work.Terminal.Press(Key.Enter);
        Assert.Equal(9e-12, work.Workbench.Design.Number("dial.trimmer"));

        int law = work.Terminal.Rows.ToList().FindIndex(r => r.Contains("law", StringComparison.Ordinal));
        work.Terminal.Move(8, law, MouseFlags.LeftButtonPressed);
        work.Terminal.Move(8, law, MouseFlags.LeftButtonPressed);
        int frequency = work.Terminal.Rows.ToList().FindIndex(r => r.Contains("straight-line-frequency", StringComparison.Ordinal));
        work.Terminal.Move(50, frequency, MouseFlags.LeftButtonPressed);
        work.Terminal.Move(50, frequency, MouseFlags.LeftButtonPressed);
        Assert.Equal("straight-line-frequency", work.Workbench.Design.Word("dial.capacitor.law"));
        work.Terminal.Move(2, 3, MouseFlags.LeftButtonPressed);
        Assert.Contains("\u25b8   law", work.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_curve_of_before_stays_until_the_panel_closes()
    {
        using var work = new WorkedStage();
        work.GoTo("coil.turns");
        Assert.NotNull(work.Bench.Before);
        work.Terminal.Type("?");
        Assert.Contains("here: Parts", work.Text, StringComparison.Ordinal);
        Assert.Contains("step along the series", work.Text, StringComparison.Ordinal);
        work.Terminal.Press(Key.Esc);
        Assert.NotNull(work.Bench.Before);
        work.Terminal.Type("e");
        Assert.Null(work.Bench.Before);
    }

    [Fact]
    public void Undo_and_redo_work_on_pages_and_say_when_there_is_nothing()
    {
        using var work = new WorkedStage();
        work.Terminal.Type("u");
        Assert.Contains("nothing to undo", work.Text, StringComparison.Ordinal);
        work.Workbench.TryType("coil.turns", "80", out _);
        work.Terminal.Type("u");
        Assert.Contains("undone: coil.turns is 84, was 80", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("r");
        Assert.Contains("redone: coil.turns is 80, was 84", work.Text, StringComparison.Ordinal);
        work.Terminal.Type("r");
        Assert.Contains("nothing to redo", work.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_stage_that_ships_can_be_gone_through()
    {
        foreach (string preset in Presets.Names)
        {
            using var work = new WorkedStage();
            Assert.NotEqual("Refused", work.Workbench.Open(preset).Outcome.ToString());
            work.Terminal.Type("e");
            foreach (var field in work.Workbench.Design.Family.Fields)
            {
                Assert.Contains("\u25b8", work.Text, StringComparison.Ordinal);
                work.Terminal.Press(Key.Enter, Key.Esc);
                work.Terminal.Type("+-");
                work.Terminal.Press(Key.CursorDown);
            }
        }
    }
}
