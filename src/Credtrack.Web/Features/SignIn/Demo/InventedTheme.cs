namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>What an invented picture roughly resembles.</summary>
public enum InventedTheme
{
    Abdomen,
    Heart,
    Lung,
    Vessels,
    SoftTissue
}
