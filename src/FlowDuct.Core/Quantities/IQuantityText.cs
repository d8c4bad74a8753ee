namespace FlowDuct.Quantities;

/// <summary>Writes SI values in the reader's units; findings and refusals speak through it.</summary>
internal interface IQuantityText
{
    /// <summary>The value with its unit, for example "3.2 bar".</summary>
    string Text(double si, Dimension dimension, int digits = 5);
}
