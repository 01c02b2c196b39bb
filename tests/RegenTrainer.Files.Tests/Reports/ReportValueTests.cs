using System.Globalization;
using System.Text;
using System.Text.Json;
using CsCheck;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Reports;

namespace RegenTrainer.Files.Tests.Reports;

public sealed class ReportValueTests
{
    [Fact]
    public void What_does_not_exist_is_null_and_its_key_stays()
    {
        JsonElement answer = ReportKeyTests.Parse(ReadingJson.Write("S", SampleAnswers.Bare));
        string[] nulls =
        [
            "effective_q", "bandwidth_hz", "margin_db", "margin_percent", "tank_hz", "growth_per_s", "stage_gain_db", "ring_time_s",
            "tuning_farad", "tip_over_percent", "tip_over_factor", "regime", "pulled_hz", "speech_index", "audio_10db_hz",
        ];
        Assert.All(nulls, key => Assert.Equal(JsonValueKind.Null, answer.GetProperty(key).ValueKind));
        Assert.Equal("always", answer.GetProperty("tip_over_state").GetString());
        Assert.Equal(JsonValueKind.Null, answer.GetProperty("setting").GetProperty("supply_volt").ValueKind);
        Assert.Equal(JsonValueKind.Null, answer.GetProperty("setting").GetProperty("device").ValueKind);
        Assert.Empty(answer.GetProperty("cautions").EnumerateArray());
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void A_figure_that_is_not_finite_is_null_with_a_caution_that_names_it(double value)
    {
        byte[] json = ReadingJson.Write("S", SampleAnswers.Full with { StageGainDb = value, Sidebands = [new(1000, value, -1, value)] });
        JsonElement answer = ReportKeyTests.Parse(json);
        Assert.Equal(JsonValueKind.Null, answer.GetProperty("stage_gain_db").ValueKind);
        Assert.Equal(JsonValueKind.Null, answer.GetProperty("sidebands")[0].GetProperty("upper_db").ValueKind);
        string[] texts =
        [
            .. answer.GetProperty("cautions").EnumerateArray()
                .Where(c => c.GetProperty("code").GetString() == "not-finite")
                .Select(c => c.GetProperty("text").GetString()!.Split(' ')[0]),
        ];
        Assert.Equal(["stage_gain_db", "upper_db", "audio_db"], texts);
        Assert.Equal("coil-too-short", answer.GetProperty("cautions")[0].GetProperty("code").GetString());
    }

    [Fact]
    public void Every_finite_number_comes_back_bit_for_bit() =>
        Gen.Double.Where(double.IsFinite).Sample(value =>
        {
            JsonElement answer = ReportKeyTests.Parse(ReadingJson.Write("S", SampleAnswers.Full with { TankHz = value }));
            return answer.GetProperty("tank_hz").GetDouble().Equals(value);
        }, iter: 2000, seed: "0000KD1a2b3c4");

    [Fact]
    public void Words_are_lower_case_and_follow_the_setting()
    {
        JsonElement setting = ReportKeyTests.Parse(ReadingJson.Write("S", SampleAnswers.Full)).GetProperty("setting");
        Assert.Equal("weak", setting.GetProperty("grade").GetString());
        Assert.Equal("locked", setting.GetProperty("dial_mode").GetString());
        Assert.Equal(1.003e6, setting.GetProperty("station_hz").GetDouble());
        JsonElement other = ReportKeyTests.Parse(ReadingJson.Write(
            "S",
            SampleAnswers.Full with { Setting = SampleAnswers.Setting with { Grade = Grade.Strong, DialMode = DialMode.Follows } }));
        Assert.Equal("strong", other.GetProperty("setting").GetProperty("grade").GetString());
        Assert.Equal("follows", other.GetProperty("dial_mode").GetString());
    }

    [Fact]
    public void The_first_upward_crossing_is_the_tip_over_and_all_are_listed()
    {
        JsonElement answer = ReportKeyTests.Parse(ReadingJson.Write("S", SampleAnswers.Full));
        Assert.Equal(63.4, answer.GetProperty("tip_over_percent").GetDouble());
        Assert.Equal(1130, answer.GetProperty("tip_over_ohm").GetDouble());
        Assert.Equal("several", answer.GetProperty("tip_over_state").GetString());
        Assert.Equal(2, answer.GetProperty("tip_overs").GetArrayLength());
        Assert.False(answer.GetProperty("tip_overs")[0].GetProperty("upward").GetBoolean());
    }

    [Fact]
    public void A_run_along_the_dial_has_no_dial_of_its_own()
    {
        JsonElement free = ReportKeyTests.Parse(DialJson.Write("S", SampleAnswers.Setting, null, [], (null, null), []));
        Assert.Equal(JsonValueKind.Null, free.GetProperty("setting").GetProperty("dial_hz").ValueKind);
        Assert.Equal(JsonValueKind.Null, free.GetProperty("setting").GetProperty("station_hz").ValueKind);
        JsonElement held = ReportKeyTests.Parse(DialJson.Write("S", SampleAnswers.Setting, 9.9e5, [], (null, null), []));
        Assert.Equal(9.9e5, held.GetProperty("setting").GetProperty("station_hz").GetDouble());
        Assert.Equal(61.9, held.GetProperty("setting").GetProperty("travel_percent").GetDouble());
    }

    [Fact]
    public void A_hostile_title_cannot_reach_the_terminal()
    {
        string json = Encoding.UTF8.GetString(ReadingJson.Write("a\u001b[2J\u202eb\"\\", SampleAnswers.Full));
        Assert.DoesNotContain('\u001b', json);
        Assert.DoesNotContain('\u202e', json);
        Assert.Equal("a?[2J?b\"\\", JsonDocument.Parse(json).RootElement.GetProperty("stage").GetString());
    }

    [Fact]
    public void The_same_answer_is_the_same_bytes_whatever_the_culture()
    {
        byte[] before = ReadingJson.Write("S", SampleAnswers.Full);
        CultureInfo culture = CultureInfo.CurrentCulture;
        try
        {
            var comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
            comma.NumberFormat.NumberDecimalSeparator = ",";
            comma.NumberFormat.NegativeSign = "\u2212";
            CultureInfo.CurrentCulture = comma;
            Assert.Equal(before, ReadingJson.Write("S", SampleAnswers.Full));
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
        }

        Assert.Equal((byte)'\n', before[^1]);
        Assert.DoesNotContain((byte)'\r', before);
    }

    [Fact]
    public void Without_a_control_its_keys_are_those_of_a_rheostat_and_null()
    {
        JsonElement answer = ReportKeyTests.Parse(ReadingJson.Write(
            "S", SampleAnswers.Bare with { ControlUnit = Unit.None, ControlValue = null, TipOver = null }));
        Assert.Equal(JsonValueKind.Null, answer.GetProperty("control_ohm").ValueKind);
        Assert.Equal(JsonValueKind.Null, answer.GetProperty("tip_over_state").ValueKind);
        Assert.Empty(answer.GetProperty("tip_overs").EnumerateArray());
    }
}
