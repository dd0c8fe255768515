namespace Credtrack.Browser.Tests.Site;

/// <summary>What the visitor holds in the hand or has on the desk. Width and height in CSS pixels.</summary>
public sealed record Screen(int Width, int Height, bool Touch = false, bool Script = true)
{
    public static Screen Phone { get; } = new(390, 844, Touch: true);
    public static Screen SmallPhone { get; } = new(360, 740, Touch: true);
    public static Screen Desk { get; } = new(1280, 900);

    // Reduced motion: else a contrast would be measured halfway between two colours.
    public BrowserNewContextOptions With(Uri site) => new()
    {
        BaseURL = site.ToString(),
        ViewportSize = new() { Width = Width, Height = Height },
        HasTouch = Touch,
        IsMobile = Touch,
        JavaScriptEnabled = Script,
        ReducedMotion = ReducedMotion.Reduce,
    };
}
