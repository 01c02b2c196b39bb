using System.Text;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>Stage files with faults, each with the messages its builder gets, kept as text to be read.</summary>
public sealed class BadStageTests
{
    private const string Free = """
        format = "regentrainer.stage/1"
        title = "free"
        circuit = "parts"
        [dial]
        low = "530k"
        high = "1700k"
        capacitor = { min = "12p", max = "365p" }
        [output]
        node = "top"
        [[part]]
        kind = "capacitor"
        name = "tuning"
        between = ["top", "earth"]
        role = "tuning"
        [[part]]
        kind = "inductor"
        name = "coil"
        between = ["top", "earth"]
        value = "240u"
        q = 100

        """;

    [Fact]
    public void Every_fault_is_told_with_place_and_expectation()
    {
        var golden = new StringBuilder();
        int count = 0;
        foreach ((string name, string text) in Cases().Concat(CasesOfChoices()).Concat(DeviceCases()))
        {
            StageReadResult result = StageText.Read(text, name + ".toml", DeviceShelf.Shipped);
            Assert.Null(result.Design);
            Assert.NotEmpty(result.Faults);
            golden.Append("## ").AppendLine(name);
            foreach (FileFault fault in result.Faults)
            {
                string line = fault.ToString();
                Assert.DoesNotContain(line, c => char.IsControl(c));
                Assert.DoesNotContain("Exception", line, StringComparison.Ordinal);
                golden.AppendLine(line);
            }

            count++;
        }

        Assert.True(count >= 40);
        Golden.Check(golden.ToString(), "bad-stages.txt");
    }

    [Fact]
    public void The_text_of_a_good_free_circuit_reads()
    {
        Assert.Empty(StageText.Read(Free, "free.toml", DeviceShelf.Shipped).Faults);
    }

    /// <summary>A text with pieces replaced, given in pairs of old and now.</summary>
    private static string WithEdits(string text, string[] edits)
    {
        for (int k = 0; k < edits.Length; k += 2)
        {
            Assert.Contains(edits[k], text, StringComparison.Ordinal);
            text = text.Replace(edits[k], edits[k + 1], StringComparison.Ordinal);
        }

        return text;
    }

