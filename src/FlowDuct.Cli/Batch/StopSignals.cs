using System.Runtime.InteropServices;

namespace FlowDuct.Cli.Batch;

/// <summary>Interrupt and termination: the first one asks for a clean stop, and one that cannot be had soon ends the process all the same.</summary>
internal sealed class StopSignals : IDisposable
{
    // Long enough to finish a block, short enough for one who waits at a prompt.
    private static readonly TimeSpan s_patience = TimeSpan.FromSeconds(2);

    private readonly PosixSignalRegistration _interrupt;
    private readonly PosixSignalRegistration _terminate;
    private volatile bool _ended;
    private volatile int _status;

    /// <summary>Listens until disposed.</summary>
    internal StopSignals()
    {
        _interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, context => Stop(context, 130));
        _terminate = PosixSignalRegistration.Create(PosixSignal.SIGTERM, context => Stop(context, 143));
    }

    /// <summary>The exit status of a stop; 0 where none was asked for.</summary>
    internal int Status => _status;

    /// <inheritdoc/>
    public void Dispose()
    {
        _ended = true;
        _interrupt.Dispose();
        _terminate.Dispose();
    }

    private void Stop(PosixSignalContext context, int status)
    {
        context.Cancel = true;
        _status = status;
        if (!SpinWait.SpinUntil(() => _ended, s_patience)) Environment.Exit(status);
    }
}
