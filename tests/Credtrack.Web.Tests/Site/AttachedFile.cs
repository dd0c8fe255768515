using AngleSharp.Io.Dom;

namespace Credtrack.Web.Tests.Site;

/// <summary>A file in a form. Its name would give the trainee's answer away, so that a test sees whether it is kept anywhere.</summary>
internal sealed class AttachedFile(byte[] bytes) : IFile
{
    public const string TellingName = "effusion-yes-smith.png";

    public string Name => TellingName;
    public DateTime LastModified => DateTime.UnixEpoch;
    public int Length => bytes.Length;
    public string Type => "image/png";
    public Stream Body { get; } = new MemoryStream(bytes);
    public bool IsClosed => false;

    public void Close() { }
    public IBlob Slice(int start = 0, int end = int.MaxValue, string? contentType = null) => throw new NotSupportedException();
    public void Dispose() => Body.Dispose();
}