    private static IEnumerable<(string Name, string Text)> Cases()
    {
        string preset = Presets.Text(Presets.Default);
        (string, string) Edited(string name, params string[] edits) => (name, WithEdits(preset, edits));

        (string, string) Extra(string name, string more) => (name, preset + "\n" + more);
        (string, string) Freely(string name, string old, string now)
        {
            Assert.Contains(old, Free, StringComparison.Ordinal);
            return (name, Free.Replace(old, now, StringComparison.Ordinal));
        }

        // Values.
        yield return Edited("decimal-comma", "supply = \"3.0\"", "supply = \"3,0\"");
        yield return Edited("wrong-unit", "collector_resistor = \"680\"", "collector_resistor = \"680 pF\"");
        yield return Edited("mega-spelled-out", "base_resistor = \"1M\"", "base_resistor = \"1meg\"");
        yield return Edited("negative-capacitor", "base_coupling = \"220p\"", "base_coupling = \"-220p\"");
        yield return Edited("zero-resistor", "emitter_resistor = \"2k2\"", "emitter_resistor = 0");
        yield return Edited("out-of-range", "supply = \"3.0\"", "supply = \"3000\"");
        yield return Edited("trailing-rubbish", "base_coupling = \"220p\"", "base_coupling = \"220p!\"");
        yield return Edited("empty-value", "base_coupling = \"220p\"", "base_coupling = \"\"");
        yield return Edited("not-a-number", "base_coupling = \"220p\"", "base_coupling = nan");
        yield return Edited("boolean-for-quantity", "base_coupling = \"220p\"", "base_coupling = true");
        yield return Edited("fraction-of-a-turn", "turns = 84", "turns = 84.5");
        yield return Edited("a-thousand-million-turns", "turns = 84", "turns = 1000000000");
        yield return Edited("number-beyond-all", "turns = 84", "turns = 99999999999999999999999");
        yield return Edited("wrong-choice", "taper = \"reverse-log\"", "taper = \"antilog\"");
        yield return Edited("wrong-tolerance", "collector_resistor = \"680\"", "collector_resistor = { value = \"680\", tolerance = \"five\" }");

        // Keys and tables.
        yield return Edited("unknown-key", "base_stopper", "base_stoper");
        yield return Edited("unknown-table", "[layout]", "[lay_out]");
        yield return Edited("unknown-inner-key", "base = 24 }", "bass = 24 }");
        yield return Edited("key-twice", "turns = 84", "turns = 84\nturns = 85");
        yield return Edited("table-twice", "[layout]", "[coil]");
        yield return Edited("value-for-table", "taps  = { emitter = 4, base = 24 }", "taps = 4");
        yield return Edited("missing-key", "form_diameter = \"50 mm\"\n", "");
        yield return ("nothing-but-format", "format = \"regentrainer.stage/1\"\n");
        yield return ("empty-file", "");

        // TOML itself.
        yield return Edited("text-not-closed", "title   = \"Tern Point preselector\"", "title   = \"Tern Point preselector");
        yield return Edited("no-value", "turns = 84", "turns =");
        yield return Edited("bracket-not-closed", "[layout]", "[layout");
        yield return Edited("other-format", "regentrainer.stage/1", "regentrainer.stage/9");
        yield return Edited("unknown-circuit", "circuit = \"tapped-coil\"", "circuit = \"tapped-soil\"");

        // What the values mean together.
        yield return Edited("tap-beyond-the-coil", "base = 24", "base = 90");
        yield return Edited("pitch-below-the-wire", "pitch = \"0.6 mm\"", "pitch = \"0.3 mm\"");
        yield return Edited("band-upside-down", "low  = \"530k\"", "low  = \"1800k\"");
        yield return Edited("capacitor-upside-down", "min = \"12p\"", "min = \"400p\"");
        yield return Edited("end-above-total", "end = \"20\"", "end = \"20k\"");
        yield return Edited("unknown-device", "main = \"BC547B\"", "main = \"BC546Z\"");
        yield return Edited("device-with-a-path", "main = \"BC547B\"", "main = \"../secret\"");
        yield return Edited("mixed-polarity", "follower = \"BC547B\"", "follower = \"BC557B\"");
        yield return Edited("measured-q-without-frequency", "# q = { value = 180, at = \"1M\" }", "q = { value = 180 }");

        // Parts of the stage's own.
        yield return Extra("part-of-no-kind", "[[part]]\nname = \"x\"\nbetween = [\"collector\", \"earth\"]\nvalue = \"10k\"\n");
        yield return Extra("part-not-yet-built", "[[part]]\nkind = \"triode\"\nname = \"x\"\nnodes = { grid = \"a\" }\n");
        yield return Extra("part-with-one-end", "[[part]]\nkind = \"resistor\"\nname = \"x\"\nbetween = [\"collector\"]\nvalue = \"10k\"\n");
        yield return Extra("floating-node", "[[part]]\nkind = \"resistor\"\nname = \"x\"\nbetween = [\"here\", \"there\"]\nvalue = \"10k\"\n");
        yield return Extra("part-named-twice", "[[part]]\nkind = \"resistor\"\nname = \"main\"\nbetween = [\"collector\", \"earth\"]\nvalue = \"10k\"\n");
        yield return Extra("second-tuning", "[[part]]\nkind = \"capacitor\"\nname = \"x\"\nbetween = [\"collector\", \"earth\"]\nrole = \"tuning\"\n");
        yield return Extra("escape-sequence-in-a-name", "[[part]]\nkind = \"resistor\"\nname = \"\\u001b[31mred\"\nbetween = [\"\\u001b]0;x\\u0007\", \"earth\\u202e\"]\nvalue = \"-1\"\n");
        yield return Freely("output-nowhere", "node = \"top\"", "node = \"bottom\"");
        yield return Freely("no-tuning", "role = \"tuning\"", "value = \"100p\"");
        yield return Freely("no-coupling-partner", "kind = \"inductor\"\nname = \"coil\"\nbetween = [\"top\", \"earth\"]\nvalue = \"240u\"\nq = 100",
            "kind = \"windings\"\nname = \"coil\"\nsections = [{ between = [\"top\", \"earth\"], inductance = \"240u\" }]\ncoupling = [[1, 2, 0.5]]");
        yield return Freely("too-close-coupling", "kind = \"inductor\"\nname = \"coil\"\nbetween = [\"top\", \"earth\"]\nvalue = \"240u\"\nq = 100",
            "kind = \"windings\"\nname = \"coil\"\nsections = [{ between = [\"top\", \"earth\"], inductance = \"240u\" }, { between = [\"top\", \"earth\"], inductance = \"1u\" }]\ncoupling = [[1, 2, 1.0]]");
        yield return Freely("tap-list-does-not-fit", "kind = \"inductor\"\nname = \"coil\"\nbetween = [\"top\", \"earth\"]\nvalue = \"240u\"\nq = 100",
            "kind = \"windings\"\nname = \"coil\"\nform_diameter = \"50 mm\"\nwire_diameter = \"0.4 mm\"\nturns = 84\ntaps = [4, 24]\nnodes = [\"earth\", \"top\"]");

        // Limits, checked before anything is built.
        yield return ("nesting-100", "x = " + new string('[', 100) + new string(']', 100) + "\n");
        yield return ("three-megabytes", preset + "# " + new string('x', 3_000_000) + "\n");
        yield return ("too-many-lines", preset + new string('\n', 30_000));
        yield return ("long-title", preset.Replace("Tern Point preselector", new string('t', 201), StringComparison.Ordinal));
        yield return ("too-many-parts", preset + string.Concat(Enumerable.Range(0, 501).Select(k =>
            $"[[part]]\nkind = \"resistor\"\nname = \"r{k}\"\nbetween = [\"collector\", \"earth\"]\nvalue = \"1M\"\n")));
        yield return ("too-many-nodes", preset + string.Concat(Enumerable.Range(0, 201).Select(k =>
            $"[[part]]\nkind = \"resistor\"\nname = \"r{k}\"\nbetween = [\"n{k}\", \"earth\"]\nvalue = \"1M\"\n")));

        // What the characters of TOML itself get wrong.
        yield return Edited("value-without-quotes", "base_stopper = \"1k\"", "base_stopper = 4k7");
        yield return Edited("comma-without-quotes", "turns = 84", "turns = 8,4");
        yield return Edited("word-without-quotes", "kind = \"short-wire\"", "kind = short-wire");
        yield return Edited("unknown-escape", "low  = \"530k\"", "low  = \"530\\k\"");
        yield return Edited("key-of-two-words", "trimmer = \"8p\"", "trim cap = \"8p\"");
        yield return Edited("list-not-closed", "low = 0, high = 40 }", "low = [0, 40");
        yield return Edited("control-character", "preselector", "pre\u001bselector");
        yield return Edited("table-after-its-dots", "[dial]", "coil.turns = 3\n[dial]");

        // Columns count written characters, escapes and all.
        yield return Edited("wrong-behind-an-escape", "base_coupling = \"220p\"", "base_coupling = \"22\\u0030p!\"");
        yield return Edited("wrong-in-three-quotes", "base_coupling = \"220p\"", "base_coupling = \"\"\"\n220p!\"\"\"");

        // Values that only together are wrong are told although a key is unknown, and not where one of them was refused.
        yield return Edited("unknown-and-impossible", "base = 24 }", "base = 90 }\ncolour = \"green\"");
        yield return Edited("refused-and-no-echo", "min = \"12p\", max = \"365p\", law = \"straight-line-capacitance\"", "law = \"odd\"");
        yield return Edited("table-out-of-range", "temperature = { low = 0, high = 40 }", "temperature = { low = 0, high = 400 }");
        yield return Edited("tolerance-beyond-all", "base_coupling = \"220p\"", "base_coupling = { value = \"220p\", tolerance = 250 }");
        yield return Freely("pairs-out-of-range", "capacitor = { min = \"12p\", max = \"365p\" }", "capacitor = { law = \"table\", table = [[0, 12e-12], [9000, -1], [3]] }");

        // All at once.
        yield return ("many-faults", preset.Replace("\"680\"", "\"680 pF\"", StringComparison.Ordinal)
            .Replace("turns = 84", "turns = \"many\"", StringComparison.Ordinal).Replace("[layout]", "[layouts]", StringComparison.Ordinal)
            .Replace("main = \"BC547B\"", "main = \"NONE\"", StringComparison.Ordinal));
    }

