namespace FlowDuct.Devices.Rating;

/// <summary>How a nozzle runs at a back pressure.</summary>
internal enum Regime
{
    /// <summary>The back pressure balances the inlet.</summary>
    NoFlow,

    /// <summary>Nowhere as fast as sound.</summary>
    Subsonic,

    /// <summary>Convergent: the exit plane passes the greatest flow.</summary>
    Choked,

    /// <summary>The throat just chokes, the divergence slows the flow down again.</summary>
    ChokedSubsonicExit,

    /// <summary>A normal shock stands between throat and exit.</summary>
    ShockInDivergence,

    /// <summary>A normal shock stands in the exit plane.</summary>
    ShockAtExit,

    /// <summary>The exit plane lies below the back pressure: the jet is compressed at the lip.</summary>
    Overexpanded,

    /// <summary>The exit plane lies at the back pressure.</summary>
    FullyExpanded,

    /// <summary>The exit plane lies above the back pressure: the jet expands at the lip.</summary>
    Underexpanded,
}

/// <summary>The words of the regimes, as in answers and datasheets.</summary>
internal static class RegimeWords
{
    internal static string Of(Regime regime) => regime switch
    {
        Regime.NoFlow => "no-flow",
        Regime.Subsonic => "subsonic",
        Regime.Choked => "choked",
        Regime.ChokedSubsonicExit => "choked-subsonic-exit",
        Regime.ShockInDivergence => "shock-in-divergence",
        Regime.ShockAtExit => "shock-at-exit",
        Regime.Overexpanded => "overexpanded",
        Regime.FullyExpanded => "fully-expanded",
        Regime.Underexpanded => "underexpanded",
        _ => throw new ArgumentOutOfRangeException(nameof(regime)),
    };
}
