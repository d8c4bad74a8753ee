namespace FlowDuct.Devices.Coefficients;

/// <summary>The published range of one argument of a correlation, both ends inside.</summary>
/// <param name="Argument">Its symbol.</param>
/// <param name="Least">Least value inside, SI.</param>
/// <param name="Greatest">Greatest value inside, SI; infinite where the source names none.</param>
internal readonly record struct ArgumentRange(string Argument, double Least, double Greatest)
{
    /// <summary>The limit that a value crosses; null inside.</summary>
    internal Crossing? Cross(double value) =>
        value > Greatest ? new Crossing(Argument, value, Greatest) : value >= Least ? null : new Crossing(Argument, value, Least);
}