    /// <summary>Cores and antennas: what a choice asks for, and what has no meaning with it.</summary>
    private static IEnumerable<(string Name, string Text)> CasesOfChoices()
    {
        (string, string) Edited(string name, params string[] edits) => (name, WithEdits(Presets.Text(Presets.Default), edits));
        (string, string) Cored(string name, params string[] edits) => (name, WithEdits(Presets.Text("ferrite-rod"), edits));
        yield return Edited("core-without-its-figures", "form_diameter = \"50 mm\"", "core = \"rod\"");
        yield return Edited("unknown-core", "form_diameter = \"50 mm\"", "core = \"toroid\"");
        yield return Edited("core-figures-on-air", "turns = 84", "turns = 84\ninductance_factor = \"55n\"");
        yield return Cored("geometry-on-a-core", "turns = 66", "turns = 66\npitch = \"0.6 mm\"");
        yield return Cored("turn-length-without-wire", "turns = 66", "turns = 66\nturn_length = \"32 mm\"");
        yield return Cored("q-above-the-wire", "q = { value = 200,", "wire_diameter = \"0.1 mm\"\nturn_length = \"32 mm\"\nq = { value = 900,");
        yield return Cored("coupling-of-one", "section_coupling = 0.90", "section_coupling = 1");
        yield return Cored("loop-on-a-core", "kind = \"rod\"", "kind = \"loop\"");
        yield return Cored("rod-without-its-size", "rod = { diameter = \"10 mm\", permeability = 90 }", "rod = { permeability = 0.5 }");
        yield return Edited("rod-on-an-air-coil", "kind = \"short-wire\"", "kind = \"rod\"\nrod = { diameter = \"10 mm\", permeability = 90 }");
        yield return Edited("no-coupling-to-a-short-wire", "coupling = \"5p\"", "");
        yield return Edited("long-wire-without-a-wire", "kind = \"short-wire\"", "kind = \"long-wire\"");
        yield return Edited("long-wire-too-high", "capacitance = \"60p\"\nearth", "wire = { length = \"10 m\", height = \"12 m\" }\nearth", "kind = \"short-wire\"", "kind = \"long-wire\"");
    }

