namespace Plant.Advice.Ledger;

/// <summary>What came into the reservoir between two drains (or two samples), from what was drained and what the oil took up.</summary>
/// <param name="From">Start (UTC).</param>
/// <param name="To">End (UTC).</param>
/// <param name="IngressGPerDay">Ingress [g/day].</param>
/// <param name="SdGPerDay">Standard deviation [g/day].</param>
/// <param name="SettledLPerDay">Water that went to the bottom (or the top) [L/day]; null where no drain ends the interval.</param>
/// <param name="LowerBoundOnly">True where the oil was full, so water may have settled unseen.</param>
public sealed record BalanceInterval(DateTime From, DateTime To, double IngressGPerDay, double SdGPerDay, double? SettledLPerDay, bool LowerBoundOnly)
{
    /// <summary>Length [days].</summary>
    public double Days => (To - From).TotalDays;
}
