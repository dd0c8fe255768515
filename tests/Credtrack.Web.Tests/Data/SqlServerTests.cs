using Credtrack.Core.Reminders;
using Credtrack.Migrations.SqlServer;
using Microsoft.EntityFrameworkCore.Infrastructure;
using Microsoft.EntityFrameworkCore.Migrations;
using Microsoft.SqlServer.TransactSql.ScriptDom;

namespace Credtrack.Web.Tests.Data;

/// <summary>What can be known of SQL Server without one: that our script is its language, and that the queries over what a person may load can be said in it.</summary>
public sealed class SqlServerTests : IDisposable
{
    private static readonly DateTime Noon = new(2026, 3, 1, 12, 0, 0, DateTimeKind.Utc);

    private readonly CredtrackDb db = new SqlServerStore().CreateDbContext([]);
    private readonly Person person = Person.Enrol("Bo", null, Noon);
    private readonly Credtrack.Core.People.Site place;

    public SqlServerTests()
    {
        var programme = Programme.Found(person, "Harbour", Noon);
        foreach (var kind in Enum.GetValues<MembershipKind>()) person.Join(person, programme, kind, Noon);
        place = Credtrack.Core.People.Site.Found(Person.Enrol("Ada", null, Noon), "Harbour", "Europe/Dublin", Noon);
    }

    [Fact]
    public void The_script_of_all_migrations_is_transact_sql()
    {
        var script = db.GetService<IMigrator>().GenerateScript(options: MigrationsSqlGenerationOptions.Idempotent);
        var (batches, faults) = Parsed(script);
        Assert.Empty(faults.Select(f => $"line {f.Line}: {f.Message}"));
        Assert.True(batches > db.Database.GetMigrations().Count(), $"{batches} batches");
        foreach (var table in db.Model.GetEntityTypes().Select(t => t.GetTableName()!).Distinct()) Assert.Contains($"[{table}]", script, StringComparison.Ordinal);
        Assert.NotEmpty(Parsed(script.Replace("CREATE TABLE [Reminders]", "CREATE TALBE [Reminders]", StringComparison.Ordinal)).Faults);
    }

    [Fact]
    public void What_a_person_may_load_can_be_asked_for()
    {
        IQueryable[] asked =
        [
            db.ScansVisibleTo(person), db.ScansOverseenBy(person), db.ScansToConfirmBy(person), db.FollowUpsVisibleTo(person), db.ScansWaitingFor(person), db.ScansWaitingUnder(person),
            db.TraineesVisibleTo(person), db.GrantsVisibleTo(person), db.ProgrammesVisibleTo(person, place), db.RulebooksVisibleTo(person), db.PeopleAtWorkOn(new DateOnly(2026, 3, 1)),
            db.RemindersOf(person).OrderBy(k => k.IsOpen ? 0 : 1).ThenByDescending(k => k.Reminder.MadeAt).Skip(50).Take(50),
            .. Enum.GetValues<ReminderKind>().Select(kind => db.ProgrammesToRemindOf(kind, person, Noon, "2026-W09")),
        ];
        Assert.All(asked, query => Assert.Empty(Parsed(query.ToQueryString()).Faults));
    }

    private static (int Batches, IList<ParseError> Faults) Parsed(string sql)
    {
        var script = (TSqlScript?)new TSql160Parser(initialQuotedIdentifiers: true).Parse(new StringReader(sql), out var faults);
        return (script?.Batches.Count ?? 0, faults);
    }

    public void Dispose() => db.Dispose();
}