    /// <summary>Devices of another kind than their socket's, and diodes wired wrong.</summary>
    private static IEnumerable<(string Name, string Text)> DeviceCases()
    {
        string preset = Presets.Text(Presets.Default);
        (string, string) Edited(string name, string old, string now) => (name, preset.Replace(old, now, StringComparison.Ordinal));
        (string, string) Extra(string name, string more) => (name, preset + "\n" + more);

        yield return Edited("diode-for-a-transistor", "main = \"BC547B\"", "main = \"1N34A\"");
        yield return Edited("transistor-for-a-diode", "follower = \"BC547B\"", "follower = \"BC547B\"\ndetector = \"BC547B\"");
        yield return Edited("unknown-diode", "follower = \"BC547B\"", "follower = \"BC547B\"\ndetector = \"1N34Z\"");
        yield return Edited("crystal-set-without-a-diode", "kind = \"follower\"", "kind = \"crystal-set\"");
        yield return Edited("detector-on-an-unknown-tap", "kind = \"follower\"", "tap = \"collector\"\nkind = \"follower\"");
        yield return Edited("bypass-of-the-wrong-unit", "kind = \"follower\"", "bypass = \"47k\"\nkind = \"follower\"");
        yield return Extra("diode-part-between", "[[part]]\nkind = \"diode\"\nname = \"x\"\ndevice = \"1N34A\"\nbetween = [\"collector\", \"earth\"]\n");
        yield return Extra("diode-part-without-cathode", "[[part]]\nkind = \"diode\"\nname = \"x\"\ndevice = \"1N34A\"\nnodes = { anode = \"collector\" }\n");
        yield return Extra("diode-part-of-a-transistor", "[[part]]\nkind = \"diode\"\nname = \"x\"\ndevice = \"BC547B\"\nnodes = { anode = \"collector\", cathode = \"earth\" }\n");
        yield return Extra("transistor-part-of-a-diode", "[[part]]\nkind = \"bipolar\"\nname = \"x\"\ndevice = \"BAT46\"\nnodes = { base = \"collector\", collector = \"supply rail\", emitter = \"earth\" }\n");
        yield return Extra("regenerating-diode", "[[part]]\nkind = \"diode\"\nname = \"x\"\ndevice = \"1N34A\"\nnodes = { anode = \"collector\", cathode = \"earth\" }\nrole = \"regenerating\"\n");
        yield return Extra("diode-to-nowhere", "[[part]]\nkind = \"diode\"\nname = \"x\"\ndevice = \"1N34A\"\nnodes = { anode = \"here\", cathode = \"there\" }\n");
    }
}
