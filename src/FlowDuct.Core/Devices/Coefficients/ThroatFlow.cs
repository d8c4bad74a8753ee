namespace FlowDuct.Devices.Coefficients;

/// <summary>What a correlation of the discharge coefficient asks of a throat.</summary>
/// <param name="Re">Reynolds number on the bore of the throat, 4 qm/(pi d mu0).</param>
/// <param name="Pipe">Bore of the pipe before it, m; 0 where no inlet section is known.</param>
/// <param name="beta">Bore of the throat over that of the pipe; 0 where no inlet section is known.</param>
/// <param name="PressureRatio">Static pressure of the throat over that of the inlet.</param>
/// <param name="Choked">True where the throat passes its greatest flow.</param>
internal readonly record struct ThroatFlow(double Re, double Pipe, double beta, double PressureRatio, bool Choked)
{
    /// <summary>Bore of the throat, m.</summary>
    internal double Bore => beta * Pipe;

    /// <summary>Reynolds number on the bore of the pipe.</summary>
    internal double PipeRe => Re * beta;

    /// <summary>The throat of a rated nozzle; null where its Reynolds number is not known.</summary>
    internal static ThroatFlow? Of(DeviceAnswer a)
    {
        if (a.Performance.ReynoldsThroat is not double Re) return null;
        double pipe = a.Inlet.Diameter ?? 0, bore = (a.Throat ?? a.Exit).Diameter ?? 0;
        return new ThroatFlow(Re, pipe, pipe > 0 ? bore / pipe : 0, (a.Throat ?? a.Exit).State.p / a.Inlet.State.p, a.Performance.Choked == true);
    }
}
