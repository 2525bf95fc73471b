using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata.Builders;
using Microsoft.EntityFrameworkCore.Storage.ValueConversion;
using Plant.Physics;

namespace Plant.Register.Storage.Mapping;

/// <summary>What all records have in common in the database.</summary>
internal static class RecordMapping
{
    public static EntityTypeBuilder<T> Record<T>(this ModelBuilder model, string table)
        where T : class, IRecord
    {
        var entity = model.Entity<T>();
        entity.ToTable(table);
        entity.HasKey(record => record.Id);
        entity.Property(record => record.Id).ValueGeneratedNever();
        entity.Property(record => record.Token).IsConcurrencyToken();
        entity.Ignore(record => record.NaturalKey);
        return entity;
    }

    /// <summary>Enumerations are stored as the codes of the files, so that a database can be read without the program.</summary>
    public static PropertyBuilder<T> AsCode<T>(this PropertyBuilder<T> property)
        where T : struct, Enum =>
        property.HasConversion(new ValueConverter<T, string>(value => Code.Of(value), text => Parse<T>(text))).HasMaxLength(40);

    public static PropertyBuilder<T?> AsCode<T>(this PropertyBuilder<T?> property)
        where T : struct, Enum =>
        property.HasConversion(new ValueConverter<T, string>(value => Code.Of(value), text => Parse<T>(text))).HasMaxLength(40);

    private static T Parse<T>(string text)
        where T : struct, Enum =>
        Code.TryParse<T>(text, out var value) ? value : throw new InvalidOperationException($"'{text}' in the database is no {typeof(T).Name}");
}
