namespace Credtrack.Web.Features.Shared.Figures;

public enum IconName
{
    Brand,
    Note,
    Bad,
    Probe,
    Empty,
}
