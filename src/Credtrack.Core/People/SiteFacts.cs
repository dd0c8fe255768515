namespace Credtrack.Core.People;

public sealed record SiteFounded(Person By, DateTime At, string Name, string TimeZone) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} set the site up as {Name}, time zone {TimeZone}.";
}

public sealed record SiteChanged(Person By, DateTime At, string What) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} changed the site: {What}.";
}

public sealed record AdministratorAppointed(Person By, DateTime At, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} made {Name} an administrator of the site.";
}

public sealed record AdministratorDismissed(Person By, DateTime At, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} ended that {Name} is an administrator of the site.";
}

public sealed record ProgrammeFounded(Person By, DateTime At, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} founded the programme {Name}.";
}

public sealed record ProgrammeRenamed(Person By, DateTime At, string Was, string Name) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} renamed the programme {Was} to {Name}.";
}

public sealed record CoordinatorLetGo(Person By, DateTime At, string Name, DateOnly LastDay) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} let {Name} be a coordinator of this programme until {LastDay:O}.";
}
