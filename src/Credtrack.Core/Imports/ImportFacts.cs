using System.Globalization;
using Credtrack.Core.People;

namespace Credtrack.Core.Imports;

public sealed record ImportUploaded(Person By, DateTime At, string Sha256) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} uploaded a file of past scans, SHA-256 {Sha256}.";
}

public sealed record ImportMapped(Person By, DateTime At) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} said what the columns of the file mean.";
}

public sealed record ImportStaged(Person By, DateTime At, int Enrolled) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} had the rows staged and enrolled {Enrolled} for it.";
}

public sealed record ImportConfirmed(Person By, DateTime At, int Rows, int Assumed) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} confirmed the import: rows that became scans {Rows}, cells that took a default {Assumed}; the file was erased.";
}

public sealed record ImportThrownAway(Person By, DateTime At) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} threw the import away; the file was erased.";
}

public sealed record ImportUndone(Person By, DateTime At) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} undid the import.";
}

public sealed record ScanImported(Person By, DateTime At, string Application, DateTime PerformedAt, int Line, string Reading) : Fact(By, At)
{
    public override string Sentence => string.Create(CultureInfo.InvariantCulture, $"{By.Name} imported the scan ({Application}) performed at {PerformedAt:yyyy-MM-dd HH:mm} UTC from line {Line} of a file, {Reading}.");
}

public sealed record ScanTakenBack(Person By, DateTime At) : Fact(By, At)
{
    public override string Sentence => $"{By.Name} took the scan back with its import.";
}
