namespace FlowDuct.Quantities;

/// <summary>A number as somebody printed it: the value, and how far the true figure may lie from it.</summary>
/// <param name="Value">The value, always finite.</param>
/// <param name="HalfPlace">Half of the last printed place: 0.005 for 1.50, 0.5 for 1500, 50 for 1.5e3.</param>
internal readonly record struct PrintedNumber(double Value, double HalfPlace);
