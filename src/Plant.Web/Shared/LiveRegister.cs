using Plant.Register.Storage;

namespace Plant.Web.Shared;

/// <summary>Tells open pages what a commit touched, once the board has taken note of it.</summary>
public sealed class LiveRegister : IDisposable
{
    private readonly RegisterWriter writer;

    public LiveRegister(RegisterWriter writer)
    {
        this.writer = writer;
        writer.Changed += Tell;
    }

    /// <summary>Raised after each commit of this process.</summary>
    public event Action<RegisterChange>? Changed;

    public void Dispose() => writer.Changed -= Tell;

    private void Tell(RegisterChange change) => Changed?.Invoke(change);
}
