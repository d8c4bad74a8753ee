using FlowDuct.Devices;
using FlowDuct.Fluids;
using FlowDuct.Fluids.Gases;
using FlowDuct.Fluids.Water;
using FlowDuct.Quantities;

namespace FlowDuct.Errors;

/// <summary>The refusals of a humidity.</summary>
internal static class HumidityRefusals
{
    private const string Words = "humidity, dew-point, humidity-ratio";

    private static DisplayText Units => DisplayText.Metric;

    internal static FlowDuctException Missing(Station station) => NotUnderstood(
        station, "nothing says how humid the air is", $"add one of {Words}, for example humidity=60%; --fluid air is dry");

    internal static FlowDuctException Several(Station station, StationSymbol[] said) => NotUnderstood(
        station, $"{string.Join(", ", said.Select(SymbolOf))} say the same twice", "keep one of them");

    internal static FlowDuctException NotHumid(Station station, Fluid fluid, StationSymbol said) => NotUnderstood(
        station, $"{SymbolOf(said)} belongs to --fluid humid-air, and the fluid is {fluid.Name}",
        fluid.Name == "air" ? "write --fluid humid-air" : "leave it out; in a mixture give the fraction of H2O");

    internal static FlowDuctException NoSaturation(in GivenHumidity given, double T) => NoAnswer(
        given.Station,
        T < WaterConstants.Tc
            ? $"{Shown(given)}: below {Units.Text(VapourSaturation.LeastTemperature, Dimension.Temperature)} no saturation pressure of ice is known (IAPWS R14-08(2011))"
            : $"{Shown(given)}: at {Units.Text(T, Dimension.Temperature)} water has no saturation pressure, its critical temperature is {Units.Text(WaterConstants.Tc, Dimension.Temperature, 6)}",
        "give the humidity ratio instead, for example humidity-ratio=0.008");

    internal static FlowDuctException NoAirLeft(in GivenHumidity given, double p, double T) => NoAnswer(
        given.Station,
        $"{Shown(given)}: such vapour alone has {Units.Text(Vapour(given, T), Dimension.Pressure, 4)}, not below the static pressure {Units.Text(p, Dimension.Pressure, 4)}, and leaves no room for air",
        given.Symbol == StationSymbol.DewPoint ? "give a lower dew point" : $"at {Units.Text(T, Dimension.Temperature)} give a humidity below {Units.Text(p / VapourSaturation.Pressure(T), Dimension.Ratio, 3)}");

    internal static FlowDuctException AboveSaturation(in GivenHumidity given, double partial, double p, double T)
    {
        double saturation = VapourSaturation.Pressure(T);
        string what = $"{Shown(given)}: its vapour would have {Units.Text(partial, Dimension.Pressure, 4)}, and {Units.Text(saturation, Dimension.Pressure, 4)} at {Units.Text(T, Dimension.Temperature)} is saturation: the rest is {(T < WaterConstants.Tt ? "ice" : "liquid")}";
        string most = given.Symbol == StationSymbol.DewPoint || saturation >= p
            ? "a dew point is not above the static temperature"
            : $"the humidity ratio is at most {Units.Text(Humidity.Ratio(GasMixture.HumidAir(saturation / p).Gas)!.Value, Dimension.Ratio, 4)} there";
        return NoAnswer(given.Station, what, most);
    }

    private static double Vapour(in GivenHumidity given, double T) =>
        given.Symbol == StationSymbol.DewPoint ? VapourSaturation.Pressure(given.Value) : given.Value * VapourSaturation.Pressure(T);

    private static string Shown(in GivenHumidity given) =>
        $"{SymbolOf(given.Symbol)}={Units.Text(given.Value, QuantityCatalogue.Of(given.Symbol).Dimension, 6)}";

    private static string SymbolOf(StationSymbol symbol) => QuantityCatalogue.Of(symbol).Symbol;

    private static FlowDuctException NotUnderstood(Station station, string reason, string next) =>
        new(new Refusal(RefusalKind.NotUnderstood, Refusals.PlaceOf(station), reason, next));

    private static FlowDuctException NoAnswer(Station station, string reason, string next) =>
        new(new Refusal(RefusalKind.NoAnswer, Refusals.PlaceOf(station), reason, next));
}
