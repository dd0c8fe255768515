namespace Credtrack.Web.Tests.Site;

/// <summary>The program as a newcomer starts it: an empty database that it migrates and fills with the demonstration.</summary>
public sealed class DemonstratedSite() : RunningSite(BlankSite.NewFile());
