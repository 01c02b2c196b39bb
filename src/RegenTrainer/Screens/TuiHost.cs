using System.Runtime.InteropServices;
using System.Text;
using Terminal.Gui.App;
using Terminal.Gui.Configuration;
using Terminal.Gui.Drivers;

namespace RegenTrainer.Screens;

/// <summary>
/// Runs a full screen and gives the terminal back however it ends: by a key, by a fault on any thread, by SIGINT, SIGTERM or
/// SIGHUP. Files of settings that the screen library reads change nothing.
/// </summary>
internal static class TuiHost
{
    private const int FaultExit = 70;
    private const int FramesPerSecond = 60;

    /// <summary>How long a dying program waits for the library's own way out.</summary>
    private const int PatienceMilliseconds = 1500;

    /// <summary>Mouse, paste and keyboard modes off, colours plain, alternate screen left, cursor shown.</summary>
    private const string PlainTerminal = "\e[?1003l\e[?1015l\e[?1006l\e[?2004l\e[<u\e[0m\e[?1049l\e[?25h\e[0 q";

    private static int _restored;
    private static int _signalExit;
    private static int _signals;

    /// <summary>Whether a screen can be shown: a terminal is there, and it can place text.</summary>
    public static bool CanRun() => Driver.IsAttachedToTerminal(out _, out _) && Environment.GetEnvironmentVariable("TERM") != "dumb";

    /// <summary>Runs a screen until it stops.</summary>
    /// <param name="build">Makes the screen, once the library is ready for it.</param>
    /// <param name="theme">The colours.</param>
    /// <param name="describeFault">Keeps the particulars of a fault and says in one line where.</param>
    /// <returns>0, 70 after a fault, 128 and the number of a signal.</returns>
    public static int Run(Func<IRunnable> build, Theme theme, Func<Exception, string> describeFault)
    {
        ForgetSettingsFiles();
        theme.Publish();
        Application.MaximumIterationsPerSecond = FramesPerSecond;
        IApplication app = Application.Create();
        void OnUnhandled(object sender, UnhandledExceptionEventArgs fault) => EndAfterFault(app, fault.ExceptionObject as Exception, describeFault);
        void OnExit(object? sender, EventArgs e) => Rescue();
        void OnSignal(PosixSignalContext signal) => StopBySignal(app, signal);
        AppDomain.CurrentDomain.ProcessExit += OnExit;
        AppDomain.CurrentDomain.UnhandledException += OnUnhandled;
        using PosixSignalRegistration interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, OnSignal);
        using PosixSignalRegistration terminate = PosixSignalRegistration.Create(PosixSignal.SIGTERM, OnSignal);
        using PosixSignalRegistration hangUp = PosixSignalRegistration.Create(PosixSignal.SIGHUP, OnSignal);
        Exception? fatal = null;
        IRunnable? top = null;
        try
        {
            app.Init(DriverRegistry.Names.ANSI);
            top = build();
            app.Run(top);
        }
        catch (Exception fault)
        {
            fatal = fault;
        }
        finally
        {
            (top as IDisposable)?.Dispose();
            app.Dispose();
            Interlocked.Exchange(ref _restored, 1);
            AppDomain.CurrentDomain.ProcessExit -= OnExit;
            AppDomain.CurrentDomain.UnhandledException -= OnUnhandled;
        }

        if (fatal is null)
        {
            return _signalExit;
        }

        Console.Error.WriteLine(describeFault(fatal));
        return FaultExit;
    }

    /// <summary>The library reads files from the current directory and the home as it loads; this puts its own defaults back.</summary>
    private static void ForgetSettingsFiles()
    {
        ThemeSettings.Defaults = new();
        new TuiConfigurationBuilder("regentrainer", AppContext.BaseDirectory).ApplyToStaticFacades();
        ThemeSettings.Defaults = new();
        KeySettings.Defaults = new();
        DriverSettings.Defaults = new();
        ApplicationSettings.Defaults = new();
        TraceSettings.Defaults = new();
    }

    private static void StopBySignal(IApplication app, PosixSignalContext signal)
    {
        signal.Cancel = true;
        _signalExit = signal.Signal switch { PosixSignal.SIGINT => 130, PosixSignal.SIGHUP => 129, _ => 143 };
        if (Interlocked.Increment(ref _signals) > 1)
        {
            Environment.Exit(_signalExit);
        }

        // Where the terminal is gone the screen's loop may never look at the flag below: then the program ends without it.
        int exit = _signalExit;
        _ = Task.Delay(PatienceMilliseconds).ContinueWith(_ => Environment.Exit(exit), TaskScheduler.Default);

        // A plain flag: handing the request to the screen's own thread could block while a timer of it runs.
        foreach (SessionToken session in app.SessionStack ?? [])
        {
            if (session.Runnable is { } running)
            {
                app.RequestStop(running);
            }
        }
    }

    private static void EndAfterFault(IApplication app, Exception? fault, Func<Exception, string> describeFault)
    {
        try
        {
            Task.Run(app.Dispose).Wait(PatienceMilliseconds);
        }
        catch (AggregateException)
        {
            // The terminal is put right below by bytes alone.
        }

        Rescue();
        if (fault is not null)
        {
            Console.Error.WriteLine(describeFault(fault));
        }

        Environment.Exit(FaultExit);
    }

    /// <summary>Puts the terminal right without the library, which may be stuck.</summary>
    private static void Rescue()
    {
        if (Interlocked.Exchange(ref _restored, 1) != 0)
        {
            return;
        }

        try
        {
            using FileStream terminal = new("/dev/tty", FileMode.Open, FileAccess.Write, FileShare.ReadWrite, 1);
            terminal.Write(Encoding.ASCII.GetBytes(PlainTerminal));
        }
        catch (Exception gone) when (gone is IOException or UnauthorizedAccessException)
        {
            // The terminal is gone already; there is nothing to put right.
        }
    }
}
