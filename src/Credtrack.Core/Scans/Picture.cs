using Credtrack.Core.People;

namespace Credtrack.Core.Scans;

/// <summary>A still of a scan. Its bytes lie in the picture store under their SHA-256; the name of the uploaded file is never kept.</summary>
public sealed class Picture
{
    public Guid Id { get; private init; }
    public Guid ScanId { get; private init; }
    public int Number { get; private init; }
    public string Sha256 { get; private init; } = "";
    public int Width { get; private init; }
    public int Height { get; private init; }
    public DateTime At { get; private init; }
    public Guid? RemovedById { get; private set; }
    public Person? RemovedBy { get; private init; }
    public DateTime? RemovedAt { get; private set; }

    /// <summary>What others than its trainee say when they take a picture out.</summary>
    public string? RemovedBecause { get; private set; }

    private Picture() { }

    internal Picture(Scan scan, int number, StoredStill still, DateTime at)
    {
        Id = Guid.CreateVersion7(at);
        (ScanId, Number, Sha256, Width, Height, At) = (scan.Id, number, still.Sha256, still.Width, still.Height, at);
    }

    internal void Remove(Guid by, string? because, DateTime at) => (RemovedById, RemovedBecause, RemovedAt) = (by, because, at);
}

/// <summary>Width and height in pixels.</summary>
public sealed record StoredStill(string Sha256, int Width, int Height);
