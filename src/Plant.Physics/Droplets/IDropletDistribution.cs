namespace Plant.Physics.Droplets;

/// <summary>How the volume of drops is distributed over their sizes.</summary>
public interface IDropletDistribution
{
    /// <summary>Share of the volume in drops below a size.</summary>
    /// <param name="diameterM">Diameter [m].</param>
    /// <returns>Share by volume [0 to 1].</returns>
    /// <remarks>Equation: F(d). Source: definition. Valid for: any size.</remarks>
    double VolumeBelow(double diameterM);
}
