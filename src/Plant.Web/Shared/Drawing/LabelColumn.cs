namespace Plant.Web.Shared.Drawing;

/// <summary>Places labels one below the other so that none touches another, each as near to its wanted place as the others allow.</summary>
public static class LabelColumn
{
    /// <summary>The places, in the order of the wanted ones.</summary>
    /// <param name="wanted">Wanted place of each label's first line, ascending [px].</param>
    /// <param name="tall">Room that each label takes below its place [px].</param>
    /// <param name="bottom">Where the last label must have ended [px].</param>
    public static IReadOnlyList<double> Place(IReadOnlyList<double> wanted, IReadOnlyList<double> tall, double bottom)
    {
        var places = wanted.ToArray();
        for (var i = 1; i < places.Length; i++)
        {
            places[i] = Math.Max(places[i], places[i - 1] + tall[i - 1]);
        }

        var limit = bottom;
        for (var i = places.Length - 1; i >= 0; i--)
        {
            places[i] = Math.Min(places[i], limit - tall[i]);
            limit = places[i];
        }

        return places;
    }
}
