using Credtrack.Core.People;

namespace Credtrack.Core.Catalogue;

public sealed record ApplicationListed(Person By, DateTime At, string Code, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} listed {Name} ({Code}) in the catalogue.";
}

public sealed record ApplicationChanged(Person By, DateTime At, string What) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} changed the application: {What}.";
}

public sealed record ApplicationRetired(Person By, DateTime At, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} retired {Name}: it is no longer offered for new scans.";
}

public sealed record ApplicationBroughtBack(Person By, DateTime At, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} brought {Name} back into the catalogue.";
}
