using System.Text;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>Tests that count the processor time they take, with no other beside them.</summary>
[CollectionDefinition(Name, DisableParallelization = true)]
public sealed class TimedAlone
{
    public const string Name = "timed alone";
}

/// <summary>Texts nobody meant give a design or faults with places inside the text, never anything else.</summary>
[Collection(TimedAlone.Name)]
public sealed class MutationTests
{
    private const int Texts = 20_000;

    /// <summary>Seconds of the processor for all texts, and for any of them.</summary>
    private const double LongestAll = 20, LongestOne = 1;
    private const string Odd = "[]{}=\"'#,.\n\\\t\u0000\u001b\u202e€0123456789eE-+kKMmunp%";

    [Fact]
    public void Mangled_presets_give_a_design_or_faults()
    {
        string[] presets = [.. Presets.Names.Select(Presets.Text), PartsText.Write(Presets.Read(Presets.Default))];
        ulong state = 0x2545F4914F6CDD1DUL;
        int Next(int below)
        {
            state ^= state << 13;   // xorshift64 [Marsaglia 2003]
            state ^= state >> 7;
            state ^= state << 17;
            return (int)(state % (ulong)below);
        }

        int good = 0;
        TimeSpan all = TimeSpan.Zero;
        for (int k = 0; k < Texts; k++)
        {
            var text = new StringBuilder(presets[k % presets.Length]);
            for (int change = 0; change <= Next(3); change++)
            {
                int at = Next(text.Length);
                switch (Next(4))
                {
                    case 0:
                        text[at] = Odd[Next(Odd.Length)];
                        break;
                    case 1:
                        text.Insert(at, Odd[Next(Odd.Length)]);
                        break;
                    case 2:
                        text.Remove(at, Math.Min(1 + Next(30), text.Length - at));
                        break;
                    default:
                        int length = Math.Min(1 + Next(60), text.Length - at);
                        text.Insert(Next(text.Length), text.ToString(at, length));
                        break;
                }
            }

            string mangled = text.ToString();
            TimeSpan before = Environment.CpuUsage.TotalTime;
            StageReadResult result = StageText.Read(mangled, "mangled.toml", DeviceShelf.Shipped);
            TimeSpan one = Environment.CpuUsage.TotalTime - before;
            all += one;
            Assert.True(one.TotalSeconds < LongestOne, mangled);
            Assert.True(result.Design is null == result.Faults.Count > 0, mangled);
            int lines = mangled.Split('\n').Length;
            Assert.All(result.Faults, f => Assert.True(f.Line >= 1 && f.Line <= lines + 1 && f.Column >= 1, $"{f}\n{mangled}"));
            Assert.All(result.Faults, f => Assert.DoesNotContain("System.", f.ToString(), StringComparison.Ordinal));
            good += result.Design is null ? 0 : 1;
        }

        Assert.InRange(all.TotalSeconds, 0, LongestAll);
        Assert.InRange(good, 50, Texts - 50);   // both outcomes happen: the check looks at something
    }
}
