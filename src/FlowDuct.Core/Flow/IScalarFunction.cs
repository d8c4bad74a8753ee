namespace FlowDuct.Flow;

/// <summary>A function of one number as a struct, so that a root is found without a delegate and without allocation.</summary>
internal interface IScalarFunction
{
    /// <summary>The value at x; an infinity of the right sign where the function does not exist, never NaN.</summary>
    double At(double x);
}
