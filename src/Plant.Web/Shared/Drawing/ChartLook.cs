namespace Plant.Web.Shared.Drawing;

/// <summary>What the page's script tells of the screen: the tokens' colours and the room.</summary>
/// <param name="Ink">Text and lines.</param>
/// <param name="Ink2">Second text.</param>
/// <param name="Line">Hairlines.</param>
/// <param name="Line2">Axis.</param>
/// <param name="Water">Water that has left the oil.</param>
/// <param name="Water2">Its 50 % band.</param>
/// <param name="Water3">Its 90 % band.</param>
/// <param name="Oil">90 % band of water in the oil.</param>
/// <param name="Oil2">50 % band of water in the oil.</param>
/// <param name="Sheet">Ground of the chart.</param>
/// <param name="Narrow">True on a phone: names stand in the chart, not beside it.</param>
public sealed record ChartLook(string Ink, string Ink2, string Line, string Line2, string Water, string Water2, string Water3, string Oil, string Oil2, string Sheet, bool Narrow);
