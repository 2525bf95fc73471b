namespace Plant.Web.Shared.Drawing;

/// <summary>A height of the layer, and when it is likely to be reached.</summary>
/// <param name="Litres">Water that reaches it [L].</param>
/// <param name="Text">What it is.</param>
/// <param name="When">When the layer is likely to reach it (UTC); null: it has, or not within the forecast.</param>
public sealed record FootStep(double Litres, string Text, DateTime? When);
